import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';

import { DEMO_PARTS } from '../../../server/demo/parts';
import { quantity, toleranced } from '../../../shared/model/quantity';
import { partSchema } from '../../../shared/model/part';
import { scenarioSchema } from '../../../shared/model/scenario';
import { sampleScenario } from '../../support/sample-scenario';

const capacitance = toleranced('capacitance', { min: 1e-7, max: 10, describe: 'Bulk capacitance' });
const ambient = toleranced('temperature', { min: 193.15, max: 423.15, describe: 'Ambient' });

describe('a quantity with a tolerance may be written in several ways', () => {
  it.each<[string, unknown]>([
    ['text', '470u ±20 %'],
    ['an object of texts', { nominal: '470 µF', tolerance: '20 %' }],
    ['an object of numbers', { nominal: 470e-6, tolerance: 0.2 }],
    ['its limits', { nominal: '470u', min: '376u', max: '564u' }],
  ])('%s', (_, given) => {
    const { nominal, min, max } = capacitance.parse(given);
    expect(nominal).toBeCloseTo(470e-6, 15);
    expect(min).toBeCloseTo(376e-6, 15);
    expect(max).toBeCloseTo(564e-6, 15);
  });

  it('a bare value has no band', () => expect(capacitance.parse('470u')).toEqual({ nominal: 470e-6, min: 470e-6, max: 470e-6 }));
  it('one limit alone leaves the other at nominal', () => expect(capacitance.parse({ nominal: '1u', max: '2u' })).toEqual({ nominal: 1e-6, min: 1e-6, max: 2e-6 }));
  it('the tolerance of a temperature is in kelvin', () => expect(ambient.parse({ nominal: '25 °C', tolerance: '15 K' })).toEqual({ nominal: 298.15, min: 283.15, max: 313.15 }));

  it.each<[string, unknown, RegExp]>([
    ['a tolerance beside limits', { nominal: 1e-6, tolerance: 0.1, min: 1e-7 }, /either a tolerance or min and max/],
    ['limits that cross', { nominal: 1e-6, min: 2e-6, max: 3e-6 }, /must rise in this order/],
    ['a tolerance of everything', { nominal: 1e-6, tolerance: 1 }, /outside 0 % to 99.9 %/],
    ['a band that leaves the range', { nominal: 10, tolerance: 0.1 }, /outside 100 nF to 10 F/],
    ['null', null, /write a value such as "470u"/],
  ])('%s is refused', (_, given, message) => expect(capacitance.safeParse(given).error?.issues[0]?.message).toMatch(message));
});

describe('what the schema gives out it takes in again, unchanged', () => {
  const examples = join(__dirname, '../../../assets/examples');
  const files = readdirSync(examples).filter((name) => name.endsWith('.json'));

  it.each([['the sample', sampleScenario()] as const, ...files.map((name) => [name, JSON.parse(readFileSync(join(examples, name), 'utf8')) as unknown] as const)])('%s', (_, given) => {
    const once = scenarioSchema.parse(given);
    expect(scenarioSchema.parse(once)).toEqual(once);
    expect(scenarioSchema.parse(JSON.parse(JSON.stringify(once)))).toEqual(once);
  });

  it.each(DEMO_PARTS.map(({ part }) => [part.name, part] as const))('%s', (_, part) => {
    const once = partSchema.parse(part);
    expect(partSchema.parse(JSON.parse(JSON.stringify(once)))).toEqual(once);
  });
});

describe('the JSON Schema tells a reader what a field is', () => {
  it('unit, range and description of a quantity', () => {
    const schema = z.toJSONSchema(quantity('voltage', { min: 1, max: 1000, qualifier: 'rms', describe: 'Line voltage' }), { io: 'input' });
    expect(schema).toMatchObject({ unit: 'V', qualifier: 'rms', description: 'Line voltage, from 1 V to 1 kV' });
  });

  it('every quantity of a scenario carries its unit', () => {
    const text = JSON.stringify(z.toJSONSchema(scenarioSchema, { io: 'input', target: 'draft-2020-12' }));
    for (const unit of ['Ω', 'F', 'H', 'V', 'A', 'W', 'J', 's', 'Hz', 'K', 'W/K', 'J/K', 'A²s', '1', '°']) expect(text).toContain(`"unit":"${unit}"`);
    expect(text).toContain('"$schema":"https://json-schema.org/draft/2020-12/schema"');
  });
});
