import type { Check } from '../../shared/model/check';
import { temperatureCheck, type TemperatureCase } from './temperature-check';

/** Body temperature at thermal balance, or at the end of a run that is too short for it (K). */
export const limiterSteadyTemperatureCheck = (one: TemperatureCase, cautionBelow: number): Check =>
  temperatureCheck('limiter-steady-temperature', 'Body temperature at the end of the run', one, [], cautionBelow);
