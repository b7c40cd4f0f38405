import { lazy, Suspense, useMemo } from 'react';
import { View } from 'react-native';
import Svg from 'react-native-svg';

import { Plate } from '@/components/ui/Plate';
import { useTheme } from '@/components/ui/theme';
import type { Envelope, RunEvent, Stopped, Traces } from '@/shared/model/result';

import { findCallouts } from './callouts';
import { buildLanes, type RatingLine } from './lanes';
import { placeEvents } from './place-events';
import { PlotCursor } from './PlotCursor';
import { PlotFrame, PlotGround } from './PlotFrame';
import { PlotMarks } from './PlotMarks';
import { divideHeight, measureWidth } from './plot-room';
import { makeTimeScale } from './time-scale';

/** The chart library is heavy and comes when a plot is first shown; axes, ratings and events stand meanwhile. */
const TraceLanes = lazy(() => import('./victory-layers').then((layers) => ({ default: layers.TraceLanes })));

export interface SplitTimePlotProps {
  traces: Traces;
  envelope: Envelope | null;
  events: readonly RunEvent[];
  ratings: { current?: RatingLine; temperature?: RatingLine; energy?: RatingLine };
  /** Names of the limiter elements; without any only the current is drawn. */
  elementNames: readonly string[];
  /** Which limiter element the lower two lanes show; the first when absent. */
  element?: number;
  /** From before the last edit: grey, without its band, under a plate. */
  stale?: boolean;
  /** Why the run ended early: a red edge where the traces stop. */
  stopped?: Stopped | null;
  width: number;
  height: number;
}

const BAND_OPACITY = { light: 0.15, dark: 0.22 } as const;

const useModel = ({ traces, envelope, events, ratings, elementNames, element = 0, width, height }: SplitTimePlotProps) =>
  useMemo(() => {
    const lanes = buildLanes({ traces, envelope, ratings, elementNames, element });
    const across = measureWidth(width);
    const lastOf = (times: readonly number[]) => times[times.length - 1] ?? 0;
    const scale = makeTimeScale(traces.foldAt, Math.max(lastOf(traces.soak.time), lastOf(traces.waveform.time)), across);
    const { placed, rows } = placeEvents(events, scale, across);
    const room = divideHeight(across, lanes, height, rows);
    const callouts = lanes[0] && room.lanes[0] ? findCallouts(lanes[0], room.lanes[0], room, scale) : [];
    return { lanes, scale, room, events: placed, callouts };
  }, [traces, envelope, events, ratings, elementNames, element, width, height]);

/** Current, temperature and energy over one time axis that is linear for the waveform and logarithmic for the soak. */
export const SplitTimePlot = (props: SplitTimePlotProps) => {
  const { width, height, stale = false, stopped = null } = props;
  const { colors, scheme } = useTheme();
  const { events, callouts, ...frame } = useModel(props);
  const shared = { ...frame, colors };
  return (
    <View role="group" aria-label="Power-up: current, temperature and energy against time" style={{ width, height }}>
      <Svg width={width} height={height} aria-hidden>
        <PlotGround room={frame.room} scale={frame.scale} colors={colors} />
        <Suspense fallback={null}>
          <TraceLanes {...shared} bandOpacity={BAND_OPACITY[scheme]} stale={stale} />
        </Suspense>
        <PlotFrame {...shared} />
        <PlotMarks {...shared} events={events} callouts={stale ? [] : callouts} stopped={stopped} />
      </Svg>
      {stale ? (
        <View style={{ position: 'absolute', left: frame.room.left + 8, top: frame.room.top + 10 }}><Plate text="Before your last edit" /></View>
      ) : (
        <PlotCursor {...shared} events={events} callouts={callouts} />
      )}
    </View>
  );
};
