import type { Check } from '@/shared/model/check';

/** The corner that governs a check in one line, such as `253 V · C +20 % · R −20 % · 40 °C · 80°`. */
export const describeCorner = (check: Check): string => check.remark ?? '';
