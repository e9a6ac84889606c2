import { harvieJ } from './harvie';
import {
  cationCharge,
  cationMixings,
  chloridePairs,
  debyeHueckelSlope,
  type Cation,
  type TemperatureSeries,
} from './pitzer-parameters';
import { amountsOf, cationOf, saltPerWaterToMolality, type SaltPerWater } from './salts';

/** mol of water in a kg, as PHREEQC has it; the parameters were fitted with this value. */
const WATER_MOL_PER_KG = 55.50837;
const REFERENCE_K = 298.15;
/** b of the Debye–Hückel term, (kg/mol)^½. */
const CLOSEST_APPROACH = 1.2;

/** mol of each cation per kg of water; chloride follows from the charges. */
export type CationMolality = Readonly<Record<Cation, number>>;

interface PairAtTemperature {
  readonly cation: Cation;
  readonly charge: 1 | 2;
  readonly b0: number;
  readonly b1: number;
  readonly b2: number;
  readonly c: number;
  readonly alpha1: number;
  readonly alpha2: number;
}

interface MixingAtTemperature {
  readonly first: Cation;
  readonly second: Cation;
  readonly theta: number;
  readonly psi: number;
}

/** The model at one temperature for the cations that are present. */
export interface PitzerAtTemperature {
  readonly tempK: number;
  readonly aPhi: number;
  readonly pairs: readonly PairAtTemperature[];
  readonly mixings: readonly MixingAtTemperature[];
}

function seriesAt(series: TemperatureSeries, tempK: number): number {
  const [a0, a1, a2, a3, a4, a5] = series;
  return (
    a0 +
    a1 * (1 / tempK - 1 / REFERENCE_K) +
    a2 * Math.log(tempK / REFERENCE_K) +
    a3 * (tempK - REFERENCE_K) +
    a4 * (tempK * tempK - REFERENCE_K * REFERENCE_K) +
    a5 * (1 / (tempK * tempK) - 1 / (REFERENCE_K * REFERENCE_K))
  );
}

/** The osmotic Debye–Hückel slope A_φ at a temperature in kelvin, (kg/mol)^½. */
export function debyeHueckelSlopeAt(tempK: number): number {
  return seriesAt(debyeHueckelSlope, tempK);
}

/** mol of each cation per kg of water, from kg of each salt per kg of water. */
export function cationMolality(perWater: SaltPerWater): CationMolality {
  const molality = { Na: 0, K: 0, Ca: 0, Mg: 0 };
  for (const { salt, saltPerWater } of amountsOf(perWater)) {
    molality[cationOf[salt]] += saltPerWaterToMolality(salt, saltPerWater);
  }
  return molality;
}

/** The cations of a solution, in a fixed order. */
export function cationsIn(molality: CationMolality): readonly Cation[] {
  return (['Na', 'K', 'Ca', 'Mg'] as const).filter((cation) => molality[cation] > 0);
}

/** Parameters of the model at a temperature in kelvin (about 203 to 298) for the cations named. */
export function pitzerAt(tempK: number, cations: readonly Cation[]): PitzerAtTemperature {
  const pairs = cations.map((cation) => {
    const pair = chloridePairs[cation];
    const charge = cationCharge[cation];
    return {
      cation,
      charge,
      b0: seriesAt(pair.b0, tempK),
      b1: seriesAt(pair.b1, tempK),
      b2: seriesAt(pair.b2, tempK),
      // C_ca = C0/(2 √|z_c z_a|); chloride has charge one.
      c: seriesAt(pair.c0, tempK) / (2 * Math.sqrt(charge)),
      alpha1: pair.alpha1,
      alpha2: pair.alpha2,
    };
  });
  const mixings = cationMixings
    .filter(({ first, second }) => cations.includes(first) && cations.includes(second))
    .map(({ first, second, theta, psi }) => ({
      first,
      second,
      theta: seriesAt(theta, tempK),
      psi: seriesAt(psi, tempK),
    }));
  return { tempK, aPhi: debyeHueckelSlopeAt(tempK), pairs, mixings };
}

interface IonTotals {
  readonly chloride: number;
  readonly cations: number;
  /** Ionic strength, mol/kg. */
  readonly strength: number;
}

function totalsOf(model: PitzerAtTemperature, molality: CationMolality): IonTotals {
  let chloride = 0;
  let cations = 0;
  let strength = 0;
  for (const { cation, charge } of model.pairs) {
    const m = molality[cation];
    cations += m;
    chloride += m * charge;
    strength += (m * charge * charge) / 2;
  }
  return { chloride, cations, strength: strength + chloride / 2 };
}

/** Eθ and I·Eθ′ of two cations of different charge; nought for equal charges. */
function unsymmetricalMixing(model: PitzerAtTemperature, mixing: MixingAtTemperature, strength: number) {
  const zi = cationCharge[mixing.first];
  const zj = cationCharge[mixing.second];
  if (zi === zj) return { eTheta: 0, strengthTimesSlope: 0 };
  const scale = 6 * model.aPhi * Math.sqrt(strength);
  const ij = harvieJ(zi * zj * scale);
  const ii = harvieJ(zi * zi * scale);
  const jj = harvieJ(zj * zj * scale);
  const eTheta = (zi * zj * (ij.j - ii.j / 2 - jj.j / 2)) / (4 * strength);
  const slope = (zi * zj * (ij.xJPrime - ii.xJPrime / 2 - jj.xJPrime / 2)) / (8 * strength) - eTheta;
  return { eTheta, strengthTimesSlope: slope };
}

