import { bisect } from './bisect';
import { saltPerWaterOnIceBranch } from './ice-point';
import { amountsOf, saltPerWaterOf, salts, type Salt, type SaltPerWater, type Solute } from './salts';

/** How cold the single-salt branches are followed, °C. */
const COLDEST_C = -55;

export type BlendFreezingPointResult =
  | { readonly ok: true; readonly freezingPointC: number }
  | { readonly ok: false; readonly reason: 'below-model'; readonly limitC: number };

/** See `zdanovskiiFreezingPoint`; composition as kg of each salt per kg of water. */
export function zdanovskiiFreezingPointOf(perWater: SaltPerWater): BlendFreezingPointResult {
  const amounts = amountsOf(perWater);
  if (amounts.length === 0) return { ok: true, freezingPointC: 0 };
  const excess = (tempC: number) => {
    const shares = amounts.map(({ salt, saltPerWater }) => saltPerWater / saltPerWaterOnIceBranch(salt, tempC));
    return shares.reduce((sum, share) => sum + share, 0) - 1;
  };
  if (excess(COLDEST_C) > 0) return { ok: false, reason: 'below-model', limitC: COLDEST_C };
  // So little salt that it freezes within a ten-thousandth of a degree of water.
  if (excess(-1e-4) < 0) return { ok: true, freezingPointC: 0 };
  return { ok: true, freezingPointC: bisect(excess, [COLDEST_C, -1e-4], 1e-7) };
}

/**
 * Ice point of a blend by the Zdanovskii (equal water activity) rule, °C: the temperature at which
 * `Σ_j m_j/m°_j(T) = 1`, with m_j per kg of the blend's water and m°_j the single brine with that ice point, its branch
 * followed past its own eutectic. Mass fractions of the whole, adding to less than 1 (RangeError otherwise).
 *
 * The rule knows ice only: whether a salt crystallises first is for `freezingPoint` to say. Against the full Pitzer
 * model at most 0.11 °C off for NaCl + CaCl2, 0.09 for NaCl + MgCl2, 0.35 for CaCl2 + MgCl2 (5–24 % salt, to −33 °C).
 * 90 parts of 23.3 % NaCl with 10 parts of 32 % CaCl2: −23.474 °C.
 */
export function zdanovskiiFreezingPoint(solutes: readonly Solute[]): BlendFreezingPointResult {
  return zdanovskiiFreezingPointOf(saltPerWaterOf(solutes));
}

/** One of the brines to be poured together. */
export interface BrinePart {
  readonly massKg: number;
  readonly solutes: readonly Solute[];
}

/**
 * Composition of brines poured together, by mass balance: solutes as mass fractions of the whole. Salts without mass
 * are left out. RangeError for a negative mass or none at all. 0.9 kg of 23.3 % NaCl with 0.1 kg of 32 % CaCl2 is
 * 20.97 % NaCl and 3.2 % CaCl2.
 */
export function mixBrines(parts: readonly BrinePart[]): readonly Solute[] {
  let totalKg = 0;
  const massKg: Record<Salt, number> = { NaCl: 0, CaCl2: 0, MgCl2: 0, KCl: 0 };
  for (const part of parts) {
    if (!(part.massKg >= 0)) throw new RangeError(`The mass of a brine is 0 or more kg, not ${part.massKg}`);
    totalKg += part.massKg;
    for (const { salt, massFraction } of part.solutes) massKg[salt] += part.massKg * massFraction;
  }
  if (!(totalKg > 0)) throw new RangeError('A blend needs some brine: the masses add up to 0 kg');
  return salts.flatMap((salt) => (massKg[salt] > 0 ? [{ salt, massFraction: massKg[salt] / totalKg }] : []));
}
