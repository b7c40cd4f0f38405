/**
 * Indices of at most about `most` rows that keep, in each of many equal stretches of `position`, the rows where
 * `column` is lowest and highest: no peak is lost.
 */
export const thinned = (position: readonly number[], column: readonly number[], most: number): number[] => {
  const count = position.length;
  if (count <= most) return position.map((_, k) => k);
  const stretches = Math.max(1, Math.floor(most / 2) - 1);
  const [first, last] = [position[0]!, position[count - 1]!];
  const kept = new Set([0, count - 1]);
  let [stretch, low, high] = [-1, 0, 0];
  for (let k = 0; k < count; k += 1) {
    const at = Math.min(stretches - 1, Math.floor(((position[k]! - first) / (last - first)) * stretches));
    if (at !== stretch) {
      kept.add(low).add(high);
      [stretch, low, high] = [at, k, k];
    }
    if (column[k]! < column[low]!) low = k;
    if (column[k]! > column[high]!) high = k;
  }
  return [...kept.add(low).add(high)].sort((a, b) => a - b);
};
