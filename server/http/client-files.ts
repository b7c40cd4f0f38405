import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join, relative, sep } from 'node:path';

/** The exported client as it was when the server started. */
export interface ClientFiles {
  root: string;
  /** Paths below the root, with forward slashes. */
  files: Set<string>;
  /** Of every inline script in its pages, as the content policy wants them. */
  scriptHashes: readonly string[];
}

const INLINE_SCRIPT = /<script(?![^>]*\ssrc=)[^>]*>([\s\S]*?)<\/script>/gi;

const inlineScriptHashes = (html: string): string[] =>
  [...html.matchAll(INLINE_SCRIPT)].map(([, script = '']) => `sha256-${createHash('sha256').update(script).digest('base64')}`);

export const readClientFiles = (root: string): ClientFiles => {
  const entries = readdirSync(root, { recursive: true, withFileTypes: true });
  const files = new Set(entries.filter((entry) => entry.isFile()).map((entry) => relative(root, join(entry.parentPath, entry.name)).split(sep).join('/')));
  const pages = [...files].filter((file) => file.endsWith('.html'));
  const scriptHashes = [...new Set(pages.flatMap((page) => inlineScriptHashes(readFileSync(join(root, page), 'utf8'))))];
  return { root, files, scriptHashes };
};

/** The export names these by their content, so a name never gets other bytes. */
export const isNamedByContent = (file: string): boolean => /^(_expo\/static|assets)\//.test(file);

const isParameter = (segment: string) => segment.startsWith('[') && segment.endsWith(']');

/** How well a page such as scenarios/[scenarioId].html fits an address; null where it does not. Plain segments weigh more. */
const fitOf = (page: string, wanted: readonly string[]): number | null => {
  const segments = page.replace(/(\/index)?\.html$/, '').split('/');
  const fits = segments.length === wanted.length && segments.every((segment, index) => isParameter(segment) || segment === wanted[index]);
  return fits ? segments.filter((segment) => !isParameter(segment)).length : null;
};

const dynamicPage = (client: ClientFiles, path: string): string | null => {
  const wanted = path.split('/');
  let best: { page: string; fit: number } | null = null;
  for (const page of client.files) {
    const fit = page.endsWith('.html') && page.includes('[') ? fitOf(page, wanted) : null;
    if (fit !== null && (!best || fit > best.fit)) best = { page, fit };
  }
  return best?.page ?? null;
};

/**
 * The file that answers an address: the file itself, the page of that name, the page of a dynamic route,
 * or the page that says there is none. A client exported as one page answers every address with it.
 */
export const resolveClientFile = (client: ClientFiles, address: string): { file: string; status: 200 | 404 } | null => {
  const path = address.replace(/^\/+|\/+$/g, '');
  const candidates = path === '' ? ['index.html'] : [path, `${path}.html`, `${path}/index.html`];
  const found = candidates.find((candidate) => client.files.has(candidate)) ?? dynamicPage(client, path);
  if (found) return { file: found, status: 200 };
  if (client.files.has('+not-found.html')) return { file: '+not-found.html', status: 404 };
  const looksLikeFile = /\.\w+$/.test(path);
  return client.files.has('index.html') && !looksLikeFile ? { file: 'index.html', status: 200 } : null;
};
