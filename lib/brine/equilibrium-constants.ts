import { type Cation } from './pitzer-parameters';

/**
 * Equilibrium constants of ice and of the chlorides that crystallise from brine.
 *
 * Source: Toner and Catling 2017, J. Chem. Eng. Data 62:3151, as published in the file `ColdChem.dat` of the
 * PHREEQC distribution of the US Geological Survey. `log10 K = A1 + A2 T + A3/T + A4 log10 T + A5/T² + A6 T²`,
 * T in kelvin, about −70 to +25 °C. CaCl2·4H2O, which takes over from the hexahydrate above 29 °C, is not in the set.
 */
export type EquilibriumSeries = readonly [number, number, number, number, number, number];

/** H2O(ice) = H2O(liquid). */
export const iceConstants: EquilibriumSeries = [
  -11.0976341, 0.00511995404, 348.880086, 3.65409383, -7517.72938, -5.09587694e-6,
];

export type CrystalFormula =
  'NaCl' | 'NaCl·2H2O' | 'KCl' | 'MgCl2·6H2O' | 'MgCl2·8H2O' | 'MgCl2·12H2O' | 'CaCl2·6H2O' | 'CaCl2·2MgCl2·12H2O';

export interface Crystal {
  readonly formula: CrystalFormula;
  readonly name: string;
  /** Cations in one formula unit. */
  readonly cations: Readonly<Partial<Record<Cation, number>>>;
  readonly chlorides: number;
  readonly waters: number;
  readonly constants: EquilibriumSeries;
}

export const crystals: readonly Crystal[] = [
  {
    formula: 'NaCl',
    name: 'rock salt',
    cations: { Na: 1 },
    chlorides: 1,
    waters: 0,
    constants: [-92.362574, -0.0713492206, 1412.35386, 43.7540523, -72134.033, 3.41140194e-5],
  },
  {
    formula: 'NaCl·2H2O',
    name: 'sodium chloride dihydrate',
    cations: { Na: 1 },
    chlorides: 1,
    waters: 2,
    constants: [-117.676947, -0.0672022066, 2009.72645, 52.9295029, -87173.0584, 2.87396671e-5],
  },
  {
    formula: 'KCl',
    name: 'potassium chloride',
    cations: { K: 1 },
    chlorides: 1,
    waters: 0,
    constants: [130.535936, -0.0391368319, -9241.94776, -38.2764516, 337736.436, 4.44874215e-5],
  },
  {
    formula: 'MgCl2·6H2O',
    name: 'magnesium chloride hexahydrate',
    cations: { Mg: 1 },
    chlorides: 2,
    waters: 6,
    constants: [24.6395926, 0.0590910963, 2684.56507, -15.7871021, -239877.356, -5.56842159e-5],
  },
  {
    formula: 'MgCl2·8H2O',
    name: 'magnesium chloride octahydrate',
    cations: { Mg: 1 },
    chlorides: 2,
    waters: 8,
    constants: [2.69077213, 0.0649725432, 2561.0815, -7.33697311, -253958.289, -6.18927911e-5],
  },
  {
    formula: 'MgCl2·12H2O',
    name: 'magnesium chloride dodecahydrate',
    cations: { Mg: 1 },
    chlorides: 2,
    waters: 12,
    constants: [-44.9253758, 0.0767593043, 3782.76461, 9.06144419, -282777.364, -7.3418584e-5],
  },
  {
    formula: 'CaCl2·6H2O',
    name: 'calcium chloride hexahydrate',
    cations: { Ca: 1 },
    chlorides: 2,
    waters: 6,
    constants: [171.173898, 0.01632681, -8705.71336, -59.1637207, 280039.803, 3.89050726e-6],
  },
  {
    formula: 'CaCl2·2MgCl2·12H2O',
    name: 'tachyhydrite',
    cations: { Ca: 1, Mg: 2 },
    chlorides: 6,
    waters: 12,
    constants: [310.860794, 0.120385179, -8867.46311, -117.203076, -154324.05, -9.23150187e-5],
  },
];
