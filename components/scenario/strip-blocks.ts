import type { StripBlock, StripLine, StripMark } from '@/components/path-strip/PathStrip';
import type { SymbolName } from '@/components/path-strip/symbol-name';
import type { Check, Status } from '@/shared/model/check';
import { CHECKS, type Block } from '@/shared/model/check-list';
import type { Element } from '@/shared/model/limiter';
import type { Toleranced } from '@/shared/model/quantity';
import type { Assessment } from '@/shared/model/result';
import type { Scenario } from '@/shared/model/scenario';
import type { Dimension } from '@/shared/quantity/dimension';
import { formatQuantity, quantityText } from '@/shared/quantity/format';

import { CHECK_WORDS } from './result/check-words';
import { STORED_FROM, storedCharge } from './stored-charge';

/** Which block is edited: a block of the path, or one of two limiter elements. */
export type BlockKey = Exclude<Block, 'limiter'> | 'limiter.0' | 'limiter.1';

const DIGITS = 3;
const line = (label: string, value: number, dimension: Dimension): StripLine => {
  const { number, unit } = quantityText(value, dimension, DIGITS);
  return { label, value: number, unit };
};

const spread = ({ nominal, min, max }: Toleranced): string => {
  const [below, above] = [1 - min / nominal, max / nominal - 1];
  if (below === 0 && above === 0) return '';
  return Math.abs(below - above) < 1e-6 ? ` ±${Number((above * 100).toPrecision(2))} %` : '';
};

const sourceBlock = ({ source }: Scenario): Omit<StripBlock, 'mark'> => {
  const { voltage, impedance } = source;
  const ranged = voltage.max > voltage.min && spread(voltage) === '';
  const supply = ranged
    ? `${quantityText(voltage.min, 'voltage', DIGITS).number}–${formatQuantity(voltage.max, 'voltage', DIGITS)}`
    : `${formatQuantity(voltage.nominal, 'voltage', DIGITS)}${spread(voltage)}`;
  const strength = 'resistance' in impedance ? line('source R', impedance.resistance.nominal, 'resistance') : line('prospective', impedance.prospectiveCurrent.nominal, 'current');
  if (source.kind === 'dc') return { key: 'source', symbol: 'dc-source', title: 'Source', lines: [{ label: supply, value: 'DC' }, strength] };
  const frequency = { label: supply, value: source.frequencies.join(' / '), unit: 'Hz' };
  const phase = source.phase === 'worst' ? { label: 'switched on at', value: 'worst' } : { label: 'switched on at', value: String(source.phase), unit: '°' };
  return { key: 'source', symbol: 'ac-source', title: 'Source', lines: [frequency, strength, phase] };
};

const fuseBlock = ({ fuse }: Scenario): Omit<StripBlock, 'mark'> => {
  if (!fuse) return { key: 'fuse', symbol: 'wire', title: 'No fuse', lines: [] };
  const lowest = fuse.preArcing[0];
  return { key: 'fuse', symbol: 'fuse', title: 'Fuse', lines: [line('rated', fuse.ratedCurrent, 'current'), lowest ? line('I²t', lowest.i2t, 'i2t') : { label: 'I²t', value: 'no figure' }] };
};

const resistanceLine = ({ part: { law } }: Element): StripLine => {
  if (law.law === 'b-value') return line('R25', law.r25.nominal, 'resistance');
  if (law.law === 'sigmoid') return line('R', law.low.nominal, 'resistance');
  if (law.law === 'fixed') return line('R', law.resistance.nominal, 'resistance');
  return { label: 'R(T)', value: law.law === 'table' ? 'table' : 'coefficients' };
};

const SYMBOL = { ntc: 'ntc', 'polymer-ptc': 'ptc', resistor: 'resistor' } as const;
const TITLE = { ntc: 'Limiter', 'polymer-ptc': 'Polymer PTC', resistor: 'Resistor' } as const;

