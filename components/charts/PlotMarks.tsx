import { G, Line, Path } from 'react-native-svg';

import type { Palette } from '@/components/ui/tokens';
import type { Stopped } from '@/shared/model/result';

import type { Callout } from './callouts';
import type { Lane } from './lanes';
import type { PlacedEvent } from './place-events';
import { EVENT_ROW, type PlotRoom } from './plot-room';
import { PlotText } from './PlotText';
import { timeText, type TimeScale } from './time-scale';

interface MarksProps {
  lanes: readonly Lane[];
  room: PlotRoom;
  scale: TimeScale;
  colors: Palette;
  events: readonly PlacedEvent[];
  callouts: readonly Callout[];
  stopped: Stopped | null;
}

const ratingY = (lane: Lane, room: PlotRoom, index: number): number => {
  const own = room.lanes[index]!;
  return lane.rating && !lane.rating.above ? own.toY(lane.rating.value) : own.top;
};

/** Each rating over the whole width, its name at the right, above the line. */
const Ratings = ({ lanes, room, scale, colors }: Pick<MarksProps, 'lanes' | 'room' | 'scale' | 'colors'>) => (
  <G>
    {lanes.map((lane, index) => {
      if (!lane.rating) return null;
      const y = ratingY(lane, room, index);
      const right = room.right - 4;
      if (lane.rating.above)
        return <PlotText key={lane.key} x={right} y={y + 13} anchor="end" size={room.fontSize} fill={colors.ink} halo={colors.panel}>{`${lane.rating.label}, far above`}</PlotText>;
      const across = scale.fold ? `M${room.left} ${y}H${scale.fold.left}M${scale.fold.right} ${y}H${room.right}` : `M${room.left} ${y}H${room.right}`;
      return (
        <G key={lane.key}>
          <Path d={`${across}M${room.right} ${y - 4}v8`} stroke={colors.ink} strokeWidth={1.3} fill="none" />
          <PlotText x={right} y={y - 5} anchor="end" size={room.fontSize} fill={colors.ink} halo={colors.panel}>{lane.rating.label}</PlotText>
        </G>
      );
    })}
  </G>
);

const Events = ({ events, room, colors }: Pick<MarksProps, 'events' | 'room' | 'colors'>) => (
  <G>
    {events.map(({ x, word }, index) => (
      <G key={index}>
        {x > room.left + 1 ? room.lanes.map(({ top, bottom }) => <Line key={top} x1={x} x2={x} y1={top} y2={bottom} stroke={colors.ink} strokeWidth={0.9} strokeDasharray="1 3" />) : null}
        <Path d={`M${x} ${room.bottom + 20}l4 6h-8z`} fill={colors.ink} />
        {word ? <PlotText x={word.x} y={room.bottom + 30 + word.row * EVENT_ROW} size={room.fontSize} fill={colors.ink}>{word.text}</PlotText> : null}
      </G>
    ))}
  </G>
);

/** Everything said on the plot: ratings last, so that nothing lies over them. */
export const PlotMarks = ({ lanes, room, scale, colors, events, callouts, stopped }: MarksProps) => (
  <G>
    <Events events={events} room={room} colors={colors} />
    {callouts.map(({ text, tip, x, y, anchor }) => (
      <G key={text}>
        {tip ? <Line x1={tip.x + (anchor === 'start' ? 2 : -2)} x2={anchor === 'start' ? x - 3 : x + 3} y1={y - 4} y2={y - 4} stroke={colors.current} strokeWidth={0.8} /> : null}
        <PlotText x={x} y={y} anchor={anchor} size={room.fontSize} fill={colors.current} halo={colors.panel}>{text}</PlotText>
      </G>
    ))}
    <Ratings lanes={lanes} room={room} scale={scale} colors={colors} />
    {stopped ? (
      <G>
        <Line x1={scale.toX(stopped.at)} x2={scale.toX(stopped.at)} y1={room.top} y2={room.bottom} stroke={colors.fail} strokeWidth={2} />
        <PlotText x={scale.toX(stopped.at) + 6} y={room.lanes[0]!.bottom - 8} size={room.fontSize} strong fill={colors.fail} halo={colors.panel}>{`stopped at ${timeText(stopped.at)}`}</PlotText>
      </G>
    ) : null}
  </G>
);
