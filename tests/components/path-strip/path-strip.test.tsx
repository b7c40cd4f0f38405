import { fireEvent, screen } from '@testing-library/react-native';

import { PathGlyph } from '@/components/path-strip/PathGlyph';
import { PathStrip, type StripBlock } from '@/components/path-strip/PathStrip';
import { SYMBOL_NAMES } from '@/components/path-strip/symbol-name';

import { draw } from '../support/kit';

const line = (label: string, value: string, unit?: string) => ({ label, value, unit });
const blocks: StripBlock[] = [
  { key: 'source', symbol: 'ac-source', title: 'Source', lines: [line('line', '230', 'V'), line('source R', '0.35', 'Ω'), line('worst phase', '80', '°')] },
  { key: 'limiter', symbol: 'ntc-contact', title: 'Limiter + contact', lines: [line('R25', '10', 'Ω'), line('closes at', '300', 'ms'), line('opens', '180', 'ms')], mark: { status: 'fail', text: 'hot restart fails' } },
  { key: 'bulk', symbol: 'capacitor', title: 'Bulk capacitor', lines: [line('C', '470', 'µF')], mark: { status: 'stored-charge', text: '60 V after 151 s' } },
];

describe('The path strip', () => {
  it('is the way into each block', () => {
    const select = jest.fn();
    draw(<PathStrip blocks={blocks} selected="source" onSelect={select} />);
    expect(screen.getByRole('tab', { name: /^Source/ })).toBeSelected();
    expect(screen.getByRole('tab', { name: /^Limiter/ })).not.toBeSelected();
    fireEvent.press(screen.getByRole('tab', { name: /^Limiter/ }));
    expect(select).toHaveBeenCalledWith('limiter');
  });

  it('speaks the mark of a block before its figures', () => {
    draw(<PathStrip blocks={blocks} selected="source" onSelect={jest.fn()} />);
    expect(screen.getByRole('tab', { name: 'Limiter + contact, hot restart fails, R25 10 Ω, closes at 300 ms, opens 180 ms' })).toBeOnTheScreen();
  });

  it('gives the third line to the mark', () => {
    draw(<PathStrip blocks={blocks} selected="source" onSelect={jest.fn()} />);
    expect(screen.getByText('hot restart fails')).toBeOnTheScreen();
    expect(screen.getByText('worst phase')).toBeOnTheScreen();
    expect(screen.queryByText('opens')).toBeNull();
  });

  it('has a symbol for every kind of block', () => {
    const every = SYMBOL_NAMES.map((symbol): StripBlock => ({ key: symbol, symbol, title: symbol, lines: [] }));
    draw(<PathStrip blocks={every} selected="ntc" onSelect={jest.fn()} />);
    expect(screen.getAllByRole('tab')).toHaveLength(SYMBOL_NAMES.length);
  });
});

describe('The glyph of a path', () => {
  it('tells the blocks in their order', () => {
    draw(<PathGlyph path={{ source: 'ac', fuse: true, elements: [{ kind: 'ntc', bypass: true }], rectifier: 'bridge', load: 'constant-power' }} />);
    expect(screen.getByLabelText('AC source, fuse, NTC with contact, bridge, bulk capacitor, converter')).toBeOnTheScreen();
  });

  it('leaves out what the path does without', () => {
    draw(<PathGlyph path={{ source: 'dc', fuse: false, elements: [{ kind: 'polymer-ptc', bypass: false }], rectifier: 'none', load: 'none' }} />);
    expect(screen.getByLabelText('DC source, polymer PTC, bulk capacitor, no load')).toBeOnTheScreen();
  });
});
