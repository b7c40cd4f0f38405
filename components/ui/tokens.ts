import type { Status } from '@/shared/model/check';

/** One colour for one meaning, on warm ceramic paper by day and on slate by night. */
export const lightPalette = {
  paper: '#F5F2EC', panel: '#FCFAF6', ink: '#1D2327', quiet: '#586168', rule: '#D9D3C7', rule2: '#BDB5A5',
  current: '#1F5FA8', voltage: '#0B6F6E', temperature: '#B83C0A', energy: '#7A3E9D',
  pass: '#2A7348', caution: '#8A5800', fail: '#B3261E', notAssessed: '#5F6773',
  onFilled: '#FCFAF6', fold1: '#E6E0D3', fold2: '#FBF9F4',
} as const;

export type ColorName = keyof typeof lightPalette;
export type Palette = Readonly<Record<ColorName, string>>;

export const darkPalette: Palette = {
  paper: '#14181B', panel: '#1C2226', ink: '#ECE7DD', quiet: '#A3ADB4', rule: '#2E363B', rule2: '#4A545A',
  current: '#82B4EE', voltage: '#58C4C0', temperature: '#F4936A', energy: '#CB9FE6',
  pass: '#74C898', caution: '#E3AC4A', fail: '#F58C82', notAssessed: '#A3ABB5',
  onFilled: '#14181B', fold1: '#0D1012', fold2: '#252C31',
};

export const STATUS_COLOR: Record<Status, ColorName> = {
  pass: 'pass', caution: 'caution', fail: 'fail', 'not-assessed': 'notAssessed',
};

/** Names under which the four faces are loaded. */
export const FACES = { text: 'SofiaSans', textStrong: 'SofiaSansStrong', mono: 'SometypeMono', monoStrong: 'SometypeMonoStrong' } as const;

/** Size and line height in px. */
export const TYPE = {
  verdict: { fontSize: 24, lineHeight: 26 },
  title: { fontSize: 18, lineHeight: 20 },
  body: { fontSize: 15, lineHeight: 20 },
  label: { fontSize: 14, lineHeight: 18 },
  secondary: { fontSize: 13, lineHeight: 17 },
  legend: { fontSize: 12.5, lineHeight: 16 },
} as const;
export type TextVariant = keyof typeof TYPE;

export const SPACE = { xs: 4, s: 8, m: 12, l: 16, xl: 20 } as const;
export const GUTTER = { phone: 16, wide: 20 } as const;
export const RADIUS = { button: 6, window: 2 } as const;
/** From this width on, rail, list and detail stand side by side. */
export const WIDE_FROM = 900;
/** Height of what is pressed: with a finger, with a pointer. */
export const TARGET = { finger: 44, pointer: 36 } as const;
