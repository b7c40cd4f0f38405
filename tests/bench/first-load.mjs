/**
 * `npm run measure`: what the first page loads, compressed as the server sends it, against the figures to reach.
 * Scripts that a page asks for later (charts, units, editors) are not in its HTML and do not count.
 */
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { brotliCompressSync } from 'node:zlib';

const CLIENT = path.resolve(import.meta.dirname, '../../dist');
const KIB = 1024;
const AIMED_KIB = 365;
const MOST_KIB = 500;
const PAGES = ['sign-in.html', 'scenarios.html', 'index.html'];

const read = (name) => {
  try {
    return readFileSync(path.join(CLIENT, name), 'utf8');
  } catch {
    return null;
  }
};

const scriptsOf = (html) => [...html.matchAll(/<script[^>]+src="([^"]+)"/g)].map(([, source]) => source.replace(/^\//, ''));
const compressed = (name) => brotliCompressSync(readFileSync(path.join(CLIENT, name))).length / KIB;

const rows = PAGES.flatMap((page) => {
  const html = read(page) ?? read(page.replace('.html', '/index.html'));
  if (!html) return [];
  const scripts = scriptsOf(html);
  return [{ page, scripts: scripts.length, brotli: Number(scripts.reduce((sum, name) => sum + compressed(name), 0).toFixed(1)) }];
});

if (rows.length === 0) {
  console.error('The client is not built: run `npm run build` first.');
  process.exit(1);
}
console.table(rows.map(({ page, scripts, brotli }) => ({ page, scripts, 'brotli, KiB': brotli, aim: AIMED_KIB, most: MOST_KIB })));
process.exit(rows.some(({ brotli }) => brotli > MOST_KIB) ? 1 : 0);
