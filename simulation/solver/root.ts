/**
 * A root of `f` between `low` and `high`, where `f` changes sign; to within `width`.
 * Method: false position with the Illinois rule (Dowell & Jarratt, BIT 11 (1971) 168–174, from memory), bisection as a guard.
 */
export const rootBetween = (f: (x: number) => number, low: number, high: number, width: number): number => {
  let [a, b, fa, fb] = [low, high, f(low), f(high)];
  if (fa === 0) return a;
  for (let k = 0; k < 60 && Math.abs(b - a) > width; k += 1) {
    const guess = k % 4 === 3 ? (a + b) / 2 : b - (fb * (b - a)) / (fb - fa);
    const fx = f(guess);
    if (fx === 0) return guess;
    if (fx * fb < 0) [a, fa] = [b, fb];
    else fa /= 2;
    [b, fb] = [guess, fx];
  }
  return b;
};
