import { salts, type Salt } from '../brine/salts';

/** g/m² of each anhydrous salt. */
export type SaltMasses = Record<Salt, number>;

/**
 * What lies on a square metre of road. Water in kg/m², which is mm; salts in g/m². Everything is 0 or more.
 * One film is one treated lane's average: wheel tracks and edges are not told apart.
 */
export interface Film {
  liquidMm: number;
  frozenMm: number;
  /** salts in solution (or locked in brine pockets of the ice): they leave with the liquid */
  dissolved: SaltMasses;
  /** grains that have not dissolved yet */
  undissolved: SaltMasses;
  /** time constant with which the grains dissolve, that of the product spread last, min */
  dissolveMin: number;
  /** ice grown on to the pavement, which a plough does not take */
  isBonded: boolean;
  /**
   * What fell since the road was last thawed or ploughed, and how much of it as snow or sleet, mm. Salt does not change
   * these, so that the promise they decide is the same whatever is spread.
   */
  fellMm: number;
  fellAsSnowMm: number;
  /** min since snow or sleet last fell; null when none did */
  sinceSnowMin: number | null;
}

/** What a step took off the road: kg/m² of water by way, g/m² of each salt. */
export interface FilmLoss {
  drainedMm: number;
  sprayedMm: number;
  evaporatedMm: number;
  ploughedMm: number;
  salts: SaltMasses;
}

export function noSalts(): SaltMasses {
  return { NaCl: 0, CaCl2: 0, MgCl2: 0, KCl: 0 };
}

export function noLoss(): FilmLoss {
  return { drainedMm: 0, sprayedMm: 0, evaporatedMm: 0, ploughedMm: 0, salts: noSalts() };
}

/** A film of plain water, liquid unless said otherwise; dry with none. RangeError for a negative amount. */
export function plainFilm({ liquidMm = 0, frozenMm = 0 }: { liquidMm?: number; frozenMm?: number } = {}): Film {
  if (!(liquidMm >= 0 && frozenMm >= 0)) throw new RangeError(`Water is 0 mm or more, not ${liquidMm} and ${frozenMm}`);
  return {
    liquidMm,
    frozenMm,
    dissolved: noSalts(),
    undissolved: noSalts(),
    dissolveMin: 0,
    isBonded: false,
    fellMm: liquidMm + frozenMm,
    fellAsSnowMm: 0,
    sinceSnowMin: null,
  };
}

export function copyFilm(film: Film): Film {
  return { ...film, dissolved: { ...film.dissolved }, undissolved: { ...film.undissolved } };
}

/** All water, liquid and frozen, mm. */
export function waterMmOf(film: Film): number {
  return film.liquidMm + film.frozenMm;
}

/** g/m² of all salts in solution. */
export function dissolvedGPerM2(film: Film): number {
  const { NaCl, CaCl2, MgCl2, KCl } = film.dissolved;
  return NaCl + CaCl2 + MgCl2 + KCl;
}

/** g/m² of all salts, dissolved or not. */
export function saltGPerM2(film: Film): number {
  return salts.reduce((sum, salt) => sum + film.dissolved[salt] + film.undissolved[salt], 0);
}