/** Σ m_i (φ − 1)/2 and Σ m_i, mol/kg. */
function osmoticSums(model: PitzerAtTemperature, molality: CationMolality): { excess: number; ions: number } {
  const { chloride, cations, strength } = totalsOf(model, molality);
  const root = Math.sqrt(strength);
  let excess = (-model.aPhi * strength * root) / (1 + CLOSEST_APPROACH * root);
  for (const pair of model.pairs) {
    const b = pair.b0 + pair.b1 * Math.exp(-pair.alpha1 * root) + pair.b2 * Math.exp(-pair.alpha2 * root);
    // Z = Σ m_i |z_i| is twice the chloride: the solution is neutral.
    excess += molality[pair.cation] * chloride * (b + 2 * chloride * pair.c);
  }
  for (const mixing of model.mixings) {
    const { eTheta, strengthTimesSlope } = unsymmetricalMixing(model, mixing, strength);
    const bracket = mixing.theta + eTheta + strengthTimesSlope + chloride * mixing.psi;
    excess += molality[mixing.first] * molality[mixing.second] * bracket;
  }
  return { excess, ions: chloride + cations };
}

/**
 * Osmotic coefficient φ of a chloride solution, no unit: Pitzer's equation with B2 and unsymmetrical mixing,
 * `φ = 1 + 2S/Σm_i` (Toner and Catling 2017; Pitzer 1991). mol/kg in; 1 for pure water.
 * NaCl 0.1 mol/kg at 298.15 K: 0.932453. Reproduces PHREEQC with the same parameters to 3e-7.
 */
export function osmoticCoefficient(model: PitzerAtTemperature, molality: CationMolality): number {
  const { excess, ions } = osmoticSums(model, molality);
  return ions > 0 ? 1 + (2 * excess) / ions : 1;
}

/**
 * Natural logarithm of the activity of water, no unit: `ln a_w = −φ Σm_i/55.50837`. 0 for pure water.
 * NaCl 0.1 mol/kg at 298.15 K: −0.00335968.
 */
export function lnWaterActivity(model: PitzerAtTemperature, molality: CationMolality): number {
  const { excess, ions } = osmoticSums(model, molality);
  return ions > 0 ? -(ions + 2 * excess) / WATER_MOL_PER_KG : 0;
}

/** ln γ of each cation present and of chloride, no unit. */
export interface LnActivityCoefficients {
  readonly cations: Readonly<Partial<Record<Cation, number>>>;
  readonly chloride: number;
}

const g = (x: number) => (2 * (1 - (1 + x) * Math.exp(-x))) / (x * x);
const gPrime = (x: number) => (-2 * (1 - (1 + x + (x * x) / 2) * Math.exp(-x))) / (x * x);

/**
 * Ion activity coefficients of a chloride solution by Pitzer's equation (Pitzer 1991), mol/kg in, molal scale.
 * NaCl 0.1 mol/kg at 298.15 K: mean ln γ −0.251598. RangeError for pure water, which has no ions.
 */
export function lnActivityCoefficients(model: PitzerAtTemperature, molality: CationMolality): LnActivityCoefficients {
  const { chloride, strength } = totalsOf(model, molality);
  if (!(strength > 0)) throw new RangeError('Pure water has no ion activity coefficients');
  const root = Math.sqrt(strength);
  const closest = 1 + CLOSEST_APPROACH * root;
  let f = -model.aPhi * (root / closest + (2 / CLOSEST_APPROACH) * Math.log(closest));
  let third = 0;
  const cations: Partial<Record<Cation, number>> = {};
  let lnChloride = 0;
  for (const pair of model.pairs) {
    const m = molality[pair.cation];
    const b = pair.b0 + pair.b1 * g(pair.alpha1 * root) + pair.b2 * g(pair.alpha2 * root);
    f += (m * chloride * (pair.b1 * gPrime(pair.alpha1 * root) + pair.b2 * gPrime(pair.alpha2 * root))) / strength;
    third += m * chloride * pair.c;
    const pairTerm = 2 * b + 2 * chloride * pair.c;
    cations[pair.cation] = chloride * pairTerm;
    lnChloride += m * pairTerm;
  }
  for (const mixing of model.mixings) {
    const { first, second, theta, psi } = mixing;
    const { eTheta, strengthTimesSlope } = unsymmetricalMixing(model, mixing, strength);
    f += (molality[first] * molality[second] * strengthTimesSlope) / strength;
    const bracket = 2 * (theta + eTheta) + chloride * psi;
    cations[first] = (cations[first] ?? 0) + molality[second] * bracket;
    cations[second] = (cations[second] ?? 0) + molality[first] * bracket;
    lnChloride += molality[first] * molality[second] * psi;
  }
  for (const { cation, charge } of model.pairs) {
    cations[cation] = (cations[cation] ?? 0) + charge * charge * f + charge * third;
  }
  return { cations, chloride: lnChloride + f + third };
}
