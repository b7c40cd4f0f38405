import { Text } from 'react-native-svg';
import type { ReactNode } from 'react';

import { FAMILY } from '@/components/ui/Text';

export interface PlotTextProps {
  x: number;
  y: number;
  fill: string;
  children: ReactNode;
  size?: number;
  anchor?: 'start' | 'middle' | 'end';
  mono?: boolean;
  strong?: boolean;
  /** Colour of the ground, drawn 4 px wide behind the letters so that lines do not run through them. */
  halo?: string;
  /** Degrees, about its own point. */
  turn?: number;
}

/** Text inside a drawing: SVG takes no face from around it, so each piece names its own. */
export const PlotText = ({ x, y, fill, children, size = 12.5, anchor = 'start', mono = false, strong = false, halo, turn }: PlotTextProps) => {
  const family = mono ? (strong ? FAMILY.monoStrong : FAMILY.mono) : strong ? FAMILY.textStrong : FAMILY.text;
  const own = { x, y, fontSize: mono ? size * 0.96 : size, fontFamily: family, textAnchor: anchor, ...(turn === undefined ? {} : { transform: `rotate(${turn} ${x} ${y})` }) };
  return (
    <>
      {halo ? <Text {...own} fill={halo} stroke={halo} strokeWidth={4} strokeLinejoin="round" aria-hidden>{children}</Text> : null}
      <Text {...own} fill={fill}>{children}</Text>
    </>
  );
};

const CHARACTER = { text: 0.45, mono: 0.58 } as const;
/** About how wide a piece of text comes out, px. */
export const textWidth = (text: string, size: number, mono = false): number => text.length * size * (mono ? CHARACTER.mono : CHARACTER.text);
