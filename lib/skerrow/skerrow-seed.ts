/** The island everybody knows as Skerrow; another number draws another one on the same plan. */
export const skerrowSeed = 7;
