import type { ResistanceLaw } from '../circuit/path';

/** A resistor whose value does not move with temperature; Ω. */
export const fixedLaw = (ohms: number): ResistanceLaw => ({
  resistance: () => ohms,
  slope: () => 0,
  temperature: () => null,
  valid: { min: 0, max: Infinity },
});
