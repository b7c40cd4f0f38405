import { inputIssues } from '@/shared/model/input-issues';
import { scenarioSchema, type Scenario } from '@/shared/model/scenario';
import type { Dimension } from '@/shared/quantity/dimension';
import { parseQuantity } from '@/shared/quantity/parse';

import { nodeAt, type Draft } from './draft-tree';

export { loadUnits } from '@/shared/quantity/unit-reader';

/** What is wrong, by the path of the field. */
export type Issues = ReadonlyMap<string, string>;
export type Reading = { ok: true; scenario: Scenario } | { ok: false; issues: Issues };

/** The whole draft through the schema that the server uses. */
export const readDraft = (draft: Draft): Reading => {
  const parsed = scenarioSchema.safeParse(draft);
  if (parsed.success) return { ok: true, scenario: parsed.data };
  return { ok: false, issues: new Map(inputIssues(parsed.error).map(({ path, message }) => [path, message])) };
};

/** What a leaf of the draft comes to in SI, or null where it cannot be read. */
export const valueAt = (draft: Draft, path: string, dimension: Dimension): number | null => {
  const node = nodeAt(draft, path);
  if (typeof node === 'number') return node;
  const parsed = typeof node === 'string' ? parseQuantity(node, dimension) : null;
  return parsed?.ok ? parsed.value : null;
};
