import { createContext, useContext, useEffect, useMemo, useSyncExternalStore, type ReactNode } from 'react';
import { Platform, useColorScheme } from 'react-native';

import { darkPalette, lightPalette, WIDE_FROM, type ColorName, type Palette } from './tokens';

export type ThemeChoice = 'system' | 'light' | 'dark';
export interface Theme {
  /** On the web custom properties, elsewhere plain colours: good for styles and for SVG alike. */
  colors: Palette;
  scheme: 'light' | 'dark';
  choice: ThemeChoice;
  setChoice: (choice: ThemeChoice) => void;
}

const STORED_AS = 'tidegate.theme';
const isWeb = Platform.OS === 'web';
const names = Object.keys(lightPalette) as ColorName[];
const cssPalette = Object.fromEntries(names.map((name) => [name, `var(--${name})`])) as Palette;

let kept: ThemeChoice | null = null;
const listeners = new Set<() => void>();

const readChoice = (): ThemeChoice => {
  if (kept) return kept;
  const stored = isWeb && typeof localStorage !== 'undefined' ? localStorage.getItem(STORED_AS) : null;
  kept = stored === 'light' || stored === 'dark' ? stored : 'system';
  return kept;
};

const keepChoice = (choice: ThemeChoice) => {
  kept = choice;
  if (isWeb) {
    if (choice === 'system') localStorage.removeItem(STORED_AS);
    else localStorage.setItem(STORED_AS, choice);
  }
  listeners.forEach((listener) => listener());
};

const onChoice = (changed: () => void) => {
  listeners.add(changed);
  return () => void listeners.delete(changed);
};

/** The root element wears the choice, so that the custom properties follow it. */
const wear = (choice: ThemeChoice) => {
  if (!isWeb) return;
  if (choice === 'system') document.documentElement.removeAttribute('data-theme');
  else document.documentElement.setAttribute('data-theme', choice);
};

const ThemeContext = createContext<Theme | null>(null);

/** Follows the system's light or dark until the person chooses; the choice is kept in this browser. */
export const ThemeProvider = ({ children }: { children: ReactNode }) => {
  const system = useColorScheme() === 'dark' ? 'dark' : 'light';
  const choice = useSyncExternalStore(onChoice, readChoice, () => 'system' as const);
  useEffect(() => wear(choice), [choice]);
  const theme = useMemo<Theme>(() => {
    const scheme = choice === 'system' ? system : choice;
    const plain = scheme === 'dark' ? darkPalette : lightPalette;
    return { colors: isWeb ? cssPalette : plain, scheme, choice, setChoice: keepChoice };
  }, [choice, system]);
  return <ThemeContext.Provider value={theme}>{children}</ThemeContext.Provider>;
};

export const useTheme = (): Theme => {
  const theme = useContext(ThemeContext);
  if (!theme) throw new Error('useTheme needs a ThemeProvider above it');
  return theme;
};

export interface Layout {
  /** Rail, list and detail side by side. */
  wide: boolean;
  width: number;
  /** A mouse or pen rather than a finger. */
  finePointer: boolean;
}

/** What a page is drawn for before its window is known. */
const FIRST_LAYOUT: Layout = { wide: false, width: 390, finePointer: false };
let layout = FIRST_LAYOUT;

const readLayout = (): Layout => {
  if (!isWeb || typeof window === 'undefined') return FIRST_LAYOUT;
  const width = window.innerWidth;
  const finePointer = window.matchMedia('(pointer: fine)').matches;
  if (width !== layout.width || finePointer !== layout.finePointer) layout = { wide: width >= WIDE_FROM, width, finePointer };
  return layout;
};

const onResize = (changed: () => void) => {
  if (!isWeb) return () => undefined;
  window.addEventListener('resize', changed);
  return () => window.removeEventListener('resize', changed);
};

export const useLayout = (): Layout => useSyncExternalStore(onResize, readLayout, () => FIRST_LAYOUT);
