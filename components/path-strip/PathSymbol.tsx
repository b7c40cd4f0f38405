import type { ComponentType } from 'react';
import { View } from 'react-native';
import Svg from 'react-native-svg';

import { Bridge } from './symbols/Bridge';
import { Capacitor } from './symbols/Capacitor';
import { Fuse } from './symbols/Fuse';
import { Ntc, NtcContact, Ptc, PtcContact, Resistor, ResistorContact } from './symbols/Limiters';
import { Converter, NoLoad, ResistiveLoad } from './symbols/Loads';
import { AcSource, DcSource } from './symbols/Sources';
import { SYMBOL_BOX, type SymbolProps } from './symbols/symbol-props';
import type { SymbolName } from './symbol-name';

const SYMBOLS: Record<SymbolName, ComponentType<SymbolProps> | null> = {
  'ac-source': AcSource, 'dc-source': DcSource, fuse: Fuse, ntc: Ntc, ptc: Ptc, resistor: Resistor,
  'ntc-contact': NtcContact, 'ptc-contact': PtcContact, 'resistor-contact': ResistorContact, bridge: Bridge,
  capacitor: Capacitor, converter: Converter, 'resistive-load': ResistiveLoad, 'no-load': NoLoad, wire: null,
};

const STARTS_HERE: readonly SymbolName[] = ['ac-source', 'dc-source'];
const ENDS_HERE: readonly SymbolName[] = ['converter', 'resistive-load', 'no-load'];
/** Where the wire of a last block ends, right of the middle: at the body's left edge. */
const BODY_HALF = 16;

/** One block's symbol on the wire that runs through all blocks. */
export const PathSymbol = ({ name, stroke, ground }: SymbolProps & { name: SymbolName }) => {
  const Drawn = SYMBOLS[name];
  const starts = STARTS_HERE.includes(name);
  const ends = ENDS_HERE.includes(name);
  return (
    <View aria-hidden style={{ height: 70, alignItems: 'center' }}>
      <View style={{ position: 'absolute', top: SYMBOL_BOX.wireY - SYMBOL_BOX.line / 2, height: SYMBOL_BOX.line, left: starts ? '50%' : 0, right: ends ? '50%' : 0, marginRight: ends ? BODY_HALF : 0, backgroundColor: stroke }} />
      <Svg width={SYMBOL_BOX.width} height={SYMBOL_BOX.height} viewBox={`0 0 ${SYMBOL_BOX.width} ${SYMBOL_BOX.height}`}>
        {Drawn ? <Drawn stroke={stroke} ground={ground} /> : null}
      </Svg>
    </View>
  );
};
