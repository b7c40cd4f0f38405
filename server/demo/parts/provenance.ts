import type { PartInput } from '../../../shared/model/part';
import type { DemoPart } from '../types';

/** Where each figure of an invented data sheet stands, and the condition it is given at. */
const PLACES: readonly { figure: string; page: string; condition: string }[] = [
  { figure: 'law.r25', page: '2', condition: 'zero power, 25 °C' },
  { figure: 'law.b', page: '2', condition: '25/85 °C' },
  { figure: 'law.a', page: '2', condition: 'fitted from 0 °C to 150 °C' },
  { figure: 'law.c', page: '2', condition: 'fitted from 0 °C to 150 °C' },
  { figure: 'law.points', page: '2', condition: 'zero power, stirred bath' },
  { figure: 'law.resistance', page: '2', condition: '20 °C' },
  { figure: 'law.low', page: '2', condition: '23 °C, R_min to R_1max one hour after a trip' },
  { figure: 'law.high', page: '2', condition: 'at 160 °C' },
  { figure: 'law.midpoint', page: '2', condition: 'from hold currents at 23 °C and 60 °C' },
  { figure: 'law.width', page: '2', condition: 'from hold currents at 23 °C and 60 °C' },
  { figure: 'thermal.dissipation', page: '3', condition: 'still air, 25 °C, typical' },
  { figure: 'thermal.timeConstant', page: '3', condition: 'still air, from 85 °C to 25 °C' },
  { figure: 'thermal.heatCapacity', page: '3', condition: 'calorimeter, typical' },
  { figure: 'ratings.maximumTemperature', page: '4', condition: 'body, in operation' },
  { figure: 'ratings.steadyCurrent', page: '4', condition: 'at the ambient stated' },
  { figure: 'ratings.energy', page: '4', condition: 'one pulse' },
  { figure: 'ratings.capacitance', page: '4', condition: 'charged through the part alone' },
  { figure: 'ratings.maximumVoltage', page: '4', condition: 'in the tripped state' },
  { figure: 'ratings.maximumCurrent', page: '4', condition: 'at V_max' },
];

const has = (part: PartInput, figure: string): boolean => {
  const [branch, key] = figure.split('.') as ['law' | 'thermal' | 'ratings', string];
  const figures: object = part[branch] ?? {};
  return Object.hasOwn(figures, key);
};

/** An invented part with a line of provenance for each figure that it has. */
export const documented = (id: string, document: string, part: PartInput): DemoPart => ({
  id,
  part,
  provenance: PLACES.filter(({ figure }) => has(part, figure)).map((place) => ({ ...place, document })),
});
