import { bisect } from './bisect';
import { highestDensityMassFraction, unboundedDensityKgPerM3 } from './density';
import { eutecticOf } from './liquidus';
import { type Salt } from './salts';

/** Density of water at 60 °F, kg/m³: what a 60/60 °F hydrometer is marked against. */
export const WATER_AT_60_F_KG_PER_M3 = 999.01;
/** 60 °F in °C. */
export const SIXTY_F_C = 15.56;
/** Mass fraction of NaCl at 100 degrees salometer, saturated at 60 °F. */
const SALOMETER_FULL_MASS_FRACTION = 0.26395;

export type StrengthResult =
  | { readonly ok: true; readonly massFraction: number }
  | { readonly ok: false; readonly reason: 'below-water'; readonly limitSpecificGravity: number }
  | { readonly ok: false; readonly reason: 'above-saturation'; readonly limitSpecificGravity: number }
  | { readonly ok: false; readonly reason: 'below-eutectic' | 'above-model'; readonly limitC: number };

/**
 * Strength of a brine of one salt, mass fraction, from a hydrometer marked 60/60 °F and the temperature of the brine in
 * °C when it was read: the density seen is `SG · 999.01` kg/m³ (the glass's own expansion, under 0.3 kg/m³, is left
 * aside) and `ρ(w, t)` is inverted at that temperature. Refused lighter than water, beyond the strengths measured, and
 * outside the salt's eutectic to 60 °C.
 * Error ±0.1–0.4 % by mass. SG 1.170 in NaCl at 15.56 °C: 22.30 %; the same reading at 0 °C: 21.38 %.
 */
export function massFractionFromSpecificGravity(salt: Salt, specificGravity: number, tempC: number): StrengthResult {
  if (!Number.isFinite(specificGravity) || !Number.isFinite(tempC)) {
    throw new RangeError(`A reading is a specific gravity and °C, not ${specificGravity} and ${tempC}`);
  }
  const limitC = eutecticOf(salt).tempC;
  if (tempC < limitC) return { ok: false, reason: 'below-eutectic', limitC };
  if (tempC > 60) return { ok: false, reason: 'above-model', limitC: 60 };
  const observed = specificGravity * WATER_AT_60_F_KG_PER_M3;
  const density = (massFraction: number) => unboundedDensityKgPerM3([{ salt, massFraction }], tempC);
  const highest = highestDensityMassFraction([{ salt, massFraction: 0.1 }]);
  if (observed < density(0)) {
    return { ok: false, reason: 'below-water', limitSpecificGravity: density(0) / WATER_AT_60_F_KG_PER_M3 };
  }
  if (observed > density(highest)) {
    return { ok: false, reason: 'above-saturation', limitSpecificGravity: density(highest) / WATER_AT_60_F_KG_PER_M3 };
  }
  return { ok: true, massFraction: bisect((w) => density(w) - observed, [0, highest], 1e-9) };
}

/** Specific gravity 60/60 °F of a brine of one salt. NaCl 22.3 %: 1.170. */
export function specificGravity60F(salt: Salt, massFraction: number): number {
  return unboundedDensityKgPerM3([{ salt, massFraction }], SIXTY_F_C) / WATER_AT_60_F_KG_PER_M3;
}

/** Degrees salometer of a NaCl brine, `100 w/0.26395`: 100 is saturated at 60 °F. 22.3 %: 84.5 °S. */
export function salometerDegrees(massFraction: number): number {
  return (100 * massFraction) / SALOMETER_FULL_MASS_FRACTION;
}
