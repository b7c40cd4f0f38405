import { G, Path, Rect } from 'react-native-svg';

import { SYMBOL_BOX, type SymbolProps } from './symbol-props';

/** IEC 60617: rectifier, a diode in a square. */
export const Bridge = ({ stroke, ground }: SymbolProps) => (
  <G fill="none" stroke={stroke} strokeWidth={SYMBOL_BOX.line}>
    <Rect x={50} y={22} width={32} height={32} fill={ground} />
    <Path d="M56 38h20M62 32v12l9-6zM71 32v12" />
  </G>
);
