export type Path = readonly string[];

const isBranch = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null;

const childOf = (value: unknown, key: string): unknown => (isBranch(value) && Object.hasOwn(value, key) ? value[key] : undefined);

/** A copy with one value written anew; branches that are absent are made. */
export const written = (node: unknown, [key, ...rest]: Path, value: unknown): unknown => {
  if (key === undefined) return value;
  const child = written(childOf(node, key), rest, value);
  if (Array.isArray(node)) return Object.assign([...(node as unknown[])], { [key]: child });
  return { ...(isBranch(node) ? node : {}), [key]: child };
};

/** A copy with one value left out. */
export const without = (node: unknown, [key, ...rest]: Path): unknown => {
  if (key === undefined || !isBranch(node)) return node;
  if (Array.isArray(node)) return node.map((child: unknown, index) => (String(index) === key ? without(child, rest) : child));
  if (rest.length > 0) return { ...node, [key]: without(node[key], rest) };
  return Object.fromEntries(Object.entries(node).filter(([name]) => name !== key));
};
