import { G } from 'react-native-svg';
import { VictoryArea, VictoryAxis, VictoryChart, VictoryLine } from 'victory-native';

import { FAMILY } from '@/components/ui/Text';
import type { Palette } from '@/components/ui/tokens';

import type { CurveModel } from './curve-model';

export interface CurveLayerProps {
  model: CurveModel;
  colors: Palette;
  tone: string;
  bandOpacity: number;
}

const tickText = (value: number) => `${Number(value.toPrecision(6))}`.replace('-', '\u2212');

/** Axes, band and line of a curve; the words on it are drawn over it by CurvePlot. */
export const CurveLayer = ({ model, colors, tone, bandOpacity }: CurveLayerProps) => {
  const { width, height, padding, x, y, line, band } = model;
  const style = {
    axis: { stroke: colors.ink, strokeWidth: 1.2 },
    grid: { stroke: colors.rule, strokeWidth: 0.75 },
    ticks: { stroke: 'none', size: 0 },
    tickLabels: { fill: colors.quiet, fontFamily: FAMILY.mono, fontSize: 12, padding: 6 },
  };
  return (
    <VictoryChart standalone={false} width={width} height={height} padding={padding} scale={{ x: 'linear', y: y.scale }} domain={{ x: [x.domain[0], x.domain[1]], y: [y.domain[0], y.domain[1]] }}>
      <VictoryAxis dependentAxis crossAxis={false} offsetX={padding.left} tickValues={[...y.ticks]} tickFormat={(value: number) => (y.labelled.includes(value) ? tickText(value) : '')} style={style} />
      <VictoryAxis crossAxis={false} offsetY={padding.bottom} tickValues={[...x.ticks]} tickFormat={tickText} style={style} />
      {band.length > 1 ? <VictoryArea groupComponent={<G />} data={[...band]} x="x" y="high" y0="low" style={{ data: { fill: tone, fillOpacity: bandOpacity, stroke: 'none' } }} /> : null}
      <VictoryLine groupComponent={<G />} data={[...line]} style={{ data: { stroke: tone, strokeWidth: 1.7, strokeLinejoin: 'round' } }} />
    </VictoryChart>
  );
};
