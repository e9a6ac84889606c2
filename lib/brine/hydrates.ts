import { bisect } from './bisect';
import { crystals, type Crystal } from './equilibrium-constants';
import { ZERO_C_IN_K, log10EquilibriumConstant } from './ice';
import {
  cationMolality,
  cationsIn,
  lnActivityCoefficients,
  lnWaterActivity,
  pitzerAt,
  type CationMolality,
  type PitzerAtTemperature,
} from './pitzer';
import { type Cation } from './pitzer-parameters';
import { type SaltPerWater } from './salts';

/** The parameters hold from here, K … */
const COLDEST_K = 203.15;
/** … to here, K. */
const WARMEST_K = 298.15;
/** Cooling in steps of this, K, no crystal is missed: no saturation index of the set turns twice within one. */
const COOLING_STEP_K = 2.5;
const TOLERANCE_K = 1e-7;

/** The warm limit of the parameters, °C: what is saturated there already has no answer. */
export const WARMEST_C = 25;

/** A salt that crystallises and the temperature at which it starts to as the brine cools. */
export interface Crystallisation {
  readonly solid: Crystal;
  readonly tempC: number;
}

/** The crystals that the cations of a solution can form. */
export function crystalsOf(cations: readonly Cation[]): readonly Crystal[] {
  return crystals.filter((crystal) =>
    Object.keys(crystal.cations).every((cation) => cations.includes(cation as Cation)),
  );
}

/**
 * log10 of how far a solution is from saturation with a crystal: 0 saturated, above 0 it crystallises. No unit.
 * `SI = [Σ ν_i ln(m_i γ_i) + n ln a_w]/ln 10 − log10 K(T)` (Pitzer 1991; constants of Toner and Catling 2017).
 */
export function saturationIndex(crystal: Crystal, model: PitzerAtTemperature, molality: CationMolality): number {
  const lnGamma = lnActivityCoefficients(model, molality);
  let chloride = 0;
  let lnProduct = crystal.waters * lnWaterActivity(model, molality);
  for (const { cation, charge } of model.pairs) {
    chloride += charge * molality[cation];
    const count = crystal.cations[cation] ?? 0;
    if (count > 0) lnProduct += count * (Math.log(molality[cation]) + (lnGamma.cations[cation] ?? 0));
  }
  lnProduct += crystal.chlorides * (Math.log(chloride) + lnGamma.chloride);
  return lnProduct / Math.LN10 - log10EquilibriumConstant(crystal.constants, model.tempK);
}

/** The greatest saturation index among the crystals; −Infinity when there is none. */
function greatestIndex(model: PitzerAtTemperature, molality: CationMolality, solids: readonly Crystal[]): number {
  return solids.reduce((most, solid) => Math.max(most, saturationIndex(solid, model, molality)), -Infinity);
}

function coolingStart(solid: Crystal, molality: CationMolality, cations: readonly Cation[]): number | null {
  const index = (tempK: number) => saturationIndex(solid, pitzerAt(tempK, cations), molality);
  for (let warmK = WARMEST_K; warmK > COLDEST_K; warmK -= COOLING_STEP_K) {
    const coldK = Math.max(COLDEST_K, warmK - COOLING_STEP_K);
    if (index(coldK) >= 0) return bisect(index, [coldK, warmK], TOLERANCE_K) - ZERO_C_IN_K;
  }
  return null;
}

/**
 * Every crystal that a solution would form on cooling from 25 °C, with the temperature of the first saturation, the
 * warmest first; ice left aside and each as if it were alone. NaCl 24 %: NaCl·2H2O at −15.05 °C. The solution must
 * not be saturated at 25 °C (see `saltAtSaturation`).
 */
export function crystallisations(perWater: SaltPerWater): readonly Crystallisation[] {
  const molality = cationMolality(perWater);
  const cations = cationsIn(molality);
  return crystalsOf(cations)
    .flatMap((solid) => {
      const tempC = coolingStart(solid, molality, cations);
      return tempC === null ? [] : [{ solid, tempC }];
    })
    .sort((a, b) => b.tempC - a.tempC);
}

/**
 * How many times its own salt a solution would hold when it is saturated at a temperature in °C (−70 to 25), with the
 * proportions of its salts kept: below 1 it is over-saturated. `null` when there is no salt.
 * Sought upwards from the dilute end, since the model means nothing far beyond saturation.
 */
export function saturationFactor(perWater: SaltPerWater, tempC: number): number | null {
  const molality = cationMolality(perWater);
  const cations = cationsIn(molality);
  const total = cations.reduce((sum, cation) => sum + molality[cation], 0);
  if (total === 0) return null;
  const model = pitzerAt(tempC + ZERO_C_IN_K, cations);
  const solids = crystalsOf(cations);
  const index = (m: number) => {
    const factor = m / total;
    const scaled = {
      Na: molality.Na * factor,
      K: molality.K * factor,
      Ca: molality.Ca * factor,
      Mg: molality.Mg * factor,
    };
    return greatestIndex(model, scaled, solids);
  };
  for (let m = 0.25; m <= 12; m += 0.25) {
    if (index(m) >= 0) return bisect(index, [Math.max(m - 0.25, 1e-9), m], 1e-9) / total;
  }
  return null;
}
