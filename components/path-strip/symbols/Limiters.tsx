import { Circle, G, Path, Rect, Text } from 'react-native-svg';

import { FAMILY } from '@/components/ui/Text';

import { SYMBOL_BOX, type SymbolProps } from './symbol-props';

/** Nodes left and right of the body, and a make contact over it. */
const ContactLoop = ({ stroke }: { stroke: string }) => (
  <G>
    <Path d="M24 38V14h30M108 38V14H78M54 14L76 5" fill="none" stroke={stroke} strokeWidth={SYMBOL_BOX.line} />
    <Circle cx={24} cy={38} r={2.4} fill={stroke} />
    <Circle cx={108} cy={38} r={2.4} fill={stroke} />
  </G>
);

interface BodyProps extends SymbolProps {
  /** Beside the slash of a resistor that depends on temperature. */
  sign?: string;
  contact?: boolean;
}

/** IEC 60617: resistive body; a slash with a foot and ±t° where its resistance depends on temperature. */
const Body = ({ stroke, ground, sign, contact = false }: BodyProps) => (
  <G>
    <G fill="none" stroke={stroke} strokeWidth={SYMBOL_BOX.line}>
      <Rect x={46} y={31} width={40} height={14} fill={ground} />
      {sign ? <Path d="M52 53L78 24h9" /> : null}
    </G>
    {sign ? <Text x={90} y={57} fontSize={12.5} fontFamily={FAMILY.text} fill={stroke}>{sign}</Text> : null}
    {contact ? <ContactLoop stroke={stroke} /> : null}
  </G>
);

export const Ntc = (props: SymbolProps) => <Body {...props} sign="−t°" />;
export const Ptc = (props: SymbolProps) => <Body {...props} sign="+t°" />;
export const Resistor = (props: SymbolProps) => <Body {...props} />;
export const NtcContact = (props: SymbolProps) => <Body {...props} sign="−t°" contact />;
export const PtcContact = (props: SymbolProps) => <Body {...props} sign="+t°" contact />;
export const ResistorContact = (props: SymbolProps) => <Body {...props} contact />;
