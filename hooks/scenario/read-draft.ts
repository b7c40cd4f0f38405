import { inputIssues } from '@/shared/model/input-issues';
import { scenarioSchema, type Scenario } from '@/shared/model/scenario';
import { parseQuantity, type ParsedQuantity } from '@/shared/quantity/parse';
import type { Dimension, Qualifier } from '@/shared/quantity/dimension';

import { isBranch, nodeAt, type Draft, type DraftNode } from './draft-tree';
import { fieldAt } from './field-table';

export type Issues = ReadonlyMap<string, string>;
export type Reading = { ok: true; scenario: Scenario } | { ok: false; issues: Issues };

/** Reads one field and refuses an rms value where a peak is asked for, and the other way round. */
export const readField = (text: string, dimension: Dimension, expected?: Qualifier): ParsedQuantity => {
  const parsed = parseQuantity(text, dimension);
  if (!parsed.ok || !parsed.qualifier || parsed.qualifier === expected) return parsed;
  if (!expected) return { ok: false, message: `this figure is neither rms nor peak; write it without "${parsed.qualifier}"` };
  const unit = dimension === 'voltage' ? 'V' : 'A';
  return { ok: false, message: `this field is in ${unit} ${expected}, not ${parsed.qualifier}; write for example 16 ${unit} ${expected}` };
};

const textsOf = (node: DraftNode, path: string): { path: string; text: string }[] => {
  if (typeof node === 'string') return [{ path, text: node }];
  if (!isBranch(node) && !Array.isArray(node)) return [];
  return Object.entries(node).flatMap(([key, child]) => textsOf(child, path ? `${path}.${key}` : key));
};

const qualifierIssues = (draft: Draft): [string, string][] =>
  textsOf(draft, '').flatMap(({ path, text }): [string, string][] => {
    const field = fieldAt(draft, path) ?? fieldAt(draft, path.replace(/\.(nominal|min|max)$/, ''));
    if (!field || path.endsWith('.tolerance') || text === 'worst') return [];
    const parsed = parseQuantity(text, field.dimension);
    if (!parsed.ok || !parsed.qualifier) return [];
    const read = readField(text, field.dimension, field.qualifier);
    return read.ok ? [] : [[path, read.message]];
  });

/** The whole draft through the schema that the server uses, with every issue under the path of its field. */
export const readDraft = (draft: Draft): Reading => {
  const parsed = scenarioSchema.safeParse(draft);
  const issues = new Map(parsed.success ? [] : inputIssues(parsed.error).map(({ path, message }) => [path, message]));
  qualifierIssues(draft).forEach(([path, message]) => issues.set(path, message));
  return parsed.success && issues.size === 0 ? { ok: true, scenario: parsed.data } : { ok: false, issues };
};

/** What a leaf of the draft comes to in SI, or null where it cannot be read. */
export const valueAt = (draft: Draft, path: string, dimension: Dimension): number | null => {
  const node = nodeAt(draft, path);
  if (typeof node === 'number') return node;
  const parsed = typeof node === 'string' ? parseQuantity(node, dimension) : null;
  return parsed?.ok ? parsed.value : null;
};
