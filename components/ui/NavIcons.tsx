import Svg, { Circle, Path, Rect } from 'react-native-svg';

import { useTheme } from './theme';
import type { ColorName } from './tokens';

export interface IconProps {
  size?: number;
  tone?: ColorName;
}

const useStroke = (tone: ColorName = 'ink') => {
  const { colors } = useTheme();
  return { stroke: colors[tone], fill: 'none', strokeWidth: 1.5 } as const;
};

/** Two gate posts with the wave let through between them. */
export const BrandMark = ({ size = 30, tone }: IconProps) => {
  const line = useStroke(tone);
  return (
    <Svg width={size} height={size} viewBox="0 0 30 30" role="img" aria-label="Tidegate">
      <Path {...line} strokeWidth={2} d="M9 3v24M21 3v24" />
      <Path {...line} strokeWidth={1.8} d="M1 10c3-4 5-4 8 0M21 20c3-2 5-2 8 0" />
      <Path d="M11.5 3v13h7V3" fill={line.stroke} />
    </Svg>
  );
};
export const ScenariosIcon = ({ size = 22, tone }: IconProps) => {
  const line = useStroke(tone);
  return (
    <Svg width={size} height={size} viewBox="0 0 22 22" aria-hidden>
      <Path {...line} d="M1 11h4M11 11h10M16 11v6M13 17h6" />
      <Rect {...line} x={5} y={7.5} width={6} height={7} />
      <Circle {...line} cx={16} cy={11} r={1.4} fill={line.stroke} />
    </Svg>
  );
};
export const PartsIcon = ({ size = 22, tone }: IconProps) => {
  const line = useStroke(tone);
  return (
    <Svg width={size} height={size} viewBox="0 0 22 22" aria-hidden>
      <Rect {...line} x={3} y={7.5} width={16} height={7} />
      <Path {...line} d="M5 19L15.5 3h3.5" />
    </Svg>
  );
};
export const BenchIcon = ({ size = 22, tone }: IconProps) => (
  <Svg width={size} height={size} viewBox="0 0 22 22" aria-hidden><Path {...useStroke(tone)} d="M2 18h18M4 18V4M4 14c2 0 2-8 4-8s2 8 4 8 2-5 4-5 1 5 3 5" /></Svg>
);
export const ReviewsIcon = ({ size = 22, tone }: IconProps) => (
  <Svg width={size} height={size} viewBox="0 0 22 22" aria-hidden><Path {...useStroke(tone)} d="M3 18h16M4 14c3-9 6-11 6-8s-3 7-1 7 3-4 4-4 0 3 2 3 2-1 3-2" /></Svg>
);
export const TeamIcon = ({ size = 22, tone }: IconProps) => {
  const line = useStroke(tone);
  return (
    <Svg width={size} height={size} viewBox="0 0 22 22" aria-hidden>
      <Path {...line} d="M4 19v-6h6v6M12 19v-6h6v6" />
      <Circle {...line} cx={7} cy={8} r={2.6} />
      <Circle {...line} cx={15} cy={8} r={2.6} />
    </Svg>
  );
};
export const BackIcon = ({ size = 20, tone }: IconProps) => (
  <Svg width={size} height={size} viewBox="0 0 20 20" aria-hidden><Path {...useStroke(tone)} strokeWidth={1.8} d="M12 4l-6 6 6 6" /></Svg>
);
export const SearchIcon = ({ size = 18, tone }: IconProps) => {
  const line = useStroke(tone);
  return (
    <Svg width={size} height={size} viewBox="0 0 18 18" aria-hidden>
      <Circle {...line} cx={7.5} cy={7.5} r={5.25} />
      <Path {...line} strokeWidth={1.8} d="M11.5 11.5l4.5 4.5" />
    </Svg>
  );
};
/** Stored charge. */
export const BoltIcon = ({ size = 14, tone }: IconProps) => {
  const { colors } = useTheme();
  return <Svg width={size} height={size} viewBox="0 0 16 16" aria-hidden><Path d="M9.5 1L3 9h5l-1.5 6L13 7H8z" fill={colors[tone ?? 'ink']} /></Svg>;
};
/** A contact that stands open: not connected. */
export const OpenContactIcon = ({ size = 24, tone }: IconProps) => {
  const line = useStroke(tone);
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" aria-hidden>
      <Path {...line} d="M1 14h6M17 14h6M8.5 13L18 6" />
      <Circle {...line} cx={7.5} cy={14} r={1.8} />
      <Circle {...line} cx={16.5} cy={14} r={1.8} />
    </Svg>
  );
};
