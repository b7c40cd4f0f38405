/**
 * Cuts the four faces of the client down to what it writes: Latin, Greek and the signs of the trade.
 * Run `node assets/fonts/subset.mjs` after a change of the list below; the result is committed.
 */
import { copyFile, readFile, writeFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

import subsetFont from 'subset-font';

const require = createRequire(import.meta.url);
const here = dirname(fileURLToPath(import.meta.url));
const range = (from, to) => Array.from({ length: to - from + 1 }, (_, index) => String.fromCodePoint(from + index)).join('');

/** Both faces: basic and western Latin, the Greek of formulas, mathematical signs, typographic marks. */
const SIGNS = 'ΩµμΔαβγδεηθκλπρστφω°²³₀₁₂₃½±−×·÷≤≥≈≠→←↑↓√∞…–—‘’“”•‰€';
const SPACES = '\u0020\u00a0';
/** The rest of the letters of the European languages, for names of people and firms. */
const TEXT = range(0x20, 0x7e) + range(0xa0, 0x17f) + SIGNS + SPACES;
/** The mono face draws no Greek but Ω, µ and Δ; only numbers and what is typed stand in it. */
const MONO = range(0x20, 0x7e) + range(0xa0, 0xff) + SIGNS + SPACES;

const FACES = [
  { pack: 'sofia-sans-semi-condensed', file: '400Regular/SofiaSansSemiCondensed_400Regular.ttf', to: 'sofia-sans-400.woff2', text: TEXT },
  { pack: 'sofia-sans-semi-condensed', file: '600SemiBold/SofiaSansSemiCondensed_600SemiBold.ttf', to: 'sofia-sans-600.woff2', text: TEXT },
  { pack: 'sometype-mono', file: '400Regular/SometypeMono_400Regular.ttf', to: 'sometype-mono-400.woff2', text: MONO },
  { pack: 'sometype-mono', file: '600SemiBold/SometypeMono_600SemiBold.ttf', to: 'sometype-mono-600.woff2', text: MONO },
];
/** Kerning, marks, ligatures off the menu of variants: tabular figures are the only variant in use. */
const FEATURES = ['kern', 'mark', 'mkmk', 'ccmp', 'locl', 'tnum'];

const folderOf = (pack) => dirname(require.resolve(`@expo-google-fonts/${pack}/package.json`));

for (const { pack, file, to, text } of FACES) {
  const whole = await readFile(join(folderOf(pack), file));
  const part = await subsetFont(whole, text, { targetFormat: 'woff2', keepFeatures: FEATURES, noHinting: true });
  await writeFile(join(here, to), part);
  process.stdout.write(`${to}: ${(part.length / 1024).toFixed(1)} KiB of ${(whole.length / 1024).toFixed(1)} KiB\n`);
}
for (const pack of ['sofia-sans-semi-condensed', 'sometype-mono']) {
  await copyFile(join(folderOf(pack), 'LICENSE_FONT'), join(here, `${pack}.OFL.txt`));
}
