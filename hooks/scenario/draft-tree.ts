import type { Scenario, ScenarioInput } from '@/shared/model/scenario';

/**
 * A draft as the person wrote it: the scenario document, where a field that was typed in holds its text
 * and every other its SI number. The schema of the scenario reads both.
 */
export type DraftNode = string | number | boolean | null | undefined | readonly DraftNode[] | { readonly [key: string]: DraftNode };
export type Draft = { readonly [key: string]: DraftNode };

/** A scenario is a draft that nobody has typed in yet. */
export const draftOf = (scenario: Scenario | ScenarioInput): Draft => scenario as object as Draft;

export const isBranch = (node: DraftNode): node is Draft => typeof node === 'object' && node !== null && !Array.isArray(node);
const isList = (node: DraftNode): node is readonly DraftNode[] => Array.isArray(node);

const split = (path: string) => path.split('.');

/** What stands at a path such as `limiter.0.part.thermal`; undefined where nothing does. */
export const nodeAt = (draft: DraftNode, path: string): DraftNode =>
  split(path).reduce<DraftNode>((node, key) => {
    if (isList(node)) return node[Number(key)];
    return isBranch(node) ? node[key] : undefined;
  }, draft);

const written = (node: DraftNode, keys: readonly string[], value: DraftNode): DraftNode => {
  const [key, ...rest] = keys;
  if (key === undefined) return value;
  if (isList(node)) {
    const index = Number(key);
    const next = written(node[index], rest, value);
    if (next === undefined) return node.filter((_, at) => at !== index);
    return index < node.length ? node.map((one, at) => (at === index ? next : one)) : [...node, next];
  }
  const branch = isBranch(node) ? node : {};
  const next = written(branch[key], rest, value);
  if (next !== undefined) return { ...branch, [key]: next };
  const { [key]: _, ...others } = branch;
  return others;
};

/** The draft with a value at a path; undefined takes the field, block or list entry away. */
export const withNode = (draft: Draft, path: string, value: DraftNode): Draft => written(draft, split(path), value) as Draft;

export const listAt = (draft: Draft, path: string): readonly DraftNode[] => {
  const node = nodeAt(draft, path);
  return isList(node) ? node : [];
};
