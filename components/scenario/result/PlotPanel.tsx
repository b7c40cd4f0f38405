import { useState } from 'react';
import { View } from 'react-native';

import { PlotLegend } from '@/components/charts/PlotLegend';
import { SplitTimePlot } from '@/components/charts/SplitTimePlot';
import { TraceTable } from '@/components/charts/TraceTable';
import { Choice } from '@/components/ui/Choice';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { Measured } from '@/components/ui/Measured';
import { Text } from '@/components/ui/Text';
import { useLayout } from '@/components/ui/theme';
import type { Assessment } from '@/shared/model/result';
import type { Scenario } from '@/shared/model/scenario';

import { FiguresView } from './FiguresView';
import { plotRatings } from './plot-ratings';
import { RestartView } from './RestartView';
import { StoppedNotice } from './StoppedNotice';

export interface PlotPanelProps {
  assessment: Assessment;
  scenario: Scenario;
  stale: boolean;
  milliseconds: number | null;
  /** Limiter element of the lower two lanes. */
  element: number;
  height: number;
  onGoTo: (path: string) => void;
}

type Shown = 'power-up' | 'restart' | 'figures' | 'table';
const VIEWS: readonly { value: Shown; label: string }[] = [
  { value: 'power-up', label: 'Power-up' },
  { value: 'restart', label: 'Hot restart' },
  { value: 'figures', label: 'Figures' },
  { value: 'table', label: 'Table' },
];
const TITLES: Record<Shown, { wide: string; phone: string }> = {
  'power-up': { wide: 'Power-up, current, temperature and energy', phone: 'Power-up' },
  restart: { wide: 'Hot restart', phone: 'Hot restart' },
  figures: { wide: 'Figures of the nominal run', phone: 'Figures' },
  table: { wide: 'Table of the traces', phone: 'Table' },
};

const balance = (residual: number) => `${Number((residual * 100).toPrecision(2))} %`;

/** What was computed, as plot, restart curve, figures or table. */
export const PlotPanel = ({ assessment, scenario, stale, milliseconds, element, height, onGoTo }: PlotPanelProps) => {
  const { wide } = useLayout();
  const [chosen, setChosen] = useState<Shown>('power-up');
  const { run, envelope, restart, checks } = assessment;
  const view = chosen === 'restart' && !restart ? 'power-up' : chosen;
  const names = run.elements.map(({ name }) => name);
  const restartCheck = checks.find(({ id }) => id === 'restart-peak-current');
  const title = TITLES[view][wide ? 'wide' : 'phone'];
  return (
    <View style={{ gap: 8 }}>
      <LegendBracket title={title} remark={view === 'power-up' ? <PlotLegend band={envelope !== null && !stale} /> : stale ? 'before your last edit' : undefined} />
      {run.stopped ? <StoppedNotice stopped={run.stopped} onGoTo={onGoTo} /> : null}
      {view === 'power-up' || view === 'restart' ? (
        <Measured height={height}>
          {(width) =>
            view === 'restart' && restart ? (
              <RestartView restart={restart} check={restartCheck} width={width} height={height - 70} />
            ) : (
              <SplitTimePlot traces={run.traces} envelope={envelope} events={run.events} ratings={plotRatings(scenario, element)} elementNames={names} element={element} stale={stale} stopped={run.stopped} width={width} height={height} />
            )
          }
        </Measured>
      ) : null}
      {view === 'figures' ? <FiguresView assessment={assessment} /> : null}
      {view === 'table' ? <TraceTable traces={run.traces} events={run.events} elementNames={names} element={element} /> : null}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', justifyContent: 'space-between', gap: 8 }}>
        <Choice label="Show" hideLabel options={VIEWS.filter(({ value }) => value !== 'restart' || restart)} value={view} onChange={setChosen} />
        <Text variant="secondary" tone={run.audit.clean ? 'quiet' : 'caution'}>
          Energy balance within {balance(run.audit.worstResidual)}{milliseconds === null ? '' : ` · run ${Math.round(milliseconds)} ms`}
        </Text>
      </View>
    </View>
  );
};
