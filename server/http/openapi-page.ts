import { PROBLEMS } from './problem-error';
import type { Route } from './route';
import { openApiPath } from './openapi';

type Json = Record<string, unknown>;

const STYLE = `
  :root { color-scheme: light dark; --ink: #1f1c18; --quiet: #5f574c; --paper: #faf7f2; --rule: #cfc6b8; }
  @media (prefers-color-scheme: dark) { :root { --ink: #ece6db; --quiet: #b0a696; --paper: #1b1916; --rule: #454037; } }
  body { margin: 0 auto; padding: 24px 16px 64px; max-width: 960px; background: var(--paper); color: var(--ink); font: 16px/1.5 system-ui, sans-serif; }
  h1 { font-size: 26px; } h2 { font-size: 20px; margin-top: 40px; border-bottom: 1px solid var(--rule); }
  h3 { font-size: 16px; margin: 28px 0 4px; } code, pre { font: 14px/1.45 ui-monospace, monospace; }
  pre { overflow: auto; max-height: 480px; border: 1px solid var(--rule); padding: 12px; }
  p { margin: 4px 0; } .quiet { color: var(--quiet); } a { color: inherit; } td { padding: 2px 16px 2px 0; vertical-align: top; }
  summary { cursor: pointer; padding: 6px 0; }`;

const escapeHtml = (text: string): string => text.replace(/[&<>"]/g, (sign) => `&#${sign.charCodeAt(0)};`);

const linkReferences = (html: string): string =>
  html.replace(/#\/components\/schemas\/(\w+)/g, (address, name: string) => `<a href="#${name}">${address}</a>`);

const schemaBlock = (schema: unknown): string => `<pre>${linkReferences(escapeHtml(JSON.stringify(schema, null, 2)))}</pre>`;

const operationSection = (route: Route, operation: Json): string => {
  const parts: [string, unknown][] = [
    ['Parameters', operation.parameters],
    ['Body', operation.requestBody],
    ['Answers', operation.responses],
  ];
  const details = parts
    .filter(([, value]) => value !== undefined && !(Array.isArray(value) && value.length === 0))
    .map(([title, value]) => `<details><summary>${title}</summary>${schemaBlock(value)}</details>`);
  return `<h3 id="${route.name}"><code>${route.method.toUpperCase()} ${escapeHtml(openApiPath(route.path))}</code></h3>
    <p>${escapeHtml(route.summary)}</p><p class="quiet">${escapeHtml(String(operation.description))}</p>${details.join('')}`;
};

const problemTable = (): string => {
  const rows = Object.entries(PROBLEMS).map(([code, { status, title }]) => `<tr id="${code}"><td>${status}</td><td><code>${code}</code></td><td>${escapeHtml(title)}</td></tr>`);
  return `<table><tbody>${rows.join('')}</tbody></table>`;
};

/** The same document to read: one page without scripts, nothing loaded from anywhere. */
export const openApiPage = (document: Json, routes: readonly Route[]): string => {
  const { info, paths, components } = document as { info: { title: string; version: string; description: string }; paths: Record<string, Record<string, Json>>; components: { schemas: Json } };
  const tags = [...new Set(routes.map((route) => route.tag))];
  const sections = tags.map((tag) => {
    const own = routes.filter((route) => route.tag === tag);
    return `<h2>${escapeHtml(tag)}</h2>${own.map((route) => operationSection(route, paths[openApiPath(route.path)]?.[route.method] ?? {})).join('')}`;
  });
  const schemas = Object.entries(components.schemas).map(([name, schema]) => `<details id="${name}"><summary><code>${name}</code></summary>${schemaBlock(schema)}</details>`);
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
    <title>${escapeHtml(info.title)}</title><style>${STYLE}</style></head><body><main>
    <h1>${escapeHtml(info.title)} <span class="quiet">${escapeHtml(info.version)}</span></h1><p>${escapeHtml(info.description)}</p>
    <p><a href="openapi.json">The same as OpenAPI 3.1</a></p>${sections.join('')}
    <h2>Problems</h2><p>Every error is answered as <code>application/problem+json</code>.</p>${problemTable()}
    <h2>Schemas</h2>${schemas.join('')}</main></body></html>`;
};
