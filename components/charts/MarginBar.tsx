import { View } from 'react-native';
import Svg, { G, Line, Path, Rect } from 'react-native-svg';

import { STATUS_WORD } from '@/components/ui/Marks';
import { useTheme } from '@/components/ui/theme';
import { STATUS_COLOR, type ColorName } from '@/components/ui/tokens';
import type { Check } from '@/shared/model/check';

export type MarginBarVariant = 'full' | 'tight' | 'compact';
export interface MarginBarProps {
  check: Pick<Check, 'status' | 'ratio' | 'nominalRatio' | 'title' | 'setAside'>;
  variant?: MarginBarVariant;
  /** From before the last edit: hollow and grey. */
  stale?: boolean;
  /** What it shows stands beside it in words, so that it need not be spoken. */
  silent?: boolean;
  /** The ground it lies on, for the gap of the break mark. */
  ground?: ColorName;
}

/** The scale ends at 150 %, so that the rating stands at two thirds of every bar. */
const SCALE_END = 1.5;
const MEASURES = {
  full: { height: 15, bar: 7, baseline: 9, tick: 4, datum: 15, cap: 11 },
  tight: { height: 12, bar: 7, baseline: 9, tick: 3, datum: 12, cap: 11 },
  compact: { height: 11, bar: 5, baseline: 8, tick: 0, datum: 13, cap: 0 },
} as const;
const TOP = 2;

const along = (ratio: number): number => (Math.min(Math.max(ratio, 0), SCALE_END) / SCALE_END) * 100;
const percent = (share: number) => `${share.toFixed(3)}%`;

const Hatch = ({ color, bar }: { color: string; bar: number }) => (
  <View style={{ position: 'absolute', left: 0, right: 0, top: TOP, height: bar, overflow: 'hidden' }}>
    <Svg width={1600} height={bar}>
      <Path d={Array.from({ length: 320 }, (_, index) => `M${index * 5} ${bar}l${bar} -${bar}`).join('')} stroke={color} strokeWidth={0.9} />
    </Svg>
  </View>
);

/** The datum: 100 % of the rating, at the same place in every row. */
const Datum = ({ color, height, compact }: { color: string; height: number; compact: boolean }) => (
  <View style={{ position: 'absolute', left: '66.667%', marginLeft: -4, top: compact ? -1 : 0 }}>
    <Svg width={8} height={height}>
      <Rect x={3} y={0} width={2} height={height} fill={color} />
      {compact ? null : <Path d="M0 0h8L4 5z" fill={color} />}
    </Svg>
  </View>
);

/** Beyond the scale: two slanted cuts, so that the bar's end is not taken for the value. */
const BreakMark = ({ color, ground }: { color: string; ground: string }) => (
  <View style={{ position: 'absolute', left: '88%', marginLeft: -8, top: 0 }}>
    <Svg width={16} height={11}>
      <Path d="M5.5 0h9L10.5 11h-9z" fill={ground} />
      <Path d="M5.5 0L1.5 11M14.5 0L10.5 11" stroke={color} strokeWidth={1.5} />
    </Svg>
  </View>
);

interface FillProps {
  worst: number;
  nominal: number;
  color: string;
  stale: boolean;
  variant: MarginBarVariant;
}
/** Solid to the nominal case, a comb on to the worst corner, a cap at its end. */
const Fill = ({ worst, nominal, color, stale, variant }: FillProps) => {
  const { bar, cap } = MEASURES[variant];
  const solid = variant === 'compact' ? worst : Math.min(nominal, worst);
  return (
    <G>
      {stale ? (
        <Rect x={0.5} y={TOP + 0.5} width={percent(worst)} height={bar - 1} fill="none" stroke={color} />
      ) : (
        <Rect x={0} y={TOP} width={percent(solid)} height={bar} fill={color} />
      )}
      {!stale && worst > solid ? <Line x1={percent(solid)} x2={percent(worst)} y1={TOP + bar / 2} y2={TOP + bar / 2} stroke={color} strokeWidth={bar} strokeDasharray="2 2" strokeDashoffset={2} /> : null}
      {cap ? <Line x1={percent(worst)} x2={percent(worst)} y1={0} y2={cap} stroke={color} strokeWidth={3} transform="translate(-1.5 0)" /> : null}
    </G>
  );
};

const spoken = ({ title, status, ratio }: MarginBarProps['check']) =>
  ratio === null ? `${title}: ${STATUS_WORD[status]}` : `${title}: ${STATUS_WORD[status]}, ${(ratio * 100).toFixed(0)} % of the rating`;

/** Value against rating as one bar; the 100 % mark stands at the same place in every row. */
export const MarginBar = ({ check, variant = 'full', stale = false, silent = false, ground = 'paper' }: MarginBarProps) => {
  const { colors } = useTheme();
  const { height, bar, baseline, tick, datum } = MEASURES[variant];
  const grey = stale || check.setAside !== null;
  const color = grey ? colors.quiet : colors[STATUS_COLOR[check.status]];
  const worst = check.ratio === null ? null : along(check.ratio);
  const label = silent ? { 'aria-hidden': true } : ({ role: 'img', accessible: true, 'aria-label': spoken(check) } as const);
  return (
    <View {...label} style={{ height, minWidth: 40 }}>
      {worst === null ? <Hatch color={colors.rule2} bar={bar} /> : null}
      <Svg width="100%" height={height}>
        <Rect x={0} y={baseline} width="100%" height={1} fill={colors.rule2} />
        {tick ? [0, 1, 2, 3, 4, 5, 6].map((step) => <Line key={step} x1={percent((step / 6) * 100)} x2={percent((step / 6) * 100)} y1={baseline} y2={baseline + tick} stroke={colors.rule2} />) : null}
        {worst === null ? null : <Fill worst={worst} nominal={along(check.nominalRatio ?? check.ratio ?? 0)} color={color} stale={grey} variant={variant} />}
      </Svg>
      {(check.ratio ?? 0) > SCALE_END && variant !== 'compact' && !grey ? <BreakMark color={color} ground={colors[ground]} /> : null}
      <Datum color={colors.ink} height={datum} compact={variant === 'compact'} />
    </View>
  );
};
