/** Highest rate that can be logged, g/m²; the database holds the same limit. Far above any spreader: it catches slips of the unit. */
export const highestRateGPerM2 = 1000;

/** Highest mass of one load, kg; the database holds the same limit. */
export const highestLoadKg = 60_000;

/** A set rate further from the plan than this fraction is shown as a difference to explain (common practice, no source). */
export const rateToleranceFraction = 0.1;
