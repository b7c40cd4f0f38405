import { z } from 'zod';

import { quantity, toleranced } from './quantity';

export const bulkSchema = z.strictObject({
  capacitance: toleranced('capacitance', { min: 1e-7, max: 10, describe: 'Bulk capacitance' }),
  esr: toleranced('resistance', { min: 0, max: 100, describe: 'Series resistance of the bulk capacitor' }),
  initialVoltage: quantity('voltage', { min: 0, max: 1500, describe: 'Voltage before switch-on' }).default(0),
  bleeder: quantity('resistance', { min: 1, max: 1e9, describe: 'Bleeder across the bus' }).optional(),
  atLowAmbient: z
    .strictObject({
      capacitanceFactor: quantity('ratio', { min: 0.05, max: 1, describe: 'Capacitance at the lowest ambient over its value at 20 °C' }),
      esrFactor: quantity('count', { min: 1, max: 100, describe: 'ESR at the lowest ambient over its value at 20 °C' }),
    })
    .optional(),
});
export type Bulk = z.output<typeof bulkSchema>;
