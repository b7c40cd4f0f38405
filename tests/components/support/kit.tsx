import { render } from '@testing-library/react-native';
import type { ReactElement } from 'react';

import { ThemeProvider } from '@/components/ui/theme';
import type { Check } from '@/shared/model/check';
import type { Corner } from '@/shared/model/corner';

/** Draws a piece of the kit under its theme. */
export const draw = (element: ReactElement) => render(element, { wrapper: ThemeProvider });

export const hotCorner: Corner = {
  factors: [
    { factor: 'ambient', level: 'high', value: 313.15, change: null },
    { factor: 'line', level: 'high', value: 253, change: 0.1 },
    { factor: 'capacitance', level: 'high', value: 564e-6, change: 0.2 },
    { factor: 'elementResistance', level: 'low', value: 8, change: -0.2 },
  ],
};

/** A failed check of the hot restart: 195.7 A against 80 A. */
export const failedRestart: Check = {
  id: 'restart-peak-current', element: 0, title: 'Peak current, hot restart', status: 'fail', dimension: 'current', kind: 'peak', sense: 'at-most',
  value: 195.7, nominal: 152, rating: 80, ratio: 195.7 / 80, nominalRatio: 152 / 80, margin: 1 - 195.7 / 80,
  corner: hotCorner, phase: 90, offTime: 0.178, basis: 'common practice', remark: null, setAside: null,
};
export const passed = (more: Partial<Check>): Check => ({
  ...failedRestart, id: 'peak-current', title: 'Peak current, cold start', status: 'pass', value: 60, nominal: 30, ratio: 0.75, nominalRatio: 0.375, margin: 0.25, offTime: null, ...more,
});
export const notAssessed: Check = {
  ...failedRestart, id: 'limiter-capacitance', title: 'Capacitance rating, C·V²', status: 'not-assessed', value: null, nominal: null, rating: null,
  ratio: null, nominalRatio: null, margin: null, corner: null, phase: null, offTime: null, remark: 'The part record holds no capacitance rating',
};
