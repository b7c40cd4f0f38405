import Svg, { Circle, Line, Path, Text as SvgText } from 'react-native-svg';

import { FAMILY } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import type { RestartCurve } from '@/shared/model/result';
import { formatQuantity } from '@/shared/quantity/format';

interface RestartPlotProps {
  restart: RestartCurve;
  /** A peak; null without one. */
  limit: number | null;
  width: number;
  height: number;
}

const PAD = { left: 46, right: 12, top: 26, bottom: 42 } as const;
const SIZE = 12.5;
const STEPS = [1, 2, 2.5, 5, 10] as const;

const niceStep = (top: number): number => {
  const raw = top / 4;
  const power = 10 ** Math.floor(Math.log10(raw));
  return power * (STEPS.find((step) => step * power >= raw) ?? 10);
};

const scaleOf = ({ restart, limit, width, height }: RestartPlotProps) => {
  const times = restart.offTime.filter((time) => time > 0);
  const [from, to] = [Math.floor(Math.log10(Math.min(...times))), Math.ceil(Math.log10(Math.max(...times)))];
  const step = niceStep(Math.max(...restart.peakCurrent, limit ?? 0) * 1.08);
  const top = step * Math.ceil((Math.max(...restart.peakCurrent, limit ?? 0) * 1.08) / step);
  const right = width - PAD.right;
  const bottom = height - PAD.bottom;
  return {
    decades: Array.from({ length: to - from + 1 }, (_, index) => 10 ** (from + index)),
    levels: Array.from({ length: Math.round(top / step) + 1 }, (_, index) => index * step),
    x: (time: number) => PAD.left + ((Math.log10(time) - from) / (to - from)) * (right - PAD.left),
    y: (current: number) => bottom - (current / top) * (bottom - PAD.top),
    right,
    bottom,
  };
};

/** Peak current of a restart against the time off, on a logarithmic time axis, with the limit and the worst point. */
export const RestartPlot = (props: RestartPlotProps) => {
  const { restart, limit, width, height } = props;
  const { colors } = useTheme();
  const { decades, levels, x, y, right, bottom } = scaleOf(props);
  const points = restart.offTime.flatMap((time, index) => (time > 0 ? [`${x(time).toFixed(1)} ${y(restart.peakCurrent[index] ?? 0).toFixed(1)}`] : []));
  const worst = restart.peakCurrent[restart.offTime.indexOf(restart.worstOffTime)] ?? Math.max(...restart.peakCurrent);
  const [worstX, worstY] = [x(restart.worstOffTime), y(worst)];
  const over = limit !== null && worst > limit;
  const anchor = worstX > width / 2 ? 'end' : 'start';
  return (
    <Svg width={width} height={height} role="img" aria-label={`Peak current against time off: worst ${formatQuantity(worst, 'current')} after ${formatQuantity(restart.worstOffTime, 'time', 3)}`}>
      <SvgText x={PAD.left} y={14} fontSize={SIZE} fontFamily={FAMILY.text} fill={colors.quiet}>Peak current, A peak</SvgText>
      {levels.map((level) => <Line key={level} x1={PAD.left} x2={right} y1={y(level)} y2={y(level)} stroke={level === 0 ? colors.ink : colors.rule} />)}
      {levels.map((level) => <SvgText key={level} x={PAD.left - 8} y={y(level) + 4} textAnchor="end" fontSize={SIZE} fontFamily={FAMILY.mono} fill={colors.ink}>{Number(level.toPrecision(6))}</SvgText>)}
      {decades.map((time) => <Line key={time} x1={x(time)} x2={x(time)} y1={PAD.top} y2={bottom} stroke={colors.rule} />)}
      {decades.map((time, index) => <SvgText key={time} x={x(time)} y={bottom + 18} textAnchor={index === decades.length - 1 ? 'end' : 'middle'} fontSize={SIZE} fontFamily={FAMILY.mono} fill={colors.ink}>{formatQuantity(time, 'time', 1)}</SvgText>)}
      <SvgText x={right} y={bottom + 36} textAnchor="end" fontSize={SIZE} fontFamily={FAMILY.text} fill={colors.quiet}>time without power</SvgText>
      <Path d={`M${points.join('L')}`} fill="none" stroke={colors.current} strokeWidth={1.7} />
      {limit === null ? null : <Line x1={PAD.left} x2={right} y1={y(limit)} y2={y(limit)} stroke={colors.ink} strokeWidth={1.3} />}
      {limit === null ? null : <SvgText x={right - 4} y={y(limit) - 5} textAnchor="end" fontSize={SIZE} fontFamily={FAMILY.text} fill={colors.ink}>{`peak limit ${formatQuantity(limit, 'current', 3)}`}</SvgText>}
      <Circle cx={worstX} cy={worstY} r={4} fill={colors.panel} stroke={over ? colors.fail : colors.current} strokeWidth={1.8} />
      <SvgText x={worstX + (anchor === 'end' ? -9 : 9)} y={Math.max(worstY - 7, 24)} textAnchor={anchor} fontSize={SIZE} fontFamily={FAMILY.textStrong} fill={over ? colors.fail : colors.current}>{`${formatQuantity(worst, 'current')} after ${formatQuantity(restart.worstOffTime, 'time', 3)}`}</SvgText>
    </Svg>
  );
};
