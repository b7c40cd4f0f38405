import type { Unit } from 'mathjs';

let unitOf: ((text: string) => Unit) | undefined;
let loading: Promise<void> | undefined;

/** Fetches the units in a script of their own; called when a person starts to edit a field. */
export const loadUnits = (): Promise<void> => {
  loading ??= import('mathjs').then(({ create, unitDependencies }) => {
    unitOf = create({ ...unitDependencies }).unit as (text: string) => Unit;
  });
  // A script that did not come may be asked for again.
  loading.catch(() => (loading = undefined));
  return loading;
};

/** A unit by mathjs; null where the text names none, or the units have not arrived yet. */
export const readUnit = (text: string): Unit | null => {
  try {
    return unitOf?.(text) ?? null;
  } catch {
    return null;
  }
};
