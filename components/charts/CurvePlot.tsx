import { lazy, Suspense, useMemo } from 'react';
import Svg, { Circle, G, Line, Path, Rect } from 'react-native-svg';

import { useTheme } from '@/components/ui/theme';
import type { ColorName, Palette } from '@/components/ui/tokens';

import { makeCurve, type CurveModel } from './curve-model';
import { PlotText, textWidth } from './PlotText';

const CurveLayer = lazy(() => import('./victory-layers').then((layers) => ({ default: layers.CurveLayer })));

export interface CurvePlotProps {
  /** Spoken name of the plot. */
  title: string;
  /** All values are in displayed units. Values of x rise. */
  x: { label: string; values: readonly number[]; domain?: [number, number] };
  /** A logarithmic axis leaves out values that are not above zero. */
  y: { label: string; scale: 'linear' | 'log'; domain?: [number, number] };
  line: readonly number[];
  band?: { low: readonly number[]; high: readonly number[] };
  points?: readonly { x: number; y: number }[];
  callout?: { x: number; y: number; title: string; text?: string };
  /** Vertical line, such as the highest body temperature. */
  ratingAt?: { x: number; label: string };
  tone?: ColorName;
  width: number;
  height: number;
}

const BAND_OPACITY = { light: 0.15, dark: 0.22 } as const;
const SIZE = 12.5;

const RatingLine = ({ model, at, colors }: { model: CurveModel; at: NonNullable<CurvePlotProps['ratingAt']>; colors: Palette }) => {
  const x = model.toX(at.x);
  const top = model.padding.top;
  return (
    <G>
      <Line x1={x} x2={x} y1={top} y2={model.height - model.padding.bottom} stroke={colors.ink} strokeWidth={1.3} />
      <PlotText x={x - 11} y={top + 8} turn={90} size={SIZE} fill={colors.ink} halo={colors.panel}>{at.label}</PlotText>
    </G>
  );
};

/** A ring on the curve, with its words led away to where the ground is free: up and right of a falling curve. */
const CalloutMark = ({ model, callout, tone, colors }: { model: CurveModel; callout: NonNullable<CurvePlotProps['callout']>; tone: string; colors: Palette }) => {
  const [x, y] = [model.toX(callout.x), model.toY(callout.y)];
  const width = Math.max(textWidth(callout.title, SIZE), textWidth(callout.text ?? '', SIZE));
  const wordX = Math.min(x + 40, model.width - model.padding.right - width - 20);
  const wordY = Math.max(y - 58, model.padding.top + 16);
  return (
    <G>
      <Path d={`M${x + 2} ${y - 3}L${wordX - 4} ${wordY - 4}`} stroke={tone} strokeWidth={1} fill="none" />
      <Circle cx={x} cy={y} r={3.6} fill={colors.panel} stroke={tone} strokeWidth={1.6} />
      <PlotText x={wordX} y={wordY} size={SIZE} strong fill={tone} halo={colors.panel}>{callout.title}</PlotText>
      {callout.text ? <PlotText x={wordX} y={wordY + 16} size={SIZE} fill={colors.ink} halo={colors.panel}>{callout.text}</PlotText> : null}
    </G>
  );
};

const describe = ({ title, x, y, callout, ratingAt }: CurvePlotProps) =>
  [`${title}: ${y.label} against ${x.label}`, callout?.title, ratingAt?.label].filter(Boolean).join('; ');

/** One curve with its band: resistance against temperature, or a derating line. */
export const CurvePlot = (props: CurvePlotProps) => {
  const { x, y, line, band, points, callout, ratingAt, tone = 'temperature', width, height } = props;
  const { colors, scheme } = useTheme();
  const model = useMemo(() => makeCurve({ x, y, line, band, points, width, height }), [x, y, line, band, points, width, height]);
  const { left, right, top, bottom } = model.padding;
  const color = colors[tone];
  return (
    <Svg width={width} height={height} role="img" aria-label={describe(props)}>
      <Rect x={left} y={top} width={width - left - right} height={height - top - bottom} fill={colors.panel} />
      <Suspense fallback={null}>
        <CurveLayer model={model} colors={colors} tone={color} bandOpacity={BAND_OPACITY[scheme]} />
      </Suspense>
      {points?.map((point) => <Circle key={point.x} cx={model.toX(point.x)} cy={model.toY(point.y)} r={3.2} fill={colors.panel} stroke={color} strokeWidth={1.5} />)}
      <PlotText x={left} y={14} size={SIZE} fill={colors.quiet}>{y.label}</PlotText>
      <PlotText x={width - right} y={height - 5} size={SIZE} anchor="end" fill={colors.quiet}>{x.label}</PlotText>
      {ratingAt ? <RatingLine model={model} at={ratingAt} colors={colors} /> : null}
      {callout ? <CalloutMark model={model} callout={callout} tone={color} colors={colors} /> : null}
    </Svg>
  );
};
