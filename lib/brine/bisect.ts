/**
 * The zero of a function that changes sign between `low` and `high`, by halving until they are `tolerance` apart.
 * Units of both are the caller's. RangeError when the ends have the same sign: the caller must bracket.
 */
export function bisect(
  f: (x: number) => number,
  bracket: readonly [low: number, high: number],
  tolerance: number,
): number {
  let [low, high] = bracket;
  const atLow = f(low);
  const atHigh = f(high);
  if (atLow === 0) return low;
  if (atHigh === 0) return high;
  if (!(atLow * atHigh < 0)) {
    throw new RangeError(`No change of sign between ${low} (${atLow}) and ${high} (${atHigh})`);
  }
  const lowIsNegative = atLow < 0;
  while (high - low > tolerance) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) break;
    if (f(middle) < 0 === lowIsNegative) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
