/**
 * The demo's fortnight in hours from its anchor (the moment the demo was made): one storm over and
 * done with six days before, one that began eight and a half hours ago. Pavement temperatures are
 * of a level road in open country.
 */
type Knot = readonly [hoursFromAnchor: number, value: number];

export interface StormScript {
  pavementC: readonly Knot[];
  precipitationMmPerH: readonly Knot[];
  windMPerS: number;
  /** snow until here, freezing drizzle after */
  drizzleFromH: number;
}

export const finishedStorm: StormScript = {
  pavementC: [
    [-160, 1.2],
    [-156, 0.6],
    [-152, -0.2],
    [-148, -1.4],
    [-144, -2.6],
    [-140, -3.1],
    [-137, -2.4],
    [-133, -0.6],
    [-128, 0.9],
  ],
  precipitationMmPerH: [
    [-152, 0],
    [-150.5, 0.4],
    [-148, 0.7],
    [-145.5, 0.85],
    [-142.5, 0.66],
    [-140, 0.5],
    [-138.3, 0.35],
    [-137, 0],
  ],
  windMPerS: 8,
  drizzleFromH: Infinity,
};

export const presentStorm: StormScript = {
  pavementC: [
    [-16, 1.6],
    [-12, 0.7],
    [-8.5, -0.5],
    [-6, -1.4],
    [-4, -2.4],
    [-2, -3.6],
    [0, -4.5],
    [2, -5.1],
    [4, -5.4],
    [5.5, -4.9],
    [7, -3.4],
    [8.5, -1.4],
    [10, 0.6],
    [13, 1.5],
    [18, 2.0],
  ],
  precipitationMmPerH: [
    [-8.5, 0],
    [-7.4, 0.2],
    [-5.5, 0.28],
    [-3.5, 0.36],
    [-2, 0.46],
    [-0.8, 0.58],
    [0.2, 0.46],
    [0.9, 0.25],
    [1.6, 0.12],
    [3, 0.11],
    [5, 0.1],
    [7.5, 0.08],
    [9.2, 0.06],
    [10, 0],
  ],
  windMPerS: 9,
  drizzleFromH: 1.5,
};

/** Nights, in days before the anchor's own night, when clear sky lets the roads freeze over. */
export const frostyNightsBeforeAnchor = [11, 3];

/** How each of the six stations differs from a level road in open country, in their order. */
export const stationCharacters = [
  { pavementOffsetC: -1.0, airOffsetC: -1.4, precipitationFactor: 1.3, drizzleFactor: 1.45, windFactor: 1.5 },
  { pavementOffsetC: -0.5, airOffsetC: 0.1, precipitationFactor: 1.0, drizzleFactor: 1.3, windFactor: 1.2 },
  { pavementOffsetC: 0.6, airOffsetC: 0.4, precipitationFactor: 0.95, drizzleFactor: 0.75, windFactor: 0.7 },
  { pavementOffsetC: 1.0, airOffsetC: 0.9, precipitationFactor: 0.85, drizzleFactor: 0.65, windFactor: 1.1 },
  { pavementOffsetC: -0.3, airOffsetC: -0.4, precipitationFactor: 1.1, drizzleFactor: 1.1, windFactor: 0.6 },
  { pavementOffsetC: 0.3, airOffsetC: 0.2, precipitationFactor: 0.9, drizzleFactor: 0.8, windFactor: 0.8 },
] as const;

/** The value between knots on straight lines; the end values outside. */
function straight(knots: readonly Knot[], hour: number): number {
  const next = knots.findIndex(([knotHour]) => knotHour > hour);
  const right = knots[next];
  const left = knots[next - 1];
  if (!left) return (next === 0 ? right?.[1] : knots.at(-1)?.[1]) ?? 0;
  if (!right) return left[1];
  return left[1] + ((right[1] - left[1]) * (hour - left[0])) / (right[0] - left[0]);
}

/** The same with its corners rounded over an hour and a half. */
export function along(knots: readonly Knot[], hour: number): number {
  const steps = [-0.75, -0.5, -0.25, 0, 0.25, 0.5, 0.75];
  return steps.reduce((sum, step) => sum + straight(knots, hour + step), 0) / steps.length;
}

/** 0 outside the span of a script's temperatures, 1 well inside, smooth between. */
export function presence({ pavementC }: StormScript, hour: number): number {
  const from = pavementC[0]?.[0] ?? 0;
  const until = pavementC.at(-1)?.[0] ?? 0;
  const share = Math.min(1, Math.max(0, Math.min((hour - from) / 4, (until - hour) / 5)));
  return share * share * (3 - 2 * share);
}
