import { bisect } from './bisect';
import { ZERO_C_IN_K } from './ice';
import { type CrystalFormula } from './equilibrium-constants';
import { WARMEST_C, crystallisations, crystalsOf, saturationFactor, saturationIndex } from './hydrates';
import { icePointC, saltPerWaterOnIceBranch } from './ice-point';
import { cationMolality, cationsIn, pitzerAt } from './pitzer';
import {
  amountsOf,
  massFractionToSaltPerWater,
  saltPerWaterOf,
  saltPerWaterToMassFraction,
  type Salt,
  type SaltPerWater,
  type Solute,
} from './salts';

/** What crystallises: ice, or a salt by its formula. */
export type Solid = 'ice' | CrystalFormula;

export interface FreezingPoint {
  readonly ok: true;
  /** °C at which the first solid appears on slow cooling. */
  readonly freezingPointC: number;
  readonly solid: Solid;
  /** °C at which ice would appear if no salt crystallised before; `null` below −73 °C. */
  readonly icePointC: number | null;
  /** °C at which the first salt crystallises, if any does down to −70 °C; colder than the ice point it is academic. */
  readonly saltPointC: number | null;
  /** Which salt that is. */
  readonly saltSolid: CrystalFormula | null;
}

export type FreezingPointResult =
  | FreezingPoint
  /** Saturated already at `limitC`: more salt than the water holds there. */
  | {
      readonly ok: false;
      readonly reason: 'above-saturation';
      readonly limitC: number;
      readonly limitMassFraction: number;
    }
  /** Colder than the parameters reach. */
  | { readonly ok: false; readonly reason: 'below-model'; readonly limitC: number };

function totalMassFraction(perWater: SaltPerWater, factor = 1): number {
  const total = amountsOf(perWater).reduce((sum, { saltPerWater }) => sum + saltPerWater, 0);
  return saltPerWaterToMassFraction(total * factor);
}

/**
 * First solid of a composition given as kg of each salt per kg of water; see `freezingPoint`.
 */
export function freezingPointOf(perWater: SaltPerWater): FreezingPointResult {
  const factor = saturationFactor(perWater, WARMEST_C);
  if (factor !== null && factor <= 1) {
    const limitMassFraction = totalMassFraction(perWater, factor);
    return { ok: false, reason: 'above-saturation', limitC: WARMEST_C, limitMassFraction };
  }
  const icePoint = icePointC(perWater);
  const salt = crystallisations(perWater)[0];
  const saltPointC = salt?.tempC ?? null;
  const saltSolid = salt?.solid.formula ?? null;
  const both = { icePointC: icePoint, saltPointC, saltSolid };
  if (salt !== undefined && (icePoint === null || salt.tempC > icePoint)) {
    return { ok: true, freezingPointC: salt.tempC, solid: salt.solid.formula, ...both };
  }
  if (icePoint === null) return { ok: false, reason: 'below-model', limitC: -70 };
  return { ok: true, freezingPointC: icePoint, solid: 'ice', ...both };
}

/**
 * The temperature in °C at which the first solid appears in a brine, and which solid: the greater of the ice point
 * and the saturation temperatures of the hydrates (Pitzer model, parameters of Toner and Catling 2017), −70 to +25 °C.
 * This is the crystallisation temperature of a stored brine. Up to the eutectic the solid is ice; a stronger brine
 * freezes *warmer* again, and what separates is the salt's hydrate.
 *
 * Solutes are mass fractions of the whole brine, anhydrous, adding to less than 1 (RangeError otherwise); none is pure
 * water, 0 °C. A salt named twice is added up. Refused when already saturated at 25 °C, with the strength that is not.
 * Error against independent measurement: see `expectedFreezingError`. NaCl 10 %: −6.607 °C, ice. NaCl 24 %: −15.05 °C,
 * NaCl·2H2O. Supercooling is not counted, and must not be used as a margin.
 */
export function freezingPoint(solutes: readonly Solute[]): FreezingPointResult {
  return freezingPointOf(saltPerWaterOf(solutes));
}

/** Where ice and a salt freeze out together: the coldest brine of one salt there is. */
export interface Eutectic {
  readonly tempC: number;
  readonly massFraction: number;
  /** What freezes beside ice. */
  readonly solid: CrystalFormula;
}

