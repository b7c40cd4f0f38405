import { Circle, G, Path } from 'react-native-svg';

import { SYMBOL_BOX, type SymbolProps } from './symbol-props';

/** IEC 60617: circle with the sign of the kind of current; the return goes to the bar below. */
const Source = ({ stroke, ground, sign, dashed }: SymbolProps & { sign: string; dashed?: string }) => (
  <G fill="none" stroke={stroke} strokeWidth={SYMBOL_BOX.line}>
    <Path d="M52 52v11M45 63h14" />
    <Circle cx={52} cy={38} r={14} fill={ground} />
    <Path d={sign} />
    {dashed ? <Path d={dashed} strokeDasharray="4 2.5" /> : null}
  </G>
);

export const AcSource = (props: SymbolProps) => <Source {...props} sign="M43 38c3-8 6-8 9 0s6 8 9 0" />;
export const DcSource = (props: SymbolProps) => <Source {...props} sign="M43.5 35.5h17" dashed="M43.5 41h17" />;
