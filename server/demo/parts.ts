import { ALDERSYKE_NTC } from './parts/aldersyke-ntc';
import { HOLMGARTH_NTC } from './parts/holmgarth-ntc';
import { MARROWBY_NTC } from './parts/marrowby-ntc';
import { SKELLMERE_RESISTOR } from './parts/skellmere-resistor';
import { THORNQUAY_NTC } from './parts/thornquay-ntc';
import { WRENFOLD_POLYMER_PTC } from './parts/wrenfold-polymer-ptc';
import type { DemoPart } from './types';

/** Invented parts of every kind; some lack ratings, as real records do. */
export const DEMO_PARTS: readonly DemoPart[] = [
  ...ALDERSYKE_NTC,
  ...THORNQUAY_NTC,
  ...MARROWBY_NTC,
  ...HOLMGARTH_NTC,
  ...WRENFOLD_POLYMER_PTC,
  ...SKELLMERE_RESISTOR,
];
