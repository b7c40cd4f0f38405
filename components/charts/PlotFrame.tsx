import { Defs, G, Line, LinearGradient, Path, Rect, Stop, TSpan } from 'react-native-svg';

import { FAMILY } from '@/components/ui/Text';
import type { Palette } from '@/components/ui/tokens';

import type { Lane } from './lanes';
import { headWords, type PlotRoom } from './plot-room';
import { PlotText, textWidth } from './PlotText';
import type { TimeScale } from './time-scale';

interface FrameProps {
  lanes: readonly Lane[];
  room: PlotRoom;
  scale: TimeScale;
  colors: Palette;
}

const V = 6;

/** The panel under each lane, with the lines of the time axis. */
export const PlotGround = ({ room, scale, colors }: Omit<FrameProps, 'lanes'>) => (
  <G>
    {room.lanes.map(({ top, bottom }) => (
      <G key={top}>
        <Rect x={room.left} y={top} width={room.right - room.left} height={bottom - top} fill={colors.panel} />
        {scale.major.map((time) => <Line key={time} x1={scale.toX(time)} x2={scale.toX(time)} y1={top} y2={bottom} stroke={colors.rule} strokeWidth={0.75} />)}
        <Line x1={room.right} x2={room.right} y1={top} y2={bottom} stroke={colors.rule2} strokeWidth={1} />
      </G>
    ))}
  </G>
);

const ruleWithFold = (y: number, { left, right }: PlotRoom, { fold }: TimeScale) =>
  fold ? `M${left} ${y}H${fold.left}L${(fold.left + fold.right) / 2} ${y + V}L${fold.right} ${y}H${right}` : `M${left} ${y}H${right}`;

/** Where the axis turns from linear to logarithmic: the paper is folded, not cut. */
const Fold = ({ room, scale, colors }: Omit<FrameProps, 'lanes'>) => {
  if (!scale.fold) return null;
  const { left, right } = scale.fold;
  const middle = (left + right) / 2;
  return (
    <G>
      <Defs>
        <LinearGradient id="fold" x1="0" x2="1" y1="0" y2="0">
          <Stop offset="0" stopColor={colors.panel} />
          <Stop offset="0.47" stopColor={colors.fold1} />
          <Stop offset="0.5" stopColor={colors.rule2} />
          <Stop offset="0.54" stopColor={colors.fold2} />
          <Stop offset="1" stopColor={colors.panel} />
        </LinearGradient>
      </Defs>
      <Path d={`M${left} ${room.top}L${middle} ${room.top + V}L${right} ${room.top}V${room.bottom}L${middle} ${room.bottom + V}L${left} ${room.bottom}Z`} fill="url(#fold)" />
      <Path d={`M${left} ${room.top}V${room.bottom}M${right} ${room.top}V${room.bottom}`} stroke={colors.rule2} strokeWidth={1} fill="none" />
    </G>
  );
};

const tickText = (seconds: number, inMilliseconds: boolean) => `${Number((inMilliseconds ? seconds * 1000 : seconds).toPrecision(6))}`;

const TimeAxis = ({ room, scale, colors }: Omit<FrameProps, 'lanes'>) => {
  const { bottom, right, fontSize } = room;
  const inWaveform = (time: number) => !scale.fold || time < scale.foldAt * 0.9999;
  const labelY = bottom + 17;
  const last = scale.major[scale.major.length - 1] ?? 0;
  const endText = tickText(scale.end, !scale.fold);
  const endFits = last < scale.end * 0.9999 && right - scale.toX(last) > textWidth(endText, fontSize, true) + textWidth(tickText(last, !scale.fold), fontSize, true) / 2 + 8;
  return (
    <G>
      {scale.minor.map((time) => <Line key={`minor-${time}`} x1={scale.toX(time)} x2={scale.toX(time)} y1={bottom} y2={bottom + 3} stroke={colors.rule2} />)}
      {scale.major.map((time) => {
        const atFold = scale.fold !== null && Math.abs(time / scale.foldAt - 1) < 1e-6;
        const x = atFold ? scale.fold!.right : scale.toX(time);
        return (
          <G key={`major-${time}`}>
            <Line x1={x} x2={x} y1={bottom} y2={bottom + 5} stroke={colors.ink} />
            <PlotText x={atFold ? x + 2 : x} y={labelY} anchor={atFold ? 'start' : 'middle'} size={fontSize} mono fill={colors.ink}>{tickText(time, inWaveform(time))}</PlotText>
          </G>
        );
      })}
      {scale.fold && endFits ? <PlotText x={right} y={labelY} anchor="end" size={fontSize} mono fill={colors.ink}>{endText}</PlotText> : null}
      <PlotText x={(scale.fold?.left ?? right) - 2} y={labelY} anchor="end" size={fontSize} fill={colors.quiet}>ms</PlotText>
      {scale.fold ? <PlotText x={right} y={bottom + 30} anchor="end" size={fontSize} fill={colors.quiet}>s</PlotText> : null}
    </G>
  );
};

/** Rules, fold, time axis and the titles of lanes and halves; lies over the traces so that none runs through the fold. */
export const PlotFrame = ({ lanes, room, scale, colors }: FrameProps) => (
  <G>
    <Fold room={room} scale={scale} colors={colors} />
    <Path d={ruleWithFold(room.top, room, scale)} stroke={colors.ink} strokeWidth={1} fill="none" />
    <Path d={ruleWithFold(room.bottom, room, scale)} stroke={colors.ink} strokeWidth={1.2} fill="none" />
    <TimeAxis room={room} scale={scale} colors={colors} />
    {lanes.map((lane, index) => {
      const y = room.lanes[index]!.top - (index === 0 ? 9 : 5);
      return (
        <PlotText key={lane.key} x={room.left} y={y} size={room.fontSize} strong fill={colors[lane.tone]}>
          {lane.title}
          <TSpan fontFamily={FAMILY.text} fill={colors.quiet}>{` ${lane.unit}`}</TSpan>
        </PlotText>
      );
    })}
    {headWords(room, scale).map(({ text, x, anchor }) => <PlotText key={text} x={x} y={13} anchor={anchor} size={room.fontSize} fill={colors.quiet}>{text}</PlotText>)}
  </G>
);
