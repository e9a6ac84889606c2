/** A road of a route, in the order driven. */
export interface RouteLeg {
  readonly segmentId: number;
  readonly lengthM: number;
  readonly speedKmPerH: number;
}

/** Fastest that a truck spreads, km/h: common practice, no source. */
export const SPREADING_KM_PER_H = 40;

/**
 * Minutes after a pass sets out until the truck is at the middle of each road, driving its roads one after another at
 * the lower of their speed and 40 km/h. Driving between roads and reloading come with the route search, so this is the
 * earliest. A road driven twice counts when it is first reached. 1 km at 40 km/h before 1 km at 20 km/h: 0.75 and 3.
 */
export function arrivalOffsetsMin(legs: readonly RouteLeg[]): Map<number, number> {
  const offsets = new Map<number, number>();
  let drivenMin = 0;
  for (const { segmentId, lengthM, speedKmPerH } of legs) {
    if (!(lengthM >= 0 && speedKmPerH > 0)) {
      throw new RangeError(`A leg has a length and a speed above 0, not ${lengthM} m at ${speedKmPerH} km/h`);
    }
    const takesMin = (lengthM / 1000 / Math.min(SPREADING_KM_PER_H, speedKmPerH)) * 60;
    if (!offsets.has(segmentId)) offsets.set(segmentId, drivenMin + takesMin / 2);
    drivenMin += takesMin;
  }
  return offsets;
}
