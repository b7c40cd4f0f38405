import type { Check } from '../../shared/model/check';
import { temperatureCheck, type TemperatureCase } from './temperature-check';

/** Highest body temperature (K) of a run whose contact never closes: the limiter must survive it. */
export const bypassNeverClosesCheck = (one: TemperatureCase, cautionBelow: number): Check =>
  temperatureCheck('bypass-never-closes', 'Highest body temperature with the contact never closing', one, [], cautionBelow);
