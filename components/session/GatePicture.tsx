import Svg, { G, Line, Path, Text as SvgText } from 'react-native-svg';

import { FAMILY } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';

/** Half sines of a rectified surge, each lower than the one before: what the limiter lets through. */
const pulse = (x: number, height: number, width: number) => `M${x} 150c${width * 0.25} ${-height * 1.33} ${width * 0.75} ${-height * 1.33} ${width} 0`;

/** An inrush pulse held below its rating line: the tool's purpose in one picture. */
export const GatePicture = ({ height }: { height: number }) => {
  const { colors } = useTheme();
  return (
    <Svg width="100%" height={height} viewBox="0 0 560 180" preserveAspectRatio="xMinYMid meet" aria-hidden>
      {[0, 1, 2, 3, 4, 5, 6, 7].map((tick) => <Line key={tick} x1={tick * 80} x2={tick * 80} y1={10} y2={150} stroke={colors.rule} />)}
      <Line x1={0} x2={560} y1={40} y2={40} stroke={colors.ink} strokeWidth={1.3} />
      <SvgText x={556} y={34} textAnchor="end" fontSize={12.5} fontFamily={FAMILY.text} fill={colors.ink}>peak limit</SvgText>
      <G fill="none" strokeWidth={1.7} strokeLinejoin="round">
        <Path d={pulse(8, 98, 52)} fill={colors.current} fillOpacity={0.15} stroke={colors.current} />
        <Path d={pulse(108, 58, 44)} stroke={colors.current} />
        <Path d={pulse(208, 36, 38)} stroke={colors.current} />
        <Path d={pulse(308, 24, 34)} stroke={colors.current} />
        <Path d={pulse(408, 19, 32)} stroke={colors.current} />
        <Path d={pulse(508, 17, 30)} stroke={colors.current} />
      </G>
      <Line x1={0} x2={560} y1={150} y2={150} stroke={colors.rule2} />
    </Svg>
  );
};
