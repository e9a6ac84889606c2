import { saltPerWaterOnIceBranch } from './ice-point';
import { eutecticOf, massFractionAt, type MassFractionResult } from './liquidus';
import { amountsOf, type Salt, type SaltPerWater } from './salts';

type Refused = Extract<MassFractionResult, { ok: false }>;
export type MeltResult = { readonly ok: true; readonly iceKgPerKgSalt: number } | Refused;
export type FilmResult = { readonly ok: true; readonly waterGPerM2: number } | Refused;
export type HoldingRateResult = { readonly ok: true; readonly saltGPerM2: number } | Refused;
export type HoldingBrineResult =
  | { readonly ok: true; readonly brineGPerM2: number }
  | Refused
  /** The brine is no stronger than the film would have to be: it would freeze itself. */
  | { readonly ok: false; readonly reason: 'brine-too-weak'; readonly limitMassFraction: number };

/**
 * kg of ice that 1 kg of anhydrous salt melts in the end at a temperature in °C, `(1 − w_L)/w_L` with w_L the strength
 * in equilibrium with ice. An upper bound: what melts in half an hour is a part of it. Without bound towards 0 °C,
 * so at 0 the answer is Infinity. NaCl at −7 °C: 8.528.
 */
export function iceMeltedPerKgSalt(salt: Salt, tempC: number): MeltResult {
  const brine = massFractionAt(salt, tempC);
  if (!brine.ok) return brine;
  return { ok: true, iceKgPerKgSalt: (1 - brine.massFraction) / brine.massFraction };
}

/** g/m² of water that a salt load in g/m² keeps from freezing at a temperature in °C, nothing lost: `S (1 − w_L)/w_L`. */
export function filmAtRefreeze(salt: Salt, saltGPerM2: number, tempC: number): FilmResult {
  const melt = iceMeltedPerKgSalt(salt, tempC);
  if (!melt.ok) return melt;
  // No salt holds no water, at 0 °C either, where any salt at all holds all of it.
  return { ok: true, waterGPerM2: saltGPerM2 === 0 ? 0 : saltGPerM2 * melt.iceKgPerKgSalt };
}

/**
 * g/m² of anhydrous salt that keep `waterGPerM2` of water (rain, melt and ice to be melted) unfrozen at a temperature
 * in °C, nothing lost: `W w_L/(1 − w_L)`. NaCl, 500 g/m² at −8 °C: 66.3.
 */
export function saltToHold(salt: Salt, waterGPerM2: number, tempC: number): HoldingRateResult {
  const brine = massFractionAt(salt, tempC);
  if (!brine.ok) return brine;
  return { ok: true, saltGPerM2: (waterGPerM2 * brine.massFraction) / (1 - brine.massFraction) };
}

/**
 * g/m² of brine of strength `brineMassFraction` that keep `waterGPerM2` of other water unfrozen at a temperature in
 * °C, nothing lost: `W w_L/(w_b − w_L)`. 23 % NaCl, 500 g/m² at −8 °C: 518.5.
 */
export function brineToHold(
  brine: { readonly salt: Salt; readonly massFraction: number },
  waterGPerM2: number,
  tempC: number,
): HoldingBrineResult {
  const limit = massFractionAt(brine.salt, tempC);
  if (!limit.ok) return limit;
  if (brine.massFraction <= limit.massFraction) {
    return { ok: false, reason: 'brine-too-weak', limitMassFraction: limit.massFraction };
  }
  return { ok: true, brineGPerM2: (waterGPerM2 * limit.massFraction) / (brine.massFraction - limit.massFraction) };
}

/** A product as delivered: kg of each anhydrous salt and of water per kg of it; what is left is inert. */
export interface Product {
  readonly composition: SaltPerWater;
  readonly waterMassFraction: number;
}

export type HoldingProductResult =
  | { readonly ok: true; readonly productGPerM2: number }
  | Refused
  /** It brings more water than its salt can keep unfrozen: it would freeze itself. */
  | { readonly ok: false; readonly reason: 'product-too-weak' };

/**
 * g/m² of a product of one or several salts, solid or liquid, that keep `waterGPerM2` of other water unfrozen at a
 * temperature in °C, nothing lost: `W / (Σ p_j/x°_j(T) − p_w)` by the Zdanovskii rule, with p_j kg of salt and p_w kg of
 * water per kg of product and x°_j the strength of single brine j at its ice point, kg per kg water. A salt counts only down to its own eutectic, so the
 * answer is on the careful side there. For one salt this is `W w_L/(w_b − w_L)`; 23 % NaCl, 500 g/m² at −8 °C: 518.5.
 */
export function productToHold(product: Product, waterGPerM2: number, tempC: number): HoldingProductResult {
  if (!Number.isFinite(tempC)) throw new RangeError(`A temperature is a finite number of °C, not ${tempC}`);
  if (tempC > 0) return { ok: false, reason: 'above-freezing', limitC: 0 };
  const salts = amountsOf(product.composition);
  const limitC = salts.reduce((coldest, { salt }) => Math.min(coldest, eutecticOf(salt).tempC), 0);
  if (tempC < limitC) return { ok: false, reason: 'below-eutectic', limitC };
  const held = salts
    .filter(({ salt }) => tempC >= eutecticOf(salt).tempC)
    .reduce((sum, { salt, saltPerWater }) => sum + saltPerWater / saltPerWaterOnIceBranch(salt, tempC), 0);
  if (!(held > product.waterMassFraction)) return { ok: false, reason: 'product-too-weak' };
  return { ok: true, productGPerM2: waterGPerM2 / (held - product.waterMassFraction) };
}
