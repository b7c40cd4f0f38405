import type { Check } from '../../shared/model/check';
import { temperatureCheck, type TemperatureCase } from './temperature-check';

const UNEVEN = 'A short pulse heats a body unevenly, which one thermal node does not see, and no energy check that passes covers it.';

/** Highest body temperature of the power-up (K). A one-node peak is optimistic: at best a caution unless the energy passes. */
export const limiterPeakTemperatureCheck = (one: TemperatureCase, energyPasses: boolean, cautionBelow: number): Check =>
  temperatureCheck('limiter-peak-temperature', 'Highest body temperature of the power-up', one, energyPasses ? [] : [UNEVEN], cautionBelow);
