import { fireEvent, screen } from '@testing-library/react-native';

import { marginText, pairText } from '@/components/charts/check-figures';
import { CheckList } from '@/components/charts/CheckList';
import { CheckRow } from '@/components/charts/CheckRow';
import { describeCorner } from '@/components/charts/describe-corner';
import { MarginBar } from '@/components/charts/MarginBar';

import { draw, failedRestart, notAssessed, passed } from '../support/kit';

describe('What governs a check', () => {
  it('is told as time off, line, tolerances, ambient and switch-on angle', () => {
    expect(describeCorner(failedRestart)).toBe('off 178 ms · 253 V · C +20 % · R \u221220 % · 40 °C · at 90°');
  });

  it('names the phase of a cold start as well', () => {
    expect(describeCorner(passed({ phase: 80 }))).toContain('at 80°');
  });

  it('says that a temperature is held by its rise', () => {
    expect(describeCorner(passed({ dimension: 'temperature' }))).toMatch(/; by rise$/);
  });

  it('leaves unsaid what stands at nominal', () => {
    const corner = { factors: [{ factor: 'capacitance', level: 'nominal', value: 470e-6, change: 0 }, { factor: 'line', level: 'high', value: 253, change: 0.1 }] } as const;
    expect(describeCorner(passed({ corner: { factors: [...corner.factors] }, phase: null }))).toBe('253 V');
  });

  it('says what is missing where nothing was assessed, and why a check was set aside', () => {
    expect(describeCorner(notAssessed)).toBe('The part record holds no capacitance rating');
    expect(describeCorner({ ...failedRestart, setAside: 'Covered by report 12' })).toBe('Set aside: Covered by report 12');
  });
});

describe('Value and rating', () => {
  it('stand in one unit, the rating\u2019s', () => {
    expect(pairText(0.8, 1.5, 'current')).toEqual({ value: '0.8', rating: '1.5', unit: 'A' });
    expect(pairText(2000, 1500, 'current')).toEqual({ value: '2', rating: '1.5', unit: 'kA' });
    expect(pairText(0.3, 0.045, 'energy')).toEqual({ value: '300', rating: '45', unit: 'mJ' });
  });

  it('are in degrees Celsius for temperatures', () => {
    expect(pairText(471.75, 493.15, 'temperature')).toEqual({ value: '198.6', rating: '220', unit: '°C' });
  });

  it('keep figures that are small against the rating', () => {
    expect(pairText(0.00123, 8.9, 'i2t').value).toBe('0.0012');
  });

  it.each([[-1.446, '\u2212145\u00a0%'], [0.095, '+9.5\u00a0%'], [0.14, '+14\u00a0%'], [0, '+0\u00a0%']])('give the margin %p as %p', (margin, text) => {
    expect(marginText({ margin })).toBe(text);
  });
});

describe('A row of a check', () => {
  it('shows name, value of rating, corner, word and margin', () => {
    draw(<CheckRow check={failedRestart} />);
    for (const text of ['Peak current, hot restart', '195', '.7', 'of 80\u00a0A', 'Fail \u2212145\u00a0%']) expect(screen.getByText(text)).toBeOnTheScreen();
  });

  it('is one button with everything in its name when it can be chosen', () => {
    const press = jest.fn();
    draw(<CheckRow check={failedRestart} onPress={press} />);
    const row = screen.getByRole('button', { name: /^Fail .*, Peak current, hot restart, 195\.7 of 80.A, off 178 ms/ });
    fireEvent.press(row);
    expect(press).toHaveBeenCalled();
  });

  it('says at least where the value must not fall below', () => {
    draw(<CheckRow check={passed({ sense: 'at-least', dimension: 'voltage', value: 195.9, rating: 175 })} onPress={jest.fn()} />);
    expect(screen.getByRole('button', { name: /195\.9 at least 175.V/ })).toBeOnTheScreen();
  });

  it('shows no figure, and no margin, where nothing was assessed', () => {
    draw(<CheckRow check={notAssessed} />);
    expect(screen.getByText('no figure')).toBeOnTheScreen();
    expect(screen.getByText('Not assessed')).toBeOnTheScreen();
    expect(screen.queryByText(/%/)).toBeNull();
  });
});

describe('A list of checks', () => {
  it('tells two limiter elements apart', () => {
    const select = jest.fn();
    const second = passed({ element: 1, title: 'Second element' });
    draw(<CheckList checks={[passed({ element: 0, title: 'First element' }), second]} selected="peak-current.1" onSelect={select} />);
    expect(screen.getByRole('button', { name: /Second element/ })).toHaveProp('aria-pressed', true);
    fireEvent.press(screen.getByRole('button', { name: /Second element/ }));
    expect(select).toHaveBeenCalledWith(second);
  });
});

describe('A margin bar by itself', () => {
  it('says how much of the rating is used', () => {
    draw(<MarginBar check={failedRestart} variant="compact" />);
    expect(screen.getByRole('img', { name: 'Peak current, hot restart: Fail, 245 % of the rating' })).toBeOnTheScreen();
  });
});