const limiterBlock = (element: Element, index: number): Omit<StripBlock, 'mark'> => {
  const { part, bypass } = element;
  const symbol: SymbolName = bypass ? `${SYMBOL[part.kind]}-contact` : SYMBOL[part.kind];
  const contact = bypass && (bypass.closes.when === 'time' ? line('closes at', bypass.closes.at, 'time') : line('closes above', bypass.closes.above, 'voltage'));
  return {
    key: `limiter.${index}`,
    symbol,
    title: bypass ? `${TITLE[part.kind]} + contact` : TITLE[part.kind],
    lines: [resistanceLine(element), contact ?? { label: part.name, value: '' }],
  };
};

const noLimiter: Omit<StripBlock, 'mark'> = { key: 'limiter.0', symbol: 'wire', title: 'No limiter', lines: [] };

const rectifierBlock = ({ rectifier }: Scenario): Omit<StripBlock, 'mark'> => {
  if (rectifier.kind === 'none') return { key: 'rectifier', symbol: 'wire', title: 'No bridge', lines: [] };
  const drop = quantityText(rectifier.forwardVoltage, 'voltage', DIGITS);
  const surge = rectifier.surge ? line('surge', rectifier.surge.current, 'current') : { label: 'surge', value: 'no figure' };
  return { key: 'rectifier', symbol: 'bridge', title: 'Bridge', lines: [{ label: 'drop', value: `2 × ${drop.number}`, unit: drop.unit }, surge] };
};

const bulkBlock = ({ bulk }: Scenario, assessment: Assessment | null): Omit<StripBlock, 'mark'> => {
  const highest = assessment?.run.figures.highestBus ?? null;
  const stored = highest === null ? [] : [line('stored', 0.5 * bulk.capacitance.nominal * highest ** 2, 'energy')];
  return { key: 'bulk', symbol: 'capacitor', title: 'Bulk capacitor', lines: [line(`C${spread(bulk.capacitance)}`, bulk.capacitance.nominal, 'capacitance'), ...stored] };
};

const loadBlock = ({ load }: Scenario): Omit<StripBlock, 'mark'> => {
  if (load.kind === 'none') return { key: 'load', symbol: 'no-load', title: 'No load', lines: [] };
  if (load.kind === 'resistance') return { key: 'load', symbol: 'resistive-load', title: 'Load', lines: [line('resistance', load.resistance, 'resistance')] };
  return { key: 'load', symbol: 'converter', title: 'Converter', lines: [line('constant power', load.power, 'power'), line('starts at', load.startVoltage, 'voltage')] };
};

const ENDING: Record<Status, string> = { fail: ' over', caution: ' close', 'not-assessed': ' not assessed', pass: '' };

const belongs = (check: Check, key: string): boolean => {
  const { block } = CHECKS[check.id];
  return block === 'limiter' ? key === `limiter.${check.element ?? 0}` : key === block;
};

/** The most pressing check of a block, when it is not simply passed. */
const markOf = (checks: readonly Check[], key: string): StripMark | undefined => {
  const check = checks.find((one) => one.status !== 'pass' && one.setAside === null && belongs(one, key));
  return check && { status: check.status, text: `${CHECK_WORDS[check.id].short}${ENDING[check.status]}` };
};

const chargeMark = (scenario: Scenario, assessment: Assessment | null): StripMark | undefined => {
  const charge = storedCharge(scenario, assessment);
  if (!charge) return undefined;
  const text = charge.dischargesIn === null ? 'holds its charge' : `${STORED_FROM} V after ${formatQuantity(charge.dischargesIn, 'time', DIGITS)}`;
  return { status: 'stored-charge', text };
};

/** The blocks of the path for the strip: what each is, its key figures, and the mark of what is wrong with it. */
export const stripBlocks = (scenario: Scenario, assessment: Assessment | null): StripBlock[] => {
  const limiters = scenario.limiter.length > 0 ? scenario.limiter.map(limiterBlock) : [noLimiter];
  const blocks = [sourceBlock(scenario), fuseBlock(scenario), ...limiters, rectifierBlock(scenario), bulkBlock(scenario, assessment), loadBlock(scenario)];
  return blocks.map((block) => {
    const mark = markOf(assessment?.checks ?? [], block.key) ?? (block.key === 'bulk' ? chargeMark(scenario, assessment) : undefined);
    return mark ? { ...block, lines: block.lines.slice(0, 2), mark } : block;
  });
};
