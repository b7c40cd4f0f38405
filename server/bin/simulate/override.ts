import { InputProblem } from './problem';

/** One `--at key=value`: a field by its dotted path and what to write there. */
export interface Override {
  path: readonly string[];
  value: unknown;
}

/** Text as an engineer types it; only what begins with `{` or `[` is read as JSON. */
const readValue = (key: string, text: string): unknown => {
  if (!/^\s*[{[]/.test(text)) return text;
  try {
    return JSON.parse(text);
  } catch {
    throw new InputProblem('A value of --at is not valid JSON.', [{ path: key, message: 'begins with { or [ but is not valid JSON' }]);
  }
};

export const readOverride = (text: string): Override => {
  const equals = text.indexOf('=');
  const key = text.slice(0, equals).trim();
  if (equals < 1 || key.split('.').includes(''))
    throw new InputProblem('An override was not understood.', [{ path: '--at', message: `write key=value, for example --at bulk.capacitance=470u, not "${text}"` }]);
  return { path: key.split('.'), value: readValue(key, text.slice(equals + 1).trim()) };
};

const isObject = (node: unknown): node is Record<string, unknown> => typeof node === 'object' && node !== null;

const replaced = (node: unknown, path: readonly string[], value: unknown, above: readonly string[]): unknown => {
  const [key, ...rest] = path;
  if (key === undefined) return value;
  const refuse = (message: string) => new InputProblem('An override does not fit the scenario.', [{ path: [...above, ...path].join('.'), message }]);
  const next = (child: unknown) => replaced(child, rest, value, [...above, key]);
  if (Array.isArray(node)) {
    const index = /^\d+$/.test(key) ? Number(key) : -1;
    if (index < 0 || index >= node.length) throw refuse(`${above.join('.')} has ${node.length} entries, counted from 0`);
    return node.map((child: unknown, at) => (at === index ? next(child) : child));
  }
  if (node !== undefined && !isObject(node)) throw refuse(`${above.join('.') || 'the scenario'} has no fields below it`);
  const child = node && Object.hasOwn(node, key) ? node[key] : undefined;
  return { ...node, [key]: next(child) };
};

/** The scenario as read, with one field written anew; the branches above it are made where they are absent. */
export const overridden = (scenario: unknown, { path, value }: Override): unknown => replaced(scenario, path, value, []);
