import { useMemo, useState } from 'react';
import { View, type PointerEvent as NativePointer } from 'react-native';
import Svg, { Circle, G, Line, Path, Rect } from 'react-native-svg';

import { onKeys } from '@/components/ui/keys';
import type { Palette } from '@/components/ui/tokens';

import type { Callout } from './callouts';
import { laneObstacles, readLanes, sayReadings } from './cursor-reading';
import type { Lane } from './lanes';
import type { PlacedEvent } from './place-events';
import { placeTag } from './place-tag';
import { headWords, type PlotRoom } from './plot-room';
import { PlotText, textWidth } from './PlotText';
import { timeText, type TimeScale } from './time-scale';

export interface PlotCursorProps {
  lanes: readonly Lane[];
  room: PlotRoom;
  scale: TimeScale;
  colors: Palette;
  events: readonly PlacedEvent[];
  callouts: readonly Callout[];
}

const KEY_STEP = 4;
const TAG = { height: 18, padding: 8 } as const;
/** Where the cursor stands at first, as a share of the soak (or of the whole without one): past the pulse, in the settling. */
const FIRST_AT = 0.6;

const firstX = ({ right, left }: PlotRoom, { fold }: TimeScale) => {
  const from = fold?.right ?? left;
  return from + (right - from) * FIRST_AT;
};

const keyTarget = (key: string, x: number, { left, right }: PlotRoom, events: readonly PlacedEvent[]): number | undefined => {
  const ahead = events.map((event) => event.x).filter((at) => at > x + 0.5);
  const behind = events.map((event) => event.x).filter((at) => at < x - 0.5);
  return { ArrowRight: x + KEY_STEP, ArrowUp: x + KEY_STEP, ArrowLeft: x - KEY_STEP, ArrowDown: x - KEY_STEP, Home: left, End: right, PageUp: Math.min(right, ...ahead), PageDown: Math.max(left, ...behind) }[key];
};

/** The ground behind the time: it takes a word of the head away as a whole, never half of it. */
const coverOf = ([from, to]: [number, number], room: PlotRoom, scale: TimeScale): [number, number] =>
  headWords(room, scale).reduce<[number, number]>(
    (cover, { text, x, anchor }) => {
      const width = textWidth(text, room.fontSize) + 6;
      const [start, end] = anchor === 'start' ? [x - 1, x + width] : [x - width, x + 1];
      return start < to && from < end ? [Math.min(cover[0], start), Math.max(cover[1], end)] : cover;
    },
    [from, to],
  );

/** Cursor line with its time, and in each lane a ring on the trace and a tag with the value. */
const Drawn = ({ x, lanes, room, scale, colors, obstacles }: Omit<PlotCursorProps, 'events' | 'callouts'> & { x: number; obstacles: ReturnType<typeof laneObstacles>[] }) => {
  const at = scale.toTime(x);
  const time = timeText(at);
  const half = textWidth(time, room.fontSize, true) / 2 + 3;
  const timeX = Math.min(Math.max(x, room.left + half), room.right - half);
  const cover = coverOf([timeX - half, timeX + half], room, scale);
  return (
    <G>
      <Rect x={cover[0]} y={1} width={cover[1] - cover[0]} height={15} fill={colors.paper} />
      <PlotText x={timeX} y={13} anchor="middle" size={room.fontSize} mono strong fill={colors.ink}>{time}</PlotText>
      <Line x1={x} x2={x} y1={room.top} y2={room.bottom} stroke={colors.ink} strokeWidth={1.2} />
      <Path d={`M${x - 5} ${room.top}h10l-5 6z`} fill={colors.ink} />
      {readLanes(lanes, scale, at).map(({ key, value, text }, index) => {
        if (value === null) return null;
        const own = room.lanes[index]!;
        const y = own.toY(value);
        const width = textWidth(text, room.fontSize, true) + TAG.padding * 2;
        const inSoak = scale.fold !== null && at > scale.foldAt;
        const bounds = { left: inSoak ? scale.fold!.right : room.left, right: room.right, top: own.top, bottom: own.bottom };
        const tag = placeTag(x, y, width, TAG.height, bounds, obstacles[index] ?? []);
        return (
          <G key={key}>
            <Circle cx={x} cy={y} r={3.2} fill={colors.panel} stroke={colors[key]} strokeWidth={1.5} />
            <Rect x={tag.x} y={tag.y} width={width} height={TAG.height} rx={2} fill={colors[key]} />
            <PlotText x={tag.x + width / 2} y={tag.y + 13.5} anchor="middle" size={room.fontSize} mono strong fill={colors.onFilled}>{text}</PlotText>
          </G>
        );
      })}
    </G>
  );
};

/** One cursor for all lanes: by pointer or finger, by arrow keys, and spoken. */
export const PlotCursor = (props: PlotCursorProps) => {
  const { lanes, room, scale, events, callouts } = props;
  const [share, setShare] = useState<number | null>(null);
  const span = room.right - room.left;
  const x = share === null ? firstX(room, scale) : room.left + share * span;
  const obstacles = useMemo(() => lanes.map((lane, index) => laneObstacles(lane, room.lanes[index]!, room, scale, callouts)), [lanes, room, scale, callouts]);
  const moveTo = (to: number) => {
    const clamped = Math.min(Math.max(to, room.left), room.right);
    const inFold = scale.fold && clamped > scale.fold.left && clamped < scale.fold.right;
    setShare(((inFold ? (to > x ? scale.fold!.right : scale.fold!.left) : clamped) - room.left) / span);
  };
  const onPointer = (event: NativePointer) => moveTo(event.nativeEvent.offsetX);
  const onKey = (key: string) => {
    const to = keyTarget(key, x, room, events);
    if (to !== undefined) moveTo(to);
    return to !== undefined;
  };
  const at = scale.toTime(x);
  return (
    <View style={{ position: 'absolute', inset: 0 }}>
      <Svg width={room.width} height={room.height} aria-hidden><Drawn {...props} x={x} obstacles={obstacles} /></Svg>
      <View
        role="slider"
        tabIndex={0}
        aria-label="Cursor of the plot"
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={Math.round(((x - room.left) / span) * 100)}
        aria-valuetext={sayReadings(at, readLanes(lanes, scale, at))}
        onPointerDown={onPointer}
        onPointerMove={onPointer}
        {...onKeys(onKey)}
        style={[{ position: 'absolute', inset: 0, cursor: 'pointer' }, PAN_UP_AND_DOWN]}
      />
    </View>
  );
};

/** A finger moves the cursor sideways and still scrolls the page; React Native's types do not know the property of the web. */
const PAN_UP_AND_DOWN = { touchAction: 'pan-y' } as object;
