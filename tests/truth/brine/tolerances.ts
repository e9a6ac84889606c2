import { type FreezingTable } from './published';

/** How far the model may be from a table in one span of temperature; both errors are of absolute values. */
export interface Tolerance {
  readonly salt: FreezingTable['salt'];
  readonly table: FreezingTable['table'];
  readonly solid: string;
  readonly downToC: number;
  /** Rows this holds for: one that drops out is noticed. */
  readonly count: number;
  readonly largestC: number;
  readonly meanC: number;
  /** Error of a rate in per cent, where rows are colder than −0.95 °C. */
  readonly largestRatePercent: number;
}

const ice = (
  salt: Tolerance['salt'],
  table: Tolerance['table'],
  rest: Omit<Tolerance, 'salt' | 'table' | 'solid'>,
): Tolerance => ({ salt, table, solid: 'ice', ...rest });

/**
 * The accuracy claimed for the model against independent tables, not fitted to what it reaches. The tables disagree
 * among themselves by as much: for CaCl2 1 °C at 20 % and 4 °C at 26 %. The rows of the CRC Handbook for CaCl2 above
 * 20 % contradict calorimetry and are no part of the fixtures; Lange prints 19 % MgCl2 as −25.6 °C beside −12.2 °F,
 * which is −24.56 °C, and that is the value held here.
 */
export const tolerances: readonly Tolerance[] = [
  ice('NaCl', 'crc', { downToC: -15, count: 27, largestC: 0.25, meanC: 0.1, largestRatePercent: 1.5 }),
  ice('NaCl', 'crc', { downToC: -22, count: 32, largestC: 0.5, meanC: 0.15, largestRatePercent: 1.5 }),
  // One decimal of a degree in °F: dilute rows are rounded by up to 5 %.
  ice('NaCl', 'lange', { downToC: -22, count: 19, largestC: 0.5, meanC: 0.25, largestRatePercent: 5 }),
  ice('NaCl', 'melinder', { downToC: -22, count: 8, largestC: 0.5, meanC: 0.25, largestRatePercent: 2 }),
  ice('CaCl2', 'crc', { downToC: -15, count: 18, largestC: 0.2, meanC: 0.1, largestRatePercent: 4 }),
  ice('CaCl2', 'crc', { downToC: -25, count: 21, largestC: 1.5, meanC: 0.3, largestRatePercent: 5 }),
  ice('CaCl2', 'melinder', { downToC: -15, count: 4, largestC: 0.6, meanC: 0.3, largestRatePercent: 4 }),
  ice('CaCl2', 'melinder', { downToC: -25, count: 7, largestC: 1.5, meanC: 0.8, largestRatePercent: 5 }),
  ice('CaCl2', 'melinder', { downToC: -35, count: 9, largestC: 2, meanC: 1, largestRatePercent: 5 }),
  ice('CaCl2', 'melinder', { downToC: -51, count: 11, largestC: 3, meanC: 1.5, largestRatePercent: 5 }),
  ice('MgCl2', 'crc', { downToC: -10, count: 6, largestC: 0.05, meanC: 0.02, largestRatePercent: 1 }),
  // Claimed as ±0.2; Lange prints a tenth of a degree below −10, so half of that is allowed on top.
  ice('MgCl2', 'lange', { downToC: -14, count: 10, largestC: 0.25, meanC: 0.12, largestRatePercent: 4 }),
  ice('MgCl2', 'lange', { downToC: -17, count: 11, largestC: 1, meanC: 0.3, largestRatePercent: 4 }),
  ice('MgCl2', 'lange', { downToC: -34, count: 17, largestC: 2.5, meanC: 0.8, largestRatePercent: 7 }),
  {
    salt: 'MgCl2',
    table: 'lange',
    solid: 'MgCl2·12H2O',
    downToC: -34,
    count: 8,
    largestC: 1,
    meanC: 0.3,
    largestRatePercent: 0,
  },
];

/** Largest error of density, kg/m³; the Lange table of MgCl2 is 0.2–0.5 % heavier than the CRC Handbook throughout. */
export const densityTolerances = [
  { salt: 'NaCl', table: 'crc', count: 35, largest: 1, mean: 0.5 },
  { salt: 'NaCl', table: 'lange', count: 20, largest: 1.5, mean: 0.7 },
  { salt: 'CaCl2', table: 'crc', count: 25, largest: 3, mean: 1 },
  { salt: 'MgCl2', table: 'crc', count: 21, largest: 3, mean: 1 },
  { salt: 'MgCl2', table: 'lange', count: 25, largest: 6, mean: 3 },
] as const;

/** Eutectics in print differ: −49.8, −51 and −55 °C for CaCl2. */
export const eutecticTolerances = {
  NaCl: { tempC: 0.2, massFractionPercent: 0.3 },
  CaCl2: { tempC: 1, massFractionPercent: 1 },
  MgCl2: { tempC: 0.5, massFractionPercent: 0.5 },
} as const;
