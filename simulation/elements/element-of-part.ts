import type { Level } from '../../shared/model/corner';
import type { Element } from '../../shared/model/limiter';
import type { NtcLaw, Part, Thermal } from '../../shared/model/part';
import type { Toleranced } from '../../shared/model/quantity';
import type { PathElement, ResistanceLaw } from '../circuit/path';
import { bValueLaw } from '../laws/b-value';
import { fixedLaw } from '../laws/fixed';
import { polymerPtcLaw } from '../laws/polymer-ptc';
import { steinhartHartLaw } from '../laws/steinhart-hart';
import { tableLaw } from '../laws/table';

/** Where in their tolerances the resistance and the B-value of an element stand. */
export interface ElementLevels {
  resistance: Level;
  b: Level;
}

const bandAt = (band: Toleranced, level: Level): number => ({ low: band.min, nominal: band.nominal, high: band.max })[level];
const scaleAt = (tolerance: number, level: Level): number => ({ low: 1 - tolerance, nominal: 1, high: 1 + tolerance })[level];

const ntcLaw = (law: NtcLaw, levels: ElementLevels): ResistanceLaw => {
  if (law.law === 'b-value') return bValueLaw(bandAt(law.r25, levels.resistance), bandAt(law.b, levels.b));
  const scale = scaleAt(law.tolerance, levels.resistance);
  return law.law === 'table' ? tableLaw(law.points, scale) : steinhartHartLaw(law.a, law.b, law.c, scale);
};

/** R(T) of a part with its tolerances set to a level each. */
export const lawOfPart = (part: Part, levels: ElementLevels): ResistanceLaw => {
  switch (part.kind) {
    case 'ntc':
      return ntcLaw(part.law, levels);
    case 'polymer-ptc': {
      const { low, high, midpoint, width } = part.law;
      const scale = bandAt(low, levels.resistance) / low.nominal;
      return polymerPtcLaw(low.nominal * scale, high * scale, midpoint, width);
    }
    case 'resistor':
      return fixedLaw(bandAt(part.law.resistance, levels.resistance));
  }
};

/** C_th = δ·τ where the record has the time constant; J/K. Source: IEC 60539-1 (from memory). */
export const heatCapacityOf = (thermal: Thermal): number =>
  'heatCapacity' in thermal ? thermal.heatCapacity : thermal.dissipation * thermal.timeConstant;

export const pathElement = ({ part, bypass }: Element, levels: ElementLevels): PathElement => ({
  name: part.name,
  kind: part.kind,
  law: lawOfPart(part, levels),
  dissipation: part.thermal.dissipation,
  heatCapacity: heatCapacityOf(part.thermal),
  bypass: bypass
    ? { closes: bypass.closes, releaseTime: bypass.releaseTime, contactResistance: bypass.contactResistance, behaviour: bypass.behaviour }
    : null,
});
