/** A place on WGS 84 as GeoJSON writes it: longitude first, then latitude, both in degrees. */
export type Position = readonly [lonDeg: number, latDeg: number];

/** West, south, east, north in degrees. */
export type Bounds = readonly [westDeg: number, southDeg: number, eastDeg: number, northDeg: number];

const EQUATORIAL_RADIUS_M = 6_378_137;
const FLATTENING = 1 / 298.257223563;
const ECCENTRICITY_SQUARED = FLATTENING * (2 - FLATTENING);
const RAD_PER_DEG = Math.PI / 180;

/** Two vertices are the same place when they agree to this many parts of a degree (about 1 cm). */
export const STEPS_PER_DEGREE = 1e7;

/**
 * The name of a place: longitude and latitude in whole steps of 10⁻⁷ degree (at most 1.1 cm). Two vertices
 * are one node exactly when their keys are equal; `[11.529894, 50.035859]` is `115298940,500358590`.
 */
export function positionKey([lonDeg, latDeg]: Position): string {
  return `${Math.round(lonDeg * STEPS_PER_DEGREE)},${Math.round(latDeg * STEPS_PER_DEGREE)}`;
}

/**
 * Metres per degree of longitude and of latitude on the WGS 84 ellipsoid at a latitude (prime-vertical and
 * meridian radii of curvature, any textbook of geodesy). At 45°: 78,847 m and 111,132 m.
 * Latitude −90 to 90; outside, RangeError.
 */
export function metresPerDegree(latDeg: number): { lonM: number; latM: number } {
  if (!(Math.abs(latDeg) <= 90)) throw new RangeError(`latitude ${latDeg} is not within −90 to 90`);
  const sine = Math.sin(latDeg * RAD_PER_DEG);
  const under = 1 - ECCENTRICITY_SQUARED * sine * sine;
  const primeVerticalM = EQUATORIAL_RADIUS_M / Math.sqrt(under);
  const meridianM = (primeVerticalM * (1 - ECCENTRICITY_SQUARED)) / under;
  return { lonM: primeVerticalM * Math.cos(latDeg * RAD_PER_DEG) * RAD_PER_DEG, latM: meridianM * RAD_PER_DEG };
}

/**
 * Length of the geodesic between two places in metres, by the radii of curvature at the middle latitude (Gauss).
 * Against PostGIS geography: within 1 part in 10⁶ for edges up to 5 km, 1 in 10⁴ at 100 km; an edge across
 * the date line takes the short way. `[0, 44.5]` to `[0, 45.5]` is 111,132 m.
 */
export function distanceM(from: Position, to: Position): number {
  const { lonM, latM } = metresPerDegree((from[1] + to[1]) / 2);
  const straightDeg = Math.abs(to[0] - from[0]);
  const eastDeg = straightDeg > 180 ? 360 - straightDeg : straightDeg;
  return Math.hypot(eastDeg * lonM, (to[1] - from[1]) * latM);
}

/** Length of a line in metres, the sum of `distanceM` over its edges; 0 for a single place or none. */
export function lineLengthM(line: readonly Position[]): number {
  let lengthM = 0;
  for (let index = 1; index < line.length; index += 1) {
    const from = line[index - 1];
    const to = line[index];
    if (from && to) lengthM += distanceM(from, to);
  }
  return lengthM;
}
