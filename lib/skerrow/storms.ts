/** The two storms of the demo, in hours from its anchor; pass times are when trucks leave. */
export interface SkerrowStorm {
  number: number;
  name: string;
  openedH: number;
  fromH: number;
  untilH: number;
  closedH: number | null;
  passesH: readonly number[];
  /** passes for which a plan has been published by the anchor */
  publishedPasses: number;
}

export const storms: readonly SkerrowStorm[] = [
  {
    number: 6,
    name: 'Snow from the north',
    openedH: -154,
    fromH: -152,
    untilH: -137,
    closedH: -135.5,
    passesH: [-151.6, -148.7, -145.8, -142.5, -139.6],
    publishedPasses: 5,
  },
  {
    number: 7,
    name: 'Snow turning to freezing drizzle',
    openedH: -9.5,
    fromH: -8.5,
    untilH: 10,
    closedH: null,
    passesH: [-8.5, -5.75, -2.9, 0.4, 3.7],
    publishedPasses: 3,
  },
];

/** What departs from the plan, so that the ledger has something to find. */
export interface Departure {
  stormNumber: number;
  pass: number | 'every';
  truckNumber: number;
  /** what the spreader gives over what it is set to */
  rateFactor?: number;
  lateMin?: number;
  /** roads the driver reports closed */
  skipped?: { road: string; note: string };
  /** roads at the end of the list that never get logged */
  unloggedAtEnd?: number;
  reliefDriver?: string;
  /** at the demo's now the truck stands at the loader, in the middle of its run */
  isLoadingNow?: boolean;
}

export const departures: readonly Departure[] = [
  { stormNumber: 7, pass: 3, truckNumber: 2, lateMin: 52 },
  { stormNumber: 7, pass: 3, truckNumber: 3, isLoadingNow: true },
  { stormNumber: 7, pass: 3, truckNumber: 4, lateMin: 42 },
  { stormNumber: 7, pass: 3, truckNumber: 5, lateMin: 30 },
  { stormNumber: 7, pass: 3, truckNumber: 7, isLoadingNow: true },
  { stormNumber: 6, pass: 'every', truckNumber: 4, rateFactor: 1.22 },
  { stormNumber: 6, pass: 3, truckNumber: 3, lateMin: 38 },
  {
    stormNumber: 6,
    pass: 4,
    truckNumber: 6,
    skipped: { road: 'Peat Road', note: 'Drifted shut at Ness Hill' },
    unloggedAtEnd: 3,
  },
  { stormNumber: 6, pass: 4, truckNumber: 1, reliefDriver: 'Rhona Garth' },
  { stormNumber: 6, pass: 5, truckNumber: 1, reliefDriver: 'Rhona Garth' },
  { stormNumber: 6, pass: 5, truckNumber: 5, reliefDriver: 'Ivo Sand' },
  { stormNumber: 7, pass: 'every', truckNumber: 4, rateFactor: 1.08 },
  {
    stormNumber: 7,
    pass: 2,
    truckNumber: 8,
    skipped: { road: 'Lighthouse Lane', note: 'Car across the lane, reported' },
  },
];

export const departuresOf = (stormNumber: number, pass: number, truckNumber: number): Departure =>
  Object.assign(
    { stormNumber, pass, truckNumber },
    ...departures.filter(
      (departure) =>
        departure.stormNumber === stormNumber &&
        departure.truckNumber === truckNumber &&
        (departure.pass === 'every' || departure.pass === pass),
    ),
  ) as Departure;
