import { z } from 'zod';
import { PlanOptions, PlanWhy } from './plans';

export const StormStateParams = z.object({ id: z.coerce.number().int().positive() });
export const PlannedWhyParams = z.object({
  id: z.coerce.number().int().positive(),
  segmentId: z.coerce.number().int().positive(),
});

/** Why a plan says so of one road, with what it was made from. Times are ms since 1970. */
export const PlannedWhyView = z.object({
  why: PlanWhy.nullable(),
  options: PlanOptions,
  forecastIssuedAt: z.number().nullable(),
  policyVersion: z.int(),
});
export type PlannedWhyView = z.output<typeof PlannedWhyView>;

/** How many whole numbers of a packed row (see `packed-steps.ts`) make one unit. */
export const perUnit = {
  tempC: 100,
  marginC: 100,
  waterMm: 1000,
  massFraction: 10_000,
  precipitationMm: 1000,
} as const;

/** In a row of holds: no end in sight as far as is forecast. */
export const NO_END = 32_767;

export const plannedActions = ['nothing', 'plough', 'anti-ice', 'pre-wet', 'solid', 'abrasives', 'undecided'] as const;
export const precipitationWords = [
  'none',
  'rain',
  'drizzle',
  'snow',
  'sleet',
  'freezing-rain',
  'freezing-drizzle',
  'frost',
  'unknown',
] as const;

const At = z.number();

const StationView = z.object({
  id: z.int(),
  name: z.string(),
  status: z.enum(['current', 'stale', 'missing']),
  newestAt: At.nullable(),
  /** Packed rows of one: a value a step. */
  tempC: z.string(),
  errorC: z.string(),
  precipitationMm: z.string(),
  /** index into `precipitationWords` a step */
  precipitationTypes: z.array(z.int()),
});

const PlanView = z.object({
  id: z.int(),
  version: z.int(),
  passNumber: z.int(),
  publishedAt: At.nullable(),
});

/** One instance a road of `segmentIds`, in their order, in every list here. */
const PlannedColumns = z.object({
  /** index into `plannedActions`; −1 where the plan says nothing */
  actions: z.array(z.int()),
  /** index into `materials`; −1 for none */
  materials: z.array(z.int()),
  ratesGPerM2: z.array(z.number().nullable()),
  ratesMlPerM2: z.array(z.number().nullable()),
  /** 1 where the plan ploughs too */
  isPloughed: z.array(z.int()),
  /** index into `reasonTexts` */
  reasons: z.array(z.int()),
  reasonTexts: z.array(z.string()),
});

/** All that the Roads screen needs to move through a storm without asking again. Times are ms since 1970. */
export const StormStateView = z.object({
  stormId: z.int(),
  number: z.int(),
  name: z.string(),
  isClosed: z.boolean(),
  dataVersion: z.string(),
  /** the moment that parts measured from forecast */
  nowAt: At,
  axis: z.object({ startAt: At, stepMin: z.number(), count: z.int() }),
  segmentIds: z.array(z.int()),
  /** Packed, a row a road. */
  marginC: z.string(),
  pavementC: z.string(),
  waterMm: z.string(),
  massFraction: z.string(),
  /** steps until the promise breaks if nobody comes */
  holdSteps: z.string(),
  /** a digit a road: 0 current, 1 stale, 2 missing */
  statuses: z.string(),
  /** index into `stations` of the nearest; −1 without any */
  stationOf: z.array(z.int()),
  /** minutes from the start of a pass until the truck is there; null when no route has the road */
  arrivalMin: z.array(z.number().nullable()),
  truckOf: z.array(z.int().nullable()),
  stations: z.array(StationView),
  forecastIssuedAt: At.nullable(),
  passes: z.array(z.object({ number: z.int(), startsAt: At })),
  /** `mainSalt` is the one there is most of; null for grit */
  materials: z.array(z.object({ id: z.int(), name: z.string(), form: z.string(), mainSalt: z.string().nullable() })),
  /** the newest version */
  plan: PlanView.nullable(),
  /** the newest version of each pass under way or to come */
  plans: z.array(PlanView),
  planned: PlannedColumns.nullable(),
  /** the newest entry of each road that has one */
  last: z.array(
    z.object({
      index: z.int(),
      at: At,
      outcome: z.enum(['spread', 'ploughed', 'skipped']),
      materialName: z.string().nullable(),
      rateGPerM2: z.number().nullable(),
      truckNumber: z.int(),
    }),
  ),
  treatedThisPass: z.int(),
  trucksOut: z.array(
    z.object({
      id: z.int(),
      number: z.int(),
      latDeg: z.number(),
      lonDeg: z.number(),
      lastRoad: z.string().nullable(),
      lastLoggedAt: At.nullable(),
      yardName: z.string(),
      isLoading: z.boolean(),
    }),
  ),
});
export type StormStateView = z.output<typeof StormStateView>;
