import { type Salt } from './salts';

/** How far a freezing point may be from an independent measurement, and what that was measured against. */
export interface ExpectedError {
  readonly errorC: number;
  /** Error of a rate worked out from it, as a fraction of the rate. */
  readonly rateError: number;
  readonly against: string;
}

interface Band extends ExpectedError {
  /** The band holds down to here, °C. */
  readonly downToC: number;
}

const newer =
  'newer measurements; handbooks of the last century are up to 0.15 °C warmer at −12 °C, 0.5 °C near the eutectic';

/**
 * Bands of agreement between the model and published tables: CRC Handbook 102nd ed. (after Wolf 1966), Lange's
 * Handbook 15th ed. Table 5.13, Melinder 2010. Sources disagree among themselves by about as much.
 */
const bands: Readonly<Record<Exclude<Salt, 'KCl'>, readonly Band[]>> = {
  NaCl: [{ downToC: -Infinity, errorC: 0.1, rateError: 0.015, against: newer }],
  CaCl2: [
    { downToC: -15, errorC: 0.6, rateError: 0.04, against: 'every published table; 0.2 °C against the CRC Handbook' },
    { downToC: -25, errorC: 1.5, rateError: 0.05, against: 'every published table' },
    { downToC: -35, errorC: 2, rateError: 0.05, against: 'every published table, which differ among themselves' },
    { downToC: -Infinity, errorC: 3, rateError: 0.05, against: 'published tables, which differ by up to 7 °C here' },
  ],
  MgCl2: [
    { downToC: -10, errorC: 0.5, rateError: 0.04, against: 'every published table' },
    { downToC: -17, errorC: 1, rateError: 0.04, against: 'every published table' },
    { downToC: -Infinity, errorC: 2.5, rateError: 0.07, against: 'published tables, which differ among themselves' },
  ],
};

/**
 * Expected error of a freezing point of one salt on the ice branch, °C; `null` for KCl, which was not scored against a
 * table. The error of the pavement temperature nearly always matters more: 1 °C is 11 % of a NaCl rate at −8 °C.
 */
export function expectedFreezingError(salt: Salt, freezingPointC: number): ExpectedError | null {
  if (salt === 'KCl') return null;
  return bands[salt].find(({ downToC }) => freezingPointC >= downToC) ?? null;
}

/**
 * Expected error of the temperature at which a salt separates from an over-strong brine, °C; `null` where no table of
 * that branch was found. MgCl2 against Lange Table 5.13 (24–30 %: 0.2 °C, 23 %: 0.9); for CaCl2 handbooks differ by up to
 * 10 °C among themselves, so a tank is to be kept well clear of it; NaCl meets its published peritectic within
 * 0.1 °C and its eutectic within 0.2 % of salt, which on this steep branch is worth about 1 °C (judged, no table).
 */
export function expectedSaltPointError(salt: Salt): ExpectedError | null {
  switch (salt) {
    case 'NaCl':
      return {
        errorC: 1,
        rateError: 0.015,
        against: 'the two ends of this branch in print; a tenth of a per cent of salt moves it by 0.7 °C',
      };
    case 'CaCl2':
      return { errorC: 10, rateError: 0.05, against: 'handbooks, which differ by that much on this branch' };
    case 'MgCl2':
      return { errorC: 1, rateError: 0.07, against: 'Lange’s Handbook' };
    case 'KCl':
      return null;
  }
}
