import { FACTORS, type Factor, type Level } from '../../shared/model/corner';

/** Where each factor stands; a factor that is not named is nominal. */
export type Levels = Readonly<Partial<Record<Factor, Level>>>;

export const NOMINAL: Levels = {};

export const levelOf = (levels: Levels, factor: Factor): Level => levels[factor] ?? 'nominal';

/** The same levels with one factor moved. */
export const moved = (levels: Levels, factor: Factor, level: Level): Levels => ({ ...levels, [factor]: level });

/** Equal for equal levels, whatever the order in which they were set. */
export const keyOf = (levels: Levels): string => FACTORS.map((factor) => levelOf(levels, factor)[0]).join('');
