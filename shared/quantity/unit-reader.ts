import { create, unitDependencies, type Unit } from 'mathjs';

let unitOf: ((text: string) => Unit) | undefined;

/** A unit by mathjs, loaded when a first text needs it; null where the text names none. */
export const readUnit = (text: string): Unit | null => {
  unitOf ??= create({ ...unitDependencies }).unit as (text: string) => Unit;
  try {
    return unitOf(text);
  } catch {
    return null;
  }
};

/** On the web the units come in a script of their own (see unit-reader.web.ts); here they are at hand. */
export const loadUnits = async (): Promise<void> => {};
