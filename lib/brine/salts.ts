import { type Cation } from './pitzer-parameters';

/** The chlorides the model covers. */
export type Salt = 'NaCl' | 'CaCl2' | 'MgCl2' | 'KCl';

export const salts: readonly Salt[] = ['NaCl', 'CaCl2', 'MgCl2', 'KCl'];

/** g/mol of the anhydrous salt; standard atomic weights. */
export const molarMassGPerMol: Readonly<Record<Salt, number>> = {
  NaCl: 58.443,
  CaCl2: 110.984,
  MgCl2: 95.211,
  KCl: 74.551,
};

/** g/mol of chlorine and of water; standard atomic weights. */
export const CHLORINE_G_PER_MOL = 35.453;
export const WATER_G_PER_MOL = 18.015;

export const saltName: Readonly<Record<Salt, string>> = {
  NaCl: 'sodium chloride',
  CaCl2: 'calcium chloride',
  MgCl2: 'magnesium chloride',
  KCl: 'potassium chloride',
};

export const cationOf: Readonly<Record<Salt, Cation>> = { NaCl: 'Na', CaCl2: 'Ca', MgCl2: 'Mg', KCl: 'K' };

/** Chloride ions in one formula unit, which is also the charge of the cation. */
export const chloridesOf: Readonly<Record<Salt, 1 | 2>> = { NaCl: 1, CaCl2: 2, MgCl2: 2, KCl: 1 };

/** One salt of a brine: kg of the anhydrous salt per kg of brine, 0 to 1. Inhibitors and inerts do not count. */
export interface Solute {
  readonly salt: Salt;
  readonly massFraction: number;
}

/** kg of each anhydrous salt per kg of water. */
export type SaltPerWater = Readonly<Partial<Record<Salt, number>>>;

/**
 * kg of chloride ion per kg of salt, with `waters` molecules of hydrate water a formula unit.
 * NaCl 0.60663; MgCl2·6H2O 0.34877.
 */
export function chlorideMassFraction(salt: Salt, waters = 0): number {
  return (chloridesOf[salt] * CHLORINE_G_PER_MOL) / (molarMassGPerMol[salt] + waters * WATER_G_PER_MOL);
}

/** Mass fraction of the brine → kg of salt per kg of water, `w/(1 − w)`. RangeError outside 0 ≤ w < 1. */
export function massFractionToSaltPerWater(massFraction: number): number {
  if (!(massFraction >= 0 && massFraction < 1)) {
    throw new RangeError(`A mass fraction lies from 0 to below 1, not ${massFraction}`);
  }
  return massFraction / (1 - massFraction);
}

/** kg of salt per kg of water → mass fraction of the brine, `x/(1 + x)`. RangeError below 0. */
export function saltPerWaterToMassFraction(saltPerWater: number): number {
  if (!(saltPerWater >= 0)) throw new RangeError(`Salt per water is 0 or more, not ${saltPerWater}`);
  return saltPerWater === Infinity ? 1 : saltPerWater / (1 + saltPerWater);
}

/** kg of salt per kg of water → mol per kg of water. NaCl at 0.11111 (10 %) is 1.901188 mol/kg. */
export function saltPerWaterToMolality(salt: Salt, saltPerWater: number): number {
  return (1000 * saltPerWater) / molarMassGPerMol[salt];
}

/** mol per kg of water → kg of salt per kg of water. */
export function molalityToSaltPerWater(salt: Salt, molality: number): number {
  return (molality * molarMassGPerMol[salt]) / 1000;
}

/**
 * kg of each salt per kg of water, from mass fractions of the whole brine; a salt named twice is added up.
 * RangeError when a fraction is negative or no number, or when they leave no water.
 */
export function saltPerWaterOf(solutes: readonly Solute[]): SaltPerWater {
  let total = 0;
  for (const { salt, massFraction } of solutes) {
    if (!(massFraction >= 0)) throw new RangeError(`The mass fraction of ${salt} is 0 or more, not ${massFraction}`);
    total += massFraction;
  }
  if (!(total < 1)) throw new RangeError(`The salts of a brine are below 1 of its mass together, not ${total}`);
  const perWater: Partial<Record<Salt, number>> = {};
  for (const { salt, massFraction } of solutes) {
    if (massFraction > 0) perWater[salt] = (perWater[salt] ?? 0) + massFraction / (1 - total);
  }
  return perWater;
}

/** The salts of a composition with their amounts above zero, in the order of `salts`. */
export function amountsOf(perWater: SaltPerWater): readonly { salt: Salt; saltPerWater: number }[] {
  return salts.flatMap((salt) => {
    const amount = perWater[salt] ?? 0;
    return amount > 0 ? [{ salt, saltPerWater: amount }] : [];
  });
}
