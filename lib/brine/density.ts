import { densityParameters } from './density-parameters';
import { eutecticOf } from './liquidus';
import { saltPerWaterOf, type Solute } from './salts';

/** Warmest temperature at which all four salts were measured, °C. */
const WARMEST_C = 98;
/** Half the span over which the slope of the straight line is taken, K. */
const SLOPE_HALF_SPAN_K = 2.5;

export type DensityResult =
  | { readonly ok: true; readonly densityKgPerM3: number }
  | { readonly ok: false; readonly reason: 'below-eutectic' | 'above-model'; readonly limitC: number }
  | { readonly ok: false; readonly reason: 'above-saturation'; readonly limitMassFraction: number };

/**
 * Density of liquid water at 1 atm, kg/m³, as Laliberté and Cooper 2004 have it; −5 to 100 °C.
 * 998.2 at 20 °C, 999.8 at 0 °C.
 */
export function waterDensityKgPerM3(tempC: number): number {
  const t = tempC;
  const polynomial =
    ((((-2.8054253e-10 * t + 1.0556302e-7) * t - 4.6170461e-5) * t - 0.0079870401) * t + 16.945176) * t + 999.83952;
  return polynomial / (1 + 0.01687985 * t);
}

/** `1/ρ = w_w/ρ_w + Σ w_i/ρ_a,i`, `ρ_a = (c0 w + c1) exp[1e−6 (t + c4)²]/(w + c2 + c3 t)`, w all salts together. */
function laliberteKgPerM3(solutes: readonly Solute[], tempC: number): number {
  const total = solutes.reduce((sum, { massFraction }) => sum + massFraction, 0);
  let volume = (1 - total) / waterDensityKgPerM3(tempC);
  for (const { salt, massFraction } of solutes) {
    const { c0, c1, c2, c3, c4 } = densityParameters[salt];
    const apparent = ((c0 * total + c1) * Math.exp(1e-6 * (tempC + c4) ** 2)) / (total + c2 + c3 * tempC);
    volume += massFraction / apparent;
  }
  return 1 / volume;
}

/** Where the straight line takes over: with several salts, where the first of them needs it. */
function straightBelowC(solutes: readonly Solute[]): number {
  return solutes.reduce((warmest, { salt }) => Math.max(warmest, densityParameters[salt].straightBelowC), 5);
}

/** The density whatever the limits; for the inverse, which keeps them itself. */
export function unboundedDensityKgPerM3(solutes: readonly Solute[], tempC: number): number {
  const fromC = straightBelowC(solutes);
  if (tempC >= fromC) return laliberteKgPerM3(solutes, tempC);
  const warmer = laliberteKgPerM3(solutes, fromC + SLOPE_HALF_SPAN_K);
  const colder = laliberteKgPerM3(solutes, fromC - SLOPE_HALF_SPAN_K);
  const slope = (warmer - colder) / (2 * SLOPE_HALF_SPAN_K);
  return laliberteKgPerM3(solutes, fromC) + (tempC - fromC) * slope;
}

/** The coldest temperature at which a brine of these salts can be liquid at all, °C. */
function coldestLiquidC(solutes: readonly Solute[]): number {
  return solutes.reduce((coldest, { salt }) => Math.min(coldest, eutecticOf(salt).tempC), 0);
}

/** Greatest total mass fraction: the salts' own limits, weighted by their shares. */
export function highestDensityMassFraction(solutes: readonly Solute[]): number {
  const total = solutes.reduce((sum, { massFraction }) => sum + massFraction, 0);
  if (total === 0) return Math.min(...solutes.map(({ salt }) => densityParameters[salt].highestMassFraction), 1);
  return solutes.reduce(
    (sum, { salt, massFraction }) => sum + (massFraction / total) * densityParameters[salt].highestMassFraction,
    0,
  );
}

/**
 * Density of a brine or a blend in kg/m³ at a temperature in °C (Laliberté 2009), 1 atm. Solutes are mass fractions of
 * the whole, adding to less than 1 (RangeError otherwise); none is water.
 *
 * Below 5 °C (NaCl, KCl) or 25 °C (any CaCl2 or MgCl2) the formula is continued as a straight line with its slope
 * there; left alone it would be 70 kg/m³ wrong for CaCl2 at −45 °C. Refused below the coldest eutectic of the salts,
 * above 98 °C, and beyond the strengths that were measured (salts of a blend weighted by their shares: common practice,
 * no source). Error ±1 kg/m³ NaCl and ±3 CaCl2, MgCl2 at 0–30 °C, ±4 below 0. NaCl 10 % at 20 °C: 1070.7.
 */
export function brineDensityKgPerM3(solutes: readonly Solute[], tempC: number): DensityResult {
  if (!Number.isFinite(tempC)) throw new RangeError(`A temperature is a finite number of °C, not ${tempC}`);
  saltPerWaterOf(solutes);
  const present = solutes.filter(({ massFraction }) => massFraction > 0);
  const total = present.reduce((sum, { massFraction }) => sum + massFraction, 0);
  if (tempC > WARMEST_C) return { ok: false, reason: 'above-model', limitC: WARMEST_C };
  const coldestC = coldestLiquidC(present);
  if (tempC < coldestC) return { ok: false, reason: 'below-eutectic', limitC: coldestC };
  const limitMassFraction = highestDensityMassFraction(present);
  if (total > limitMassFraction) return { ok: false, reason: 'above-saturation', limitMassFraction };
  return { ok: true, densityKgPerM3: unboundedDensityKgPerM3(present, tempC) };
}
