import { bisect } from './bisect';
import { ZERO_C_IN_K, lnIceActivity } from './ice';
import { cationMolality, cationsIn, lnWaterActivity, pitzerAt, type CationMolality } from './pitzer';
import { cationOf, molalityToSaltPerWater, type Salt, type SaltPerWater } from './salts';

/** Where ice is sought, in K: the colder end is below any brine of these salts. */
const COLDEST_K = 200;
const WARMEST_K = 273.3;
/** The temperature is found to this, K. */
const TOLERANCE_K = 1e-7;

/**
 * mol/kg up to which the ice branch of each single salt is followed, past its own eutectic too, since blends need
 * that part. Water activity falls steadily up to here at every temperature down to −55 °C. KCl is not in the
 * published set of limits; 14 was chosen so that its ice branch reaches −55 °C like the others.
 */
const HIGHEST_MOLALITY: Readonly<Record<Salt, number>> = { NaCl: 12, CaCl2: 7, MgCl2: 6, KCl: 14 };

/**
 * Temperature in °C at which ice is in equilibrium with a solution, whatever salt may have crystallised before:
 * the zero of `ln a_w(m, T) − ln a_ice(T)`. 0 for pure water and never above it. `null` when there is no such
 * temperature above −73 °C. NaCl at 0.11111 kg per kg water (10 %): −6.607 °C.
 */
export function icePointC(perWater: SaltPerWater): number | null {
  const molality = cationMolality(perWater);
  const cations = cationsIn(molality);
  if (cations.length === 0) return 0;
  const difference = (tempK: number) => lnWaterActivity(pitzerAt(tempK, cations), molality) - lnIceActivity(tempK);
  if (difference(COLDEST_K) <= 0) return null;
  return Math.min(0, bisect(difference, [COLDEST_K, WARMEST_K], TOLERANCE_K) - ZERO_C_IN_K);
}

const NO_CATION: CationMolality = { Na: 0, K: 0, Ca: 0, Mg: 0 };

/**
 * kg of one salt per kg of water in the brine that is in equilibrium with ice at a temperature in °C, −55 to 0, the
 * branch being followed past the salt's eutectic (a metastable brine). NaCl at −8: 0.13262. RangeError outside.
 */
export function saltPerWaterOnIceBranch(salt: Salt, tempC: number): number {
  if (!(tempC <= 0 && tempC >= -55)) throw new RangeError(`The ice branch is followed from −55 to 0 °C, not ${tempC}`);
  if (tempC === 0) return 0;
  const tempK = tempC + ZERO_C_IN_K;
  const cation = cationOf[salt];
  const model = pitzerAt(tempK, [cation]);
  const lnIce = lnIceActivity(tempK);
  const molality = { ...NO_CATION };
  const difference = (m: number) => {
    molality[cation] = m;
    return lnWaterActivity(model, molality) - lnIce;
  };
  // The fit of ice misses 0 °C by 6e-6 K: between it and 0 no brine is dilute enough.
  if (difference(1e-9) <= 0) return 0;
  return molalityToSaltPerWater(salt, bisect(difference, [1e-9, HIGHEST_MOLALITY[salt]], 1e-10));
}