function findEutectic(salt: Salt): Eutectic {
  const cations = cationsIn(cationMolality({ [salt]: 1 }));
  const solids = crystalsOf(cations);
  const indexOf = (solid: (typeof solids)[number], tempC: number) => {
    const molality = cationMolality({ [salt]: saltPerWaterOnIceBranch(salt, tempC) });
    return saturationIndex(solid, pitzerAt(tempC + ZERO_C_IN_K, cations), molality);
  };
  // Down the ice branch degree by degree, until it is saturated with something.
  for (let coldC = -2; coldC >= -55; coldC -= 1) {
    const solid = solids.find((candidate) => indexOf(candidate, coldC) >= 0);
    if (solid === undefined) continue;
    const tempC = bisect((t) => indexOf(solid, t), [coldC, coldC + 1], 1e-8);
    return {
      tempC,
      massFraction: saltPerWaterToMassFraction(saltPerWaterOnIceBranch(salt, tempC)),
      solid: solid.formula,
    };
  }
  throw new RangeError(`The ice branch of ${salt} meets no crystal down to −55 °C`);
}

const eutectics = new Map<Salt, Eutectic>();

/**
 * The eutectic of one salt, computed from the model where its ice branch meets saturation with a crystal, once a
 * process. NaCl: −21.14 °C, 23.09 %, NaCl·2H2O. CaCl2: −50.47 °C, 30.51 %. MgCl2: −33.20 °C, 21.26 %.
 */
export function eutecticOf(salt: Salt): Eutectic {
  const known = eutectics.get(salt);
  if (known !== undefined) return known;
  const found = findEutectic(salt);
  eutectics.set(salt, found);
  return found;
}

export type MassFractionResult =
  | { readonly ok: true; readonly massFraction: number }
  | { readonly ok: false; readonly reason: 'below-eutectic' | 'above-freezing'; readonly limitC: number };

export type SaturationResult =
  | { readonly ok: true; readonly massFraction: number }
  | { readonly ok: false; readonly reason: 'below-eutectic' | 'above-model'; readonly limitC: number };

/**
 * The least strength that is unfrozen at a temperature: kg of anhydrous salt per kg of brine in equilibrium with ice
 * at `tempC` (Pitzer model, parameters of Toner and Catling 2017). From the eutectic of the salt to 0 °C; below it no
 * brine exists and the answer is refused with the eutectic as the limit, above 0 °C there is no ice. RangeError for
 * what is no number. NaCl at −8 °C: 0.11709. CaCl2 at −31 °C: 0.25118.
 */
export function massFractionAt(salt: Salt, tempC: number): MassFractionResult {
  if (!Number.isFinite(tempC)) throw new RangeError(`A temperature is a finite number of °C, not ${tempC}`);
  if (tempC > 0) return { ok: false, reason: 'above-freezing', limitC: 0 };
  const { tempC: limitC } = eutecticOf(salt);
  if (tempC < limitC) return { ok: false, reason: 'below-eutectic', limitC };
  return { ok: true, massFraction: saltPerWaterToMassFraction(saltPerWaterOnIceBranch(salt, tempC)) };
}

/**
 * The strongest brine of one salt that stays clear at a temperature, as mass fraction, −70 to 25 °C: saturation with
 * the crystal that is stable there. NaCl at 20 °C: 0.2641. Refused below the eutectic, where nothing is liquid.
 */
export function saturatedMassFractionAt(salt: Salt, tempC: number): SaturationResult {
  if (!Number.isFinite(tempC)) throw new RangeError(`A temperature is a finite number of °C, not ${tempC}`);
  if (tempC > WARMEST_C) return { ok: false, reason: 'above-model', limitC: WARMEST_C };
  const { tempC: limitC, massFraction } = eutecticOf(salt);
  if (tempC < limitC) return { ok: false, reason: 'below-eutectic', limitC };
  const perWater = { [salt]: massFractionToSaltPerWater(massFraction) };
  return { ok: true, massFraction: totalMassFraction(perWater, saturationFactor(perWater, tempC) ?? 1) };
}
