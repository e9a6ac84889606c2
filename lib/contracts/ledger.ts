import { z } from 'zod';

const RowId = z.coerce.number().int().positive();
export const StormParams = z.object({ id: RowId });

export const LedgerAccount = z.object({
  roads: z.int(),
  skipped: z.int(),
  recommendedKg: z.number(),
  spreadKg: z.number(),
  saltKg: z.number(),
  chlorideKg: z.number(),
  chlorideOnSensitiveKg: z.number(),
  costCents: z.number(),
});

export const LedgerRun = z.object({
  runId: z.string(),
  routeName: z.string().nullable(),
  passNumber: z.int().nullable(),
  truckNumber: z.int(),
  driverName: z.string(),
  startedAt: z.string(),
  finishedAt: z.string().nullable(),
  roadsTotal: z.int(),
  roadsDone: z.int(),
  loadedKg: z.number(),
  medianRateGPerM2: z.number().nullable(),
  account: LedgerAccount,
});
export type LedgerRun = z.output<typeof LedgerRun>;

export const LedgerRoad = z.object({
  runId: z.string(),
  segmentId: z.int(),
  roadName: z.string(),
  serviceClass: z.string(),
  outcome: z.enum(['spread', 'ploughed', 'skipped']),
  materialName: z.string().nullable(),
  rateGPerM2: z.number().nullable(),
  recommendedMaterialName: z.string().nullable(),
  recommendedRateGPerM2: z.number().nullable(),
  areaM2: z.number(),
  spreadKg: z.number(),
  recommendedKg: z.number(),
  spreadAt: z.string(),
  recordedAt: z.string(),
  note: z.string(),
  isAmendment: z.boolean(),
});
export type LedgerRoad = z.output<typeof LedgerRoad>;

/** Something a supervisor should look at, in words. */
export const LedgerNote = z.object({ what: z.string(), cause: z.string() });

export const LedgerView = z.object({
  stormId: z.int(),
  stormNumber: z.int(),
  stormName: z.string(),
  fromAt: z.string(),
  untilAt: z.string(),
  isClosed: z.boolean(),
  currency: z.string(),
  total: LedgerAccount,
  laneKm: z.number(),
  brineL: z.number(),
  runs: z.array(LedgerRun),
  roads: z.array(LedgerRoad),
  notes: z.array(LedgerNote),
});
export type LedgerView = z.output<typeof LedgerView>;
