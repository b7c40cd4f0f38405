import { draftOf, withNode } from '@/hooks/scenario/draft-tree';
import { FIELDS, fieldAt } from '@/hooks/scenario/field-table';
import { asTyped } from '@/hooks/scenario/notation';
import { readDraft, valueAt } from '@/hooks/scenario/read-draft';
import { DIMENSIONS, type Dimension } from '@/shared/quantity/dimension';
import { parseQuantity } from '@/shared/quantity/parse';

import { readScenario } from '../../support/sample-record';

const draft = draftOf(readScenario());

describe('a draft as typed', () => {
  it('is read with 4k7 and 470u where they fit', () => {
    const typed = withNode(withNode(draft, 'load.resistance', '4k7'), 'bulk.capacitance', { nominal: '470u', tolerance: '20 %' });
    const reading = readDraft(typed);
    expect(reading).toMatchObject({ ok: true, scenario: { load: { resistance: 4700 }, bulk: { capacitance: { nominal: 470e-6, min: 376e-6, max: 564e-6 } } } });
  });

  it('names the field that cannot be read, with an example', () => {
    const reading = readDraft(withNode(draft, 'load.resistance', '8mm'));
    expect(reading.ok).toBe(false);
    expect(reading.ok ? null : reading.issues.get('load.resistance')).toMatch(/write for example 4k7/);
  });

  it('refuses a peak where the field is in rms', () => {
    const reading = readDraft(withNode(draft, 'fuse', { ratedCurrent: '6.3 A peak' }));
    expect(reading.ok ? null : reading.issues.get('fuse.ratedCurrent')).toMatch(/A rms/);
  });

  it('gives the value of a single field while another is still wrong', () => {
    const typed = withNode(withNode(draft, 'load.resistance', '4k7'), 'bulk.esr.nominal', '?');
    expect(valueAt(typed, 'load.resistance', 'resistance')).toBe(4700);
    expect(valueAt(typed, 'bulk.esr.nominal', 'resistance')).toBeNull();
  });
});

describe('a value put into its field', () => {
  const values: Record<Dimension, readonly number[]> = {
    resistance: [0, 4700, 0.47, 8e-3, 1e9], capacitance: [470e-6, 1e-7, 10], inductance: [0, 1e-4, 10e-3], voltage: [3.3, 230, 1500], current: [0.5, 6.3, 200e3],
    power: [1e-3, 300, 100e3], energy: [0.045, 45], time: [1e-5, 0.3, 600], frequency: [50, 60, 400], temperature: [233.15, 273.15, 298.15, 493.15], temperatureInterval: [0.2, 3000],
    dissipation: [0.017, 1e-5], heatCapacity: [1.1, 1e-5], i2t: [89, 1e-6, 1e9], ratio: [0.1, 0.333, 2], angle: [0, 90, 79.5], count: [1, 10000],
  };

  it.each(Object.keys(DIMENSIONS) as Dimension[])('reads back as the same %s', (dimension) => {
    for (const value of values[dimension]) {
      const parsed = parseQuantity(asTyped(value, dimension), dimension);
      expect(parsed.ok && Math.abs(parsed.value - value)).toBeLessThanOrEqual(1e-11 * Math.max(1, Math.abs(value)));
    }
  });

  it('looks as an engineer would type it', () => {
    expect([asTyped(4700, 'resistance'), asTyped(0.3, 'time'), asTyped(313.15, 'temperature'), asTyped(0.2, 'ratio')]).toEqual(['4.7k', '300m', '40', '20 %']);
  });
});

describe('the table of fields', () => {
  it('knows that a DC supply is neither rms nor peak', () => {
    const dc = withNode(draft, 'source', { kind: 'dc', voltage: 24, impedance: {} });
    expect(fieldAt(draft, 'source.voltage')?.qualifier).toBe('rms');
    expect(fieldAt(dc, 'source.voltage')?.qualifier).toBeUndefined();
  });

  it('finds a field at any place of a list', () => {
    expect(fieldAt(draft, 'limiter.1.part.law.r25')).toBe(FIELDS['limiter.*.part.law.r25']);
  });
});
