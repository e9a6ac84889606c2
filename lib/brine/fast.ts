import { saltPerWaterOnIceBranch } from './ice-point';
import { eutecticOf } from './liquidus';
import { massFractionToSaltPerWater, salts, type Salt, type SaltPerWater } from './salts';

/** The freezing curve of one salt, tabulated from the full model: for engines that ask millions of times. */
export interface FastLiquidus {
  readonly salt: Salt;
  readonly eutecticC: number;
  readonly eutecticMassFraction: number;
  /**
   * kg salt per kg water of brine in equilibrium with ice at tempC; 0 at and above 0 °C; Infinity below the eutectic
   * (no brine exists).
   */
  saltPerWaterAt(tempC: number): number;
  /**
   * °C, freezing point of a brine of that kg salt per kg water; eutecticC when stronger than the eutectic (dilution
   * towards ice is what a road cares for). 0 for no salt.
   */
  freezingPointC(saltPerWater: number): number;
}

/** K between entries; straight lines between them are within 0.001 K of the model. */
const STEP_K = 0.1;
/** Single-salt brines are continued to here for blends: past every eutectic of the four. */
const COLDEST_C = -52;
const STEPS = Math.round(-COLDEST_C / STEP_K);
/** Entries of the table the other way, from no salt to the eutectic. */
const STRENGTH_STEPS = 1024;

interface Table {
  readonly eutecticC: number;
  readonly eutecticSaltPerWater: number;
  /** kg salt per kg water at 0, −0.1, −0.2 … °C, past the eutectic too. */
  readonly perWater: Float64Array;
  /** °C at equal steps of kg salt per kg water from 0 to the eutectic. */
  readonly freezingC: Float64Array;
}

function interpolate(table: Float64Array, position: number): number {
  const index = Math.min(Math.floor(position), table.length - 2);
  const low = table[index] ?? 0;
  return low + (position - index) * ((table[index + 1] ?? 0) - low);
}

/** The temperature at which a rising table of strengths reaches one, °C. */
function temperatureAt(perWater: Float64Array, saltPerWater: number): number {
  let low = 0;
  let high = perWater.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((perWater[middle] ?? 0) <= saltPerWater) low = middle;
    else high = middle;
  }
  const from = perWater[low] ?? 0;
  const to = perWater[high] ?? 0;
  return -STEP_K * (low + (saltPerWater - from) / (to - from));
}

function build(salt: Salt): Table {
  const eutectic = eutecticOf(salt);
  const perWater = new Float64Array(STEPS + 1);
  for (let index = 1; index <= STEPS; index += 1) perWater[index] = saltPerWaterOnIceBranch(salt, -index * STEP_K);
  const eutecticSaltPerWater = massFractionToSaltPerWater(eutectic.massFraction);
  const freezingC = new Float64Array(STRENGTH_STEPS + 1);
  for (let index = 1; index <= STRENGTH_STEPS; index += 1) {
    freezingC[index] = temperatureAt(perWater, (index / STRENGTH_STEPS) * eutecticSaltPerWater);
  }
  freezingC[STRENGTH_STEPS] = eutectic.tempC;
  return { eutecticC: eutectic.tempC, eutecticSaltPerWater, perWater, freezingC };
}

const tables = new Map<Salt, Table>();

function tableOf(salt: Salt): Table {
  const known = tables.get(salt);
  if (known !== undefined) return known;
  const built = build(salt);
  tables.set(salt, built);
  return built;
}

function strengthAt(table: Table, tempC: number): number {
  if (tempC >= 0) return 0;
  if (tempC < table.eutecticC) return Infinity;
  return Math.min(interpolate(table.perWater, -tempC / STEP_K), table.eutecticSaltPerWater);
}

function freezingAt(table: Table, saltPerWater: number): number {
  if (!(saltPerWater > 0)) return 0;
  if (saltPerWater >= table.eutecticSaltPerWater) return table.eutecticC;
  return interpolate(table.freezingC, (saltPerWater / table.eutecticSaltPerWater) * STRENGTH_STEPS);
}

/**
 * The freezing curve of one salt as tables with straight lines between, built on first use and kept; within 0.01 °C of
 * the full model everywhere (a test holds it to that). No allocation per call.
 */
export function fastLiquidus(salt: Salt): FastLiquidus {
  const table = tableOf(salt);
  return {
    salt,
    eutecticC: table.eutecticC,
    eutecticMassFraction: eutecticOf(salt).massFraction,
    saltPerWaterAt: (tempC) => strengthAt(table, tempC),
    freezingPointC: (saltPerWater) => freezingAt(table, saltPerWater),
  };
}

/** Each salt's share of what it could hold at a temperature, added up; 1 at the freezing point. */
function sharesAt(saltPerWater: SaltPerWater, tempC: number): number {
  let shares = 0;
  for (const salt of salts) {
    const amount = saltPerWater[salt] ?? 0;
    if (!(amount > 0)) continue;
    const table = tableOf(salt);
    // What is beyond a salt's own eutectic does not stay dissolved in the cold: see below.
    shares += Math.min(amount, table.eutecticSaltPerWater) / interpolate(table.perWater, -tempC / STEP_K);
  }
  return shares;
}

/**
 * The temperature between `floorC` and 0 at which the shares add up to 1. `1/shares − 1` is nearly a straight line in
 * temperature, from −1 at 0 °C, so false position (Illinois variant) needs a handful of steps.
 */
function mixtureRootC(saltPerWater: SaltPerWater, floorC: number): number {
  let warmC = 0;
  let warm = -1;
  let coldC = floorC;
  let cold = 1 / sharesAt(saltPerWater, floorC) - 1;
  if (cold <= 0) return floorC;
  let side = 0;
  for (let step = 0; step < 60 && warmC - coldC > 1e-5; step += 1) {
    const tempC = (warmC * cold - coldC * warm) / (cold - warm);
    const value = 1 / sharesAt(saltPerWater, tempC) - 1;
    if (Math.abs(value) < 1e-7) return tempC;
    if (value > 0) {
      coldC = tempC;
      cold = value;
      if (side === 1) warm /= 2;
      side = 1;
    } else {
      warmC = tempC;
      warm = value;
      if (side === -1) cold /= 2;
      side = -1;
    }
  }
  return (warmC + coldC) / 2;
}

/**
 * °C, ice point of a mixture of kg of each salt per kg of water by the Zdanovskii rule, `Σ x_j/x°_j(T) = 1` with x°_j
 * the single brine of that ice point; 0 for none. Against the full model at most 0.11 °C off for NaCl + CaCl2, 0.09 for
 * NaCl + MgCl2, 0.35 for CaCl2 + MgCl2. One salt alone is its own curve. No allocation per call.
 *
 * Two bounds that the published rule does not have, both on the careful side: a salt counts up to its own eutectic
 * strength and no further (the rest crystallises before ice does), so that a trace of a second salt cannot make a
 * saturated brine look colder than its eutectic; and the answer is never below the coldest eutectic of the salts present.
 */
export function fastMixtureFreezingPointC(saltPerWater: SaltPerWater): number {
  let only: Table | undefined;
  let onlyAmount = 0;
  let count = 0;
  let floorC = 0;
  for (const salt of salts) {
    const amount = saltPerWater[salt] ?? 0;
    if (!(amount > 0)) continue;
    count += 1;
    only = tableOf(salt);
    onlyAmount = amount;
    if (only.eutecticC < floorC) floorC = only.eutecticC;
  }
  if (only === undefined) return 0;
  if (count === 1) return freezingAt(only, onlyAmount);
  return mixtureRootC(saltPerWater, floorC);
}
