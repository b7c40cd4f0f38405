import { darkPalette, lightPalette, type ColorName, type Palette } from '@/components/ui/tokens';

/** Relative luminance and contrast as WCAG 2.2 defines them (https://www.w3.org/TR/WCAG22/#dfn-contrast-ratio). */
const luminance = (hex: string): number => {
  const [red, green, blue] = [1, 3, 5].map((at) => {
    const share = parseInt(hex.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red! + 0.7152 * green! + 0.0722 * blue!;
};
const contrast = (a: string, b: string): number => {
  const [dark, light] = [luminance(a), luminance(b)].sort((x, y) => x - y);
  return (light! + 0.05) / (dark! + 0.05);
};

const TEXT: ColorName[] = ['ink', 'quiet', 'current', 'voltage', 'temperature', 'energy', 'pass', 'caution', 'fail', 'notAssessed'];
const FILLED: ColorName[] = ['ink', 'current', 'temperature', 'energy', 'fail', 'caution', 'pass', 'notAssessed'];
const worst = (palette: Palette, texts: ColorName[], grounds: ColorName[]) =>
  Math.min(...texts.flatMap((text) => grounds.map((ground) => contrast(palette[text], palette[ground]))));

describe.each([['light', lightPalette], ['dark', darkPalette]] as const)('The %s palette', (_name, palette) => {
  it('keeps every text at 4.5 : 1 or more on paper and panel', () => {
    expect(worst(palette, TEXT, ['paper', 'panel'])).toBeGreaterThanOrEqual(4.5);
  });

  it('keeps text on filled tags and tiles at 4.5 : 1 or more', () => {
    expect(worst(palette, ['onFilled'], FILLED)).toBeGreaterThanOrEqual(4.5);
  });
});
