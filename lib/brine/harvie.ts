import { large, small } from './harvie-coefficients';

/** J(x) and x·J′(x) of unsymmetrical mixing. */
export interface HarvieValue {
  readonly j: number;
  readonly xJPrime: number;
}

/**
 * Pitzer's integral J(x), x > 0 and without unit, by the Chebyshev series of Harvie 1981: for x ≤ 1,
 * `u = 4x^0.2 − 2` and `h = 0.4x^0.2`; above, `u = (40x^−0.1 − 22)/9` and `h = −(2/9)x^−0.1`; then
 * `J = x/4 − 1 + ½(b0 − b2)` and `x·J′ = x/4 + h(d0 − d2)` with b and d by Clenshaw's recurrence.
 * The second is already multiplied by x. RangeError at or below 0.
 */
export function harvieJ(x: number): HarvieValue {
  if (!(x > 0)) throw new RangeError(`J(x) is for x above 0, not ${x}`);
  const isSmall = x <= 1;
  const power = isSmall ? x ** 0.2 : x ** -0.1;
  const u = isSmall ? 4 * power - 2 : (40 * power - 22) / 9;
  const h = isSmall ? 0.4 * power : (-2 / 9) * power;
  const a = isSmall ? small : large;
  let [b1, b2, d1, d2] = [0, 0, 0, 0];
  let [b0, d0] = [0, 0];
  for (let k = a.length - 1; k >= 0; k -= 1) {
    [b2, b1] = [b1, b0];
    [d2, d1] = [d1, d0];
    b0 = u * b1 - b2 + (a[k] ?? 0);
    d0 = b1 + u * d1 - d2;
  }
  return { j: x / 4 - 1 + (b0 - b2) / 2, xJPrime: x / 4 + h * (d0 - d2) };
}
