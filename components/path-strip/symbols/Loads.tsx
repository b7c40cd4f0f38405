import { Circle, G, Path, Rect } from 'react-native-svg';

import { SYMBOL_BOX, type SymbolProps } from './symbol-props';

/** IEC 60617: DC to DC converter, which draws constant power. */
export const Converter = ({ stroke, ground }: SymbolProps) => (
  <G fill="none" stroke={stroke} strokeWidth={SYMBOL_BOX.line}>
    <Path d="M66 54v9M59 63h14" />
    <Rect x={50} y={22} width={32} height={32} fill={ground} />
    <Path d="M50 54L82 22" />
    <Path d="M54 29h9M54 33h9M69 44h9M69 48h9" strokeWidth={1.3} />
  </G>
);

export const ResistiveLoad = ({ stroke, ground }: SymbolProps) => (
  <G fill="none" stroke={stroke} strokeWidth={SYMBOL_BOX.line}>
    <Path d="M50 38h16v4M66 59v4M59 63h14" />
    <Rect x={60} y={42} width={12} height={17} fill={ground} />
  </G>
);

/** The path ends in an open terminal. */
export const NoLoad = ({ stroke, ground }: SymbolProps) => (
  <Circle cx={53} cy={38} r={3} fill={ground} stroke={stroke} strokeWidth={SYMBOL_BOX.line} />
);
