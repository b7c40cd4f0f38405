import { screen } from '@testing-library/react-native';

import { alignDecimals, Quantity } from '@/components/ui/Quantity';
import { FACES } from '@/components/ui/tokens';

import { draw } from '../support/kit';

describe('A quantity', () => {
  it('sets its digits in the mono face and its unit in the text face', () => {
    draw(<Quantity value={470e-6} dimension="capacitance" />);
    expect(screen.getByText('470')).toHaveStyle({ fontFamily: FACES.mono });
    expect(screen.getByText('\u00a0µF')).toHaveStyle({ fontFamily: FACES.text });
  });

  it('tells a peak current from an rms current', () => {
    draw(<Quantity value={12.3} dimension="current" kind="peak" />);
    expect(screen.getByText(/A peak$/)).toBeOnTheScreen();
  });

  it('says that there is no figure rather than showing a zero', () => {
    draw(<Quantity value={null} dimension="energy" />);
    expect(screen.getByText('no figure')).toBeOnTheScreen();
  });

  it('is as long behind the point as its neighbours in a column', () => {
    const column = ['195.7', '8.05', '80'].map((digits) => alignDecimals(digits, 2));
    const behind = column.map((digits) => digits.length - digits.replace(/[.\u00a0].*$/, '').length);
    expect(behind).toEqual([3, 3, 3]);
  });
});
