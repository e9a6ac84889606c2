/** The drawn outline of the island and its waters, kilometres east and north of its middle. */
type Km = readonly [eastKm: number, northKm: number];

/** Anticlockwise from Orr Head; the inlet of Skail Water, Hallow harbour and the Toll estuary cut into it. */
export const coastKm: readonly Km[] = [
  [10.8, 1.15],
  [10.1, 2.15],
  [9.1, 2.75],
  [8.2, 2.85],
  [7.4, 2.65],
  [6.7, 2.32],
  [6.1, 2.12],
  [5.55, 1.95],
  [5.1, 2.12],
  [5.75, 2.42],
  [6.35, 2.5],
  [6.95, 2.9],
  [7.6, 3.4],
  [8.4, 3.6],
  [9.0, 3.85],
  [8.95, 4.7],
  [8.1, 5.3],
  [7.6, 6.1],
  [6.7, 6.55],
  [6.0, 6.3],
  [5.5, 5.75],
  [4.85, 5.7],
  [4.25, 6.15],
  [3.7, 6.9],
  [2.5, 7.3],
  [1.6, 7.05],
  [0.7, 7.6],
  [-0.4, 8.05],
  [-1.2, 7.5],
  [-1.9, 6.85],
  [-2.8, 6.65],
  [-3.5, 7.15],
  [-4.6, 7.5],
  [-5.7, 7.2],
  [-6.3, 6.6],
  [-7.2, 6.35],
  [-7.7, 5.5],
  [-8.7, 4.9],
  [-9.5, 4.2],
  [-9.9, 3.3],
  [-9.35, 2.6],
  [-8.7, 2.35],
  [-8.25, 2.0],
  [-8.1, 1.6],
  [-8.35, 1.2],
  [-8.9, 1.0],
  [-9.5, 0.75],
  [-10.2, 0.2],
  [-10.8, -0.6],
  [-10.6, -1.7],
  [-9.8, -2.3],
  [-9.3, -3.0],
  [-9.6, -3.8],
  [-10.3, -4.6],
  [-10.3, -5.6],
  [-9.5, -6.3],
  [-8.4, -6.2],
  [-7.6, -5.9],
  [-6.8, -6.3],
  [-5.7, -6.95],
  [-4.6, -6.6],
  [-3.7, -6.35],
  [-2.9, -6.9],
  [-1.9, -7.5],
  [-0.8, -7.45],
  [0.2, -7.0],
  [0.95, -6.45],
  [1.35, -5.75],
  [1.5, -5.1],
  [1.7, -4.7],
  [1.85, -5.2],
  [2.05, -5.8],
  [2.6, -6.5],
  [3.7, -6.95],
  [4.8, -6.75],
  [5.6, -6.15],
  [6.1, -5.45],
  [6.9, -5.05],
  [7.7, -5.4],
  [8.6, -5.6],
  [9.4, -5.0],
  [9.5, -4.0],
  [8.9, -3.2],
  [8.8, -2.4],
  [9.5, -1.7],
  [10.4, -1.2],
  [10.6, -0.2],
  [11.1, 0.5],
];

/** Small islands off the coast: middle, half-width, half-height. */
export const isletsKm: readonly { name: string; middle: Km; halfSizeKm: Km }[] = [
  { name: 'Little Orr', middle: [10.9, 3.5], halfSizeKm: [0.42, 0.26] },
  { name: 'Gannet Stack', middle: [-10.9, 2.2], halfSizeKm: [0.22, 0.3] },
  { name: 'Toll Holm', middle: [3.0, -7.75], halfSizeKm: [0.5, 0.2] },
];

export const riversKm: readonly { name: string; line: readonly Km[] }[] = [
  {
    name: 'Toll Water',
    line: [
      [-5.5, 1.9],
      [-5.3, 1.1],
      [-4.9, 0.35],
      [-4.6, -0.25],
      [-3.8, -0.8],
      [-3.0, -1.2],
      [-2.1, -1.5],
      [-1.3, -1.75],
      [-0.5, -2.25],
      [0.1, -3.0],
      [0.75, -3.5],
      [1.1, -4.2],
      [1.7, -4.85],
    ],
  },
  {
    name: 'Quarry Burn',
    line: [
      [1.9, 2.9],
      [2.15, 1.9],
      [1.7, 1.0],
      [1.55, 0.1],
      [1.0, -0.7],
      [0.75, -1.6],
      [0.45, -2.4],
      [0.15, -3.02],
    ],
  },
  {
    name: 'Skail Beck',
    line: [
      [2.2, 4.1],
      [3.0, 3.75],
      [3.7, 3.0],
      [4.4, 2.3],
      [5.18, 2.1],
    ],
  },
];

export const lakesKm: readonly { name: string; ring: readonly Km[] }[] = [
  {
    name: 'Moss Mere',
    ring: [
      [-3.5, -1.0],
      [-3.1, -0.85],
      [-2.6, -1.05],
      [-2.15, -1.3],
      [-1.85, -1.6],
      [-2.2, -1.75],
      [-2.7, -1.6],
      [-3.2, -1.4],
    ],
  },
];

/** Hills as smooth bells: top above their surroundings in metres, half-widths along and across their own direction. */
export const hills: readonly {
  name: string;
  top: Km;
  riseM: number;
  alongKm: number;
  acrossKm: number;
  bearingDeg: number;
}[] = [
  { name: 'Carrick Law', top: [1.35, 3.65], riseM: 262, alongKm: 1.7, acrossKm: 1.25, bearingDeg: 75 },
  { name: 'Hallow Fell', top: [-3.35, 3.75], riseM: 252, alongKm: 1.9, acrossKm: 1.3, bearingDeg: 110 },
  { name: 'The Saddle', top: [-1.0, 3.5], riseM: 145, alongKm: 3.4, acrossKm: 1.5, bearingDeg: 90 },
  { name: 'Orr Hill', top: [7.6, 0.1], riseM: 128, alongKm: 1.5, acrossKm: 0.9, bearingDeg: 60 },
  { name: 'Ness Hill', top: [-7.6, -2.7], riseM: 122, alongKm: 1.6, acrossKm: 1.0, bearingDeg: 140 },
  { name: 'Kirk Brae', top: [-1.4, -4.9], riseM: 84, alongKm: 1.6, acrossKm: 0.8, bearingDeg: 95 },
];

export const seaNames: readonly { name: string; at: Km }[] = [
  { name: 'Sound of Orr', at: [-7.4, -7.6] },
  { name: 'Skail Water', at: [8.2, 3.2] },
  { name: 'Hallow Roads', at: [-10.9, 3.4] },
];
