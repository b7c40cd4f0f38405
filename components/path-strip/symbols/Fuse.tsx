import { G, Path, Rect } from 'react-native-svg';

import { SYMBOL_BOX, type SymbolProps } from './symbol-props';

/** IEC 60617: a body with the conductor drawn through it. */
export const Fuse = ({ stroke, ground }: SymbolProps) => (
  <G fill="none" stroke={stroke} strokeWidth={SYMBOL_BOX.line}>
    <Rect x={46} y={31} width={40} height={14} fill={ground} />
    <Path d="M46 38h40" />
  </G>
);
