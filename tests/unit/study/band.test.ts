import { emptyBand, widen } from '../../../simulation/study/band';

describe('a band over an axis', () => {
  it('is the lowest and highest of its series at each time', () => {
    const band = emptyBand(3);
    widen(band, [0, 1, 2], { time: [0, 2], value: [0, 4] });
    widen(band, [0, 1, 2], { time: [0, 1, 2], value: [3, 1, 3] });
    expect(band).toEqual({ low: [0, 1, 3], high: [3, 2, 4] });
  });

  it('keeps a peak that lies between two points of the axis', () => {
    const band = emptyBand(3);
    widen(band, [0, 1, 2], { time: [0, 0.4, 0.5, 0.6, 2], value: [0, 0, 77, 0, 0] });
    expect(band.high).toEqual([77, 77, 0]);
    expect(band.low).toEqual([0, 0, 0]);
  });

  it('says nothing beyond the end of a series', () => {
    const band = emptyBand(2);
    widen(band, [0, 5], { time: [0, 5], value: [2, 2] });
    widen(band, [0, 5], { time: [0, 1], value: [1, 9] });
    expect(band).toEqual({ low: [1, 2], high: [9, 9] });
  });
});
