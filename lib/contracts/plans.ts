import { z } from 'zod';
import { cautionWords, type Caution } from '@/lib/treatment/cautions';
import { treatmentActions } from '@/lib/treatment/choose-treatment';
import { materialForms } from '@/lib/treatment/materials';
import { serviceClasses } from '@/lib/treatment/policy';
import { promiseKinds } from '@/lib/treatment/promise';
import { type ReasonPart } from '@/lib/treatment/reason';

const RowId = z.int().positive();
const at = z.number();
const number = z.number();

export const WorkOutInput = z.strictObject({ stormId: RowId, passNumber: RowId });
export const PublishInput = z.strictObject({ planId: RowId });

const parts = z.array(z.custom<ReasonPart>((part) => typeof part === 'object' && part !== null && 'kind' in part));
const cautions = Object.keys(cautionWords) as [Caution, ...Caution[]];
const refusals = [
  'not-needed',
  'melts-nothing',
  'below-eutectic',
  'below-practical-limit',
  'over-spreader-limit',
  'over-policy-limit',
  'not-in-time',
  'brine-too-weak',
  'liquid-before-rain',
  'liquid-in-freezing-rain',
  'liquid-on-bonded',
  'dry-cold-blowing',
] as const;

/** One product's answer for a road, as kept beside the plan. Rates in g/m² of product. */
export const PlanOption = z.discriminatedUnion('ok', [
  z.object({
    ok: z.literal(true),
    materialId: RowId,
    rateGPerM2: number,
    rateMlPerM2: number.nullable(),
    leastGPerM2: number,
    chlorideGPerM2: number,
    costCentsPer1000M2: number,
  }),
  z.object({
    ok: z.literal(false),
    materialId: RowId,
    reason: z.enum(refusals),
    neededRateGPerM2: number.nullable(),
    limit: number.nullable(),
  }),
]);
export type PlanOption = z.output<typeof PlanOption>;
export const PlanOptions = z.array(PlanOption);

/** Why a plan says what it says of a road. Times are ms since 1970; `pavementTempC` is that of the pass. */
export const PlanWhy = z.object({
  isPloughed: z.boolean(),
  promise: z.enum(promiseKinds),
  passAt: at,
  untilAt: at,
  pavementTempC: number.nullable(),
  coldestC: number.nullable(),
  before: z.object({ waterMm: number, saltGPerM2: number, massFraction: number, freezingPointC: number }).nullable(),
  water: z.object({ nowMm: number, afterPloughMm: number, fallingMm: number, earlierSaltGPerM2: number }),
  binding: z
    .object({
      at,
      waterMm: number,
      tempC: number,
      target: z.enum(['loose-snow', 'no-ice']),
      targetPhi: number,
      lossFraction: number,
      scatter: number,
      leastGPerM2: number,
      isHeatLimited: z.boolean(),
    })
    .nullable(),
  shorterCycle: z
    .object({ materialId: RowId, rateGPerM2: number, holdMin: number, neededRateGPerM2: number })
    .nullable(),
  /** sentences are made of these with `reasonSentence`, in the reader's units */
  parts,
  cautions: z.array(z.enum(cautions)),
  carried: z.object({
    stationIds: z.array(RowId),
    newestReadingAt: at.nullable(),
    ageMin: number.nullable(),
    status: z.enum(['current', 'stale', 'missing']),
    source: z.enum(['measured', 'forecast']),
    siteOffsetC: number,
  }),
});
export type PlanWhy = z.output<typeof PlanWhy>;

const form = z.enum(materialForms);

/** What a plan comes to. */
export const PlanSummary = z.object({
  roads: z.int(),
  laneKm: number,
  massKg: number,
  saltKg: number,
  brineL: number,
  chlorideKg: number,
  costCents: number,
  groups: z.array(
    z.object({
      serviceClass: z.enum(serviceClasses),
      action: z.enum(treatmentActions),
      materialName: z.string().nullable(),
      form: form.nullable(),
      roads: z.int(),
      /** of them, how many hold only with a shorter cycle */
      shorterCycles: z.int().default(0),
      laneKm: number,
      /** lowest, middle and highest rate, g/m² */
      ratesGPerM2: z.tuple([number, number, number]).nullable(),
      massKg: number,
      volumeL: number.nullable(),
      costCents: number,
    }),
  ),
  /** Products that limits forbid somewhere, most roads first. */
  refused: z.array(
    z.object({
      materialName: z.string(),
      reason: z.enum(refusals),
      roads: z.int(),
      neededRateGPerM2: number.nullable(),
      limit: number.nullable(),
    }),
  ),
  /** Roads that hold only with a shorter cycle, or where nothing holds. */
  exceptions: z.array(
    z.object({
      segmentId: RowId,
      roadName: z.string(),
      serviceClass: z.enum(serviceClasses),
      action: z.enum(treatmentActions),
      parts,
    }),
  ),
});
export type PlanSummary = z.output<typeof PlanSummary>;

/** What was known when a plan was worked out. */
export const PlanInputs = z.object({
  passAt: at,
  nextPassAt: at,
  /** false where the storm's end stands for a next pass that nobody has set */
  hasNextPass: z.boolean(),
  forecast: z.object({ id: RowId, source: z.string(), issuedAt: at }),
  policyVersion: z.int(),
  stations: z.array(
    z.object({
      id: RowId,
      name: z.string(),
      newestReadingAt: at.nullable(),
      ageMin: number.nullable(),
      status: z.enum(['current', 'stale', 'missing']),
    }),
  ),
  materialIds: z.array(RowId),
  treatmentsLogged: z.int(),
  treatmentsPlanned: z.int(),
});
export type PlanInputs = z.output<typeof PlanInputs>;
