import { z } from 'zod';
import { highestLoadKg, highestRateGPerM2 } from '@/lib/ledger/limits';

const Id = z.uuid('An id must be a UUID.');
const At = z.iso
  .datetime({ offset: true, error: 'A time must be an ISO time with its offset.' })
  .transform((text) => new Date(text));
const RowId = z.int().positive();

export const RunParams = z.object({ id: Id });

export const StartRunInput = z
  .strictObject({
    id: Id,
    truckId: RowId,
    /** a standing route, or a free list of segments in order */
    routeId: RowId.nullable().default(null),
    segmentIds: z.array(RowId).max(2000).default([]),
    /** who drives, when someone else starts the run for them */
    driverId: RowId.nullable().default(null),
    startedAt: At,
  })
  .refine((input) => (input.routeId === null) !== (input.segmentIds.length === 0), {
    path: ['routeId'],
    message: 'Choose a route or a list of roads, one of the two.',
  });
export type StartRunInput = z.output<typeof StartRunInput>;

export const SpreadEntryInput = z
  .strictObject({
    id: Id,
    runId: Id,
    segmentId: RowId,
    outcome: z.enum(['spread', 'ploughed', 'skipped']),
    materialId: RowId.nullable().default(null),
    rateGPerM2: z
      .number('The rate must be a number in g/m².')
      .min(0, 'The rate cannot be negative.')
      .max(highestRateGPerM2, `The rate cannot be over ${highestRateGPerM2} g/m²: check the unit.`)
      .nullable()
      .default(null),
    isPloughed: z.boolean().default(false),
    rateSource: z.enum(['as-shown', 'typed', 'controller']).default('as-shown'),
    note: z.string().max(500, 'A note has at most 500 characters.').default(''),
    spreadAt: At,
    amendsId: Id.nullable().default(null),
  })
  .refine((input) => input.outcome !== 'spread' || (input.materialId !== null && input.rateGPerM2 !== null), {
    path: ['rateGPerM2'],
    message: 'A road that was spread needs its material and rate.',
  });
export type SpreadEntryInput = z.output<typeof SpreadEntryInput>;

export const LoadInput = z.strictObject({
  id: Id,
  runId: Id,
  yardId: RowId,
  materialId: RowId,
  massKg: z
    .number('The load must be a number in kg.')
    .positive('The load must be more than nothing.')
    .max(highestLoadKg, `A load cannot be over ${highestLoadKg} kg: check the unit.`),
  loadedAt: At,
});
export type LoadInput = z.output<typeof LoadInput>;

export const FinishRunInput = z.strictObject({ runId: Id, finishedAt: At });
export type FinishRunInput = z.output<typeof FinishRunInput>;

/** What a tablet keeps until the server has it. Oldest first; `id` makes a repeat harmless. */
export const OutboxMessage = z.discriminatedUnion('kind', [
  z.strictObject({ version: z.literal(1), id: Id, madeAt: At, kind: z.literal('start-run'), payload: StartRunInput }),
  z.strictObject({
    version: z.literal(1),
    id: Id,
    madeAt: At,
    kind: z.literal('spread-entry'),
    payload: SpreadEntryInput,
  }),
  z.strictObject({ version: z.literal(1), id: Id, madeAt: At, kind: z.literal('load'), payload: LoadInput }),
  z.strictObject({ version: z.literal(1), id: Id, madeAt: At, kind: z.literal('finish-run'), payload: FinishRunInput }),
]);
export type OutboxMessage = z.output<typeof OutboxMessage>;

/** `recorded` the first time, `already-recorded` when the same id comes again. */
export const Recorded = z.object({ id: z.string(), result: z.enum(['recorded', 'already-recorded']) });
export type Recorded = z.output<typeof Recorded>;

const Instant = z.date().transform((date) => date.toISOString());
const InstantText = z.union([Instant, z.string()]);

export const RunRoad = z.object({
  position: z.int(),
  segmentId: z.int(),
  name: z.string(),
  serviceClass: z.enum(['A', 'B', 'C', 'D']),
  lanes: z.int(),
  lengthM: z.number(),
  areaM2: z.number(),
  exposure: z.string(),
  isBridge: z.boolean(),
  isSensitive: z.boolean(),
  /** what the newest published plan asks for; null when it says nothing about this road */
  action: z.string().nullable(),
  materialId: z.int().nullable(),
  materialName: z.string().nullable(),
  rateGPerM2: z.number().nullable(),
  rateMlPerM2: z.number().nullable(),
  reason: z.string().nullable(),
  pavementTempC: z.number().nullable(),
  /** the plan counts on the plough going first */
  isPloughed: z.boolean(),
  /** the entry last logged, for correcting it */
  entryId: z.string().nullable(),
  /** what was logged; null while the road is still to do */
  outcome: z.enum(['spread', 'ploughed', 'skipped']).nullable(),
  loggedRateGPerM2: z.number().nullable(),
  loggedMaterialName: z.string().nullable(),
  spreadAt: InstantText.nullable(),
});
export type RunRoad = z.output<typeof RunRoad>;

export const RunView = z.object({
  id: z.string(),
  driverId: z.int(),
  driverName: z.string(),
  truckId: z.int(),
  truckNumber: z.int(),
  hopperKg: z.number(),
  tankL: z.number(),
  maxRateGPerM2: z.number(),
  minRateGPerM2: z.number(),
  calibratedOn: z.string().nullable(),
  routeName: z.string().nullable(),
  stormNumber: z.int().nullable(),
  passNumber: z.int().nullable(),
  planVersion: z.int().nullable(),
  startedAt: InstantText,
  finishedAt: InstantText.nullable(),
  loadedKg: z.number(),
  spreadKg: z.number(),
  roads: z.array(RunRoad),
});
export type RunView = z.output<typeof RunView>;
