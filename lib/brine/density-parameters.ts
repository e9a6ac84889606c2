import { type Salt } from './salts';

export interface DensityParameters {
  readonly c0: number;
  readonly c1: number;
  readonly c2: number;
  readonly c3: number;
  readonly c4: number;
  /** Greatest mass fraction of the measurements behind the fit. */
  readonly highestMassFraction: number;
  /** °C below which the formula goes astray and a straight line takes over. */
  readonly straightBelowC: number;
}

/**
 * Density of aqueous solutions: Laliberté 2009, J. Chem. Eng. Data 54:1725 (form of Laliberté and Cooper 2004,
 * J. Chem. Eng. Data 49:1141), read from the open `chemicals` library. t in °C, kg/m³.
 * Measured temperatures: NaCl 0–140, CaCl2 15–127, MgCl2 0–99, KCl 5–125 °C.
 * Against the CRC Handbook at 20 °C, largest and rms error, kg/m³: NaCl 0.5/0.2, CaCl2 2.6/0.6, MgCl2 1.6/0.7.
 * `straightBelowC` of KCl is set like that of NaCl, at the end of its measurements: common practice, no source.
 */
export const densityParameters: Readonly<Record<Salt, DensityParameters>> = {
  NaCl: {
    c0: -0.00324112223655,
    c1: 0.0636354335907,
    c2: 1.01371399467,
    c3: 0.014595101521,
    c4: 3317.34854427,
    highestMassFraction: 0.26589930421877,
    straightBelowC: 5,
  },
  CaCl2: {
    c0: -9.72893747074,
    c1: 14.7005352975,
    c2: 4.19033341468,
    c3: 0.0397403624277,
    c4: 2708.12778895,
    highestMassFraction: 0.5132,
    straightBelowC: 25,
  },
  MgCl2: {
    c0: -0.0215001423272,
    c1: 0.0441202083909,
    c2: 1.53227586827,
    c3: -0.00980785060562,
    c4: -3478.36496884,
    highestMassFraction: 0.323755961314361,
    straightBelowC: 25,
  },
  KCl: {
    c0: -0.855928945959145,
    c1: 6.04073571306402,
    c2: 2.81787416217166,
    c3: 0.0253924645877338,
    c4: 2681.61723465886,
    highestMassFraction: 0.264280379722009,
    straightBelowC: 5,
  },
};
