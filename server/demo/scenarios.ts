import { CONTACT_FAILS_OPEN, HOT_RESTART, PRECHARGE } from './scenarios/with-contact';
import { COLD_START, OVER_ENERGY, RAIL_FAULT, RATING_MISSING, WITHIN_RATINGS } from './scenarios/without-contact';
import type { DemoScenario } from './types';

/** Invented scenarios, each with a finding; the first is the one that a new person is shown. */
export const DEMO_SCENARIOS: readonly DemoScenario[] = [
  HOT_RESTART,
  CONTACT_FAILS_OPEN,
  COLD_START,
  OVER_ENERGY,
  WITHIN_RATINGS,
  RAIL_FAULT,
  RATING_MISSING,
  PRECHARGE,
];
