/**
 * Pitzer parameters of the chlorides of sodium, potassium, calcium and magnesium in water, −70 to +25 °C.
 *
 * Source: Toner and Catling 2017, J. Chem. Eng. Data 62:3151, as published in the file `ColdChem.dat` of the
 * PHREEQC distribution of the US Geological Survey. Each series is
 * `a0 + a1(1/T − 1/Tr) + a2 ln(T/Tr) + a3(T − Tr) + a4(T² − Tr²) + a5(1/T² − 1/Tr²)`, T in kelvin, Tr = 298.15 K.
 * Units: (kg/mol) for B0, B1, B2 and theta, (kg/mol)² for C0 and psi, (kg/mol)^½ for the Debye–Hückel slope and alpha.
 * The sulfate rows of the source are left out: no material in the product holds sulfate as an active salt.
 */
export type TemperatureSeries = readonly [number, number, number, number, number, number];

export type Cation = 'Na' | 'K' | 'Ca' | 'Mg';

export const cationCharge: Readonly<Record<Cation, 1 | 2>> = { Na: 1, K: 1, Ca: 2, Mg: 2 };

/** The osmotic Debye–Hückel slope A_φ; 0.391475 at 25 °C, 0.376859 at 0 °C. */
export const debyeHueckelSlope: TemperatureSeries = [0.391475, 571.5406, 1.409425, 0.00142591, -1.431259e-6, -23882.02];

export interface ChloridePair {
  readonly b0: TemperatureSeries;
  readonly b1: TemperatureSeries;
  readonly b2: TemperatureSeries;
  readonly c0: TemperatureSeries;
  readonly alpha1: number;
  readonly alpha2: number;
}

/** Each cation with chloride. */
export const chloridePairs: Readonly<Record<Cation, ChloridePair>> = {
  Na: {
    b0: [0.0914649401, 379.801366, -4.90110805, 0.00222963373, 1.52080581e-5, -123087.011],
    b1: [0.284765738, -5296.43274, -14.4176456, -0.0165432118, 4.02189441e-5, 249801.971],
    b2: [-0.0243653114, -3895.93796, 0.470784204, -0.00745515374, -1.73562079e-5, 344943.259],
    c0: [-0.000144675793, 184.098991, 0.310540828, 0.00298078169, -3.9298978e-6, -4715.9737],
    alpha1: 2,
    alpha2: 0.5,
  },
  K: {
    b0: [0.0571195081, -290.431558, -1.48678192, -0.00164799613, 5.54444329e-6, -13082.6093],
    b1: [0.21159828, -1642.14177, -7.25863112, -0.00973682396, 2.88345391e-5, 1089.26901],
    b2: [-0.0113225945, -1019.28896, -1.37051659, -0.00423447042, 7.65961704e-7, 47790.7476],
    c0: [-0.00184317106, -309.193697, -0.244073786, -0.0010487383, 5.99728205e-7, 27405.3587],
    alpha1: 2,
    alpha2: 0.5,
  },
  Ca: {
    b0: [3.16259193, -1239.21067, -3.9305314, -0.0086540086, -1.31441465e-5, -245290.782],
    b1: [1.79602312, -3478.35644, -5.46805175, -0.0139156928, 1.11743263e-5, 132399.994],
    b2: [-3.59786737, 2050.38674, 5.20141195, 0.0124673606, 1.3037378e-5, 242563.331],
    c0: [-0.0625205928, -32.8893136, -0.155416953, 0.000554063013, 3.21763846e-7, 10083.8661],
    alpha1: 1,
    alpha2: 0.1,
  },
  Mg: {
    b0: [0.363859308, 829.468216, -0.192141894, 0.00307212441, -3.00517607e-7, -82765.8755],
    b1: [1.66306195, 8794.59314, 17.0594977, 0.0367157132, -4.09093883e-5, -419173.045],
    b2: [-0.0233325594, 189.902359, 3.16007089, 0.00523142195, -1.58642893e-5, 40105.1252],
    c0: [0.00454861472, -143.787677, -0.27043472, -8.33291002e-5, 2.23958734e-7, 10874.7231],
    alpha1: 2,
    alpha2: 0.5,
  },
};

export interface CationMixing {
  readonly first: Cation;
  readonly second: Cation;
  readonly theta: TemperatureSeries;
  /** With chloride as the anion. */
  readonly psi: TemperatureSeries;
}

/** Each two cations beside chloride. */
export const cationMixings: readonly CationMixing[] = [
  {
    first: 'K',
    second: 'Na',
    theta: [-0.0154666879, 78.1083072, -0.148995996, 0.00382165106, -4.40548557e-6, -2736.7578],
    psi: [-0.000875146963, -0.131251503, 0.0146364991, -3.89172849e-5, 1.60456551e-8, -24.8979095],
  },
  {
    first: 'Ca',
    second: 'Na',
    theta: [0.0743104665, 537.178181, 6.17477295, -0.0155668804, 1.12086386e-6, 3953.88118],
    psi: [0.00710063151, 28.2235816, 0.139941607, 8.32672101e-5, -3.1032171e-7, -1821.87238],
  },
  {
    first: 'Mg',
    second: 'Na',
    theta: [0.0686826012, 62.7981446, -0.00936915659, 0.00412764819, -4.74889815e-6, 2301.80082],
    psi: [-0.00872872402, 243.863222, -0.55248236, 0.00808154172, -7.4512357e-6, -14234.0505],
  },
  {
    first: 'Ca',
    second: 'K',
    theta: [0.0260269977, -18.8203602, 0.0923417097, -0.000239668221, 1.14016305e-7, -458.969498],
    psi: [-0.00970714792, -4.44357423, -0.00310611807, 9.58988655e-6, -5.38702035e-9, 11.1108536],
  },
  {
    first: 'K',
    second: 'Mg',
    theta: [0.0443008071, -15.2685212, 0.0868101323, 2.98865403e-5, -1.54009323e-7, -1168.48834],
    psi: [-0.0309323702, -8.72837467, 0.0295701229, -7.69621716e-5, 3.67321725e-8, -146.301115],
  },
  {
    first: 'Ca',
    second: 'Mg',
    theta: [0.0259823638, 53.1416082, 0.0316938224, 0.00118349516, -1.24977453e-6, -3828.15635],
    psi: [-0.0109027531, -410.818988, -3.62754763, 0.0131070634, -8.26208145e-6, 7971.79489],
  },
];
