/** Limits of what a road can be in this program; the database holds the same. */
export const segmentLimits = {
  lanes: { min: 1, max: 12 },
  widthM: { min: 1, max: 60 },
  speedKmPerH: { min: 5, max: 160 },
} as const;

/** Kilometres in an international mile, exact. */
export const MILE_KM = 1.609344;

/** Gaps shorter than this between ends that do not meet are reported: they are seldom meant. Common practice, no source. */
export const NEAR_MISS_M = 1;

/** A two-way road narrower than this carries one lane. Common practice, no source. */
export const SINGLE_TRACK_WIDTH_M = 4.5;

/** Largest file of roads that is taken, bytes. */
export const NETWORK_FILE_BYTES = 50 * 1024 * 1024;
