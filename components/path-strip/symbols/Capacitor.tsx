import { Circle, G, Path, Rect } from 'react-native-svg';

import { SYMBOL_BOX, type SymbolProps } from './symbol-props';

/** IEC 60617: polarised capacitor from the wire to the return bar. */
export const Capacitor = ({ stroke }: SymbolProps) => (
  <G fill="none" stroke={stroke} strokeWidth={SYMBOL_BOX.line}>
    <Circle cx={66} cy={38} r={2.4} fill={stroke} stroke="none" />
    <Path d="M66 38v6M66 56v7M59 63h14" />
    <Rect x={50} y={44} width={32} height={4.5} />
    <Rect x={50} y={52} width={32} height={4} fill={stroke} stroke="none" />
    <Path d="M39 46h6M42 43v6" strokeWidth={1.3} />
  </G>
);
