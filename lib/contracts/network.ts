import { z } from 'zod';
import { roadSurfaces, serviceClasses } from '@/lib/geo/assumed';
import { segmentLimits } from '@/lib/geo/limits';
import { assumedAttributes } from '@/lib/geo/network';
import { filledName, typedBoolean, typedId, typedNumber } from './form-values';

export const exposures = ['open', 'sheltered', 'shaded', 'ridge', 'shore'] as const;
export type Exposure = (typeof exposures)[number];

const Place = z.tuple([z.number(), z.number()]).readonly();
const Bounds = z.tuple([z.number(), z.number(), z.number(), z.number()]).readonly();
const count = z.int().nonnegative();
const km = z.number().nonnegative();

const ClassTarget = z.enum([...serviceClasses, 'leave-out']);
export const ClassMapping = z.record(z.string().max(60), ClassTarget);
export type ClassMapping = z.output<typeof ClassMapping>;

/** Lists are cut after this many; the counts beside them are whole. */
export const MOST_FINDINGS = 200;

export const NetworkReportView = z.object({
  linesRead: count,
  linesUsed: count,
  segments: count,
  nodes: count,
  lengthKm: km,
  laneKm: km,
  oneWaySegments: count,
  bridges: count,
  deadEnds: count,
  skipped: z.record(z.string(), count),
  classes: z.array(
    z.object({
      roadClass: z.string(),
      target: ClassTarget,
      lines: count,
      segments: count,
      lengthKm: km,
      laneKm: km,
    }),
  ),
  assumedCounts: z.record(z.enum(assumedAttributes), count),
  duplicateCount: count,
  duplicates: z.array(
    z.object({
      droppedId: z.string(),
      keptId: z.string(),
      extent: z.enum(['whole', 'part']),
      isReversed: z.boolean(),
      lengthM: z.number(),
      differsIn: z.array(z.string()),
      at: Place,
    }),
  ),
  zeroLengthCount: count,
  zeroLength: z.array(z.object({ sourceId: z.string(), at: Place })),
  componentCount: count,
  components: z.array(z.object({ segments: count, nodes: count, lengthKm: km, laneKm: km, bounds: Bounds, at: Place })),
  trapCount: count,
  traps: z.array(
    z.object({
      kind: z.enum(['no-way-out', 'no-way-in', 'through-only']),
      nodes: count,
      segments: count,
      lengthKm: km,
      at: Place,
    }),
  ),
  warningCount: count,
  warnings: z.array(
    z.object({ kind: z.string(), sentence: z.string(), sourceIds: z.array(z.string()), at: Place.nullable() }),
  ),
  bounds: Bounds.nullable(),
});
export type NetworkReportView = z.output<typeof NetworkReportView>;

export const importStates = ['previewed', 'applied', 'undone', 'discarded'] as const;

export const NetworkImportRow = z.object({
  id: z.int(),
  state: z.enum(importStates),
  fileName: z.string(),
  source: z.string(),
  attribution: z.string(),
  segments: count,
  lengthKm: km,
  createdAt: z.string(),
  createdByName: z.string(),
  appliedAt: z.string().nullable(),
  appliedByName: z.string().nullable(),
  undoneAt: z.string().nullable(),
  undoneByName: z.string().nullable(),
});
export type NetworkImportRow = z.output<typeof NetworkImportRow>;

/** What saving does, or did, to a road. */
export const roadChanges = ['added', 'changed', 'same', 'retired'] as const;
export type RoadChange = (typeof roadChanges)[number];

export const NetworkImportView = z.object({
  ...NetworkImportRow.shape,
  mapping: ClassMapping,
  report: NetworkReportView,
  changes: z.object({ added: count, changed: count, same: count, retired: count }),
  /** The roads on the map: latitude and longitude, degrees. */
  roads: z.array(
    z.object({
      sourceId: z.string(),
      name: z.string(),
      serviceClass: z.enum(serviceClasses),
      lanes: count,
      change: z.enum(roadChanges),
      path: z.array(Place),
    }),
  ),
});
export type NetworkImportView = z.output<typeof NetworkImportView>;

const SourceName = z.string().trim().min(1, 'The source needs a name.').max(80, 'A name has at most 80 characters.');
const Attribution = z.string().trim().max(200, 'The notice has at most 200 characters.');

export const UploadNetworkQuery = z.strictObject({
  fileName: z.string().trim().min(1, 'The file needs a name.').max(200),
  source: SourceName.optional(),
  attribution: Attribution.optional(),
});
export const UploadNetworkReply = z.object({ id: z.int() });

export const NetworkImportParams = z.object({ id: z.coerce.number().int().positive() });

export const RemapNetworkImportInput = z.strictObject({ id: typedId, mapping: ClassMapping });
export type RemapNetworkImportInput = z.output<typeof RemapNetworkImportInput>;

export const ApplyNetworkImportInput = z.strictObject({
  id: typedId,
  source: SourceName,
  attribution: Attribution,
});
export type ApplyNetworkImportInput = z.output<typeof ApplyNetworkImportInput>;

export const NetworkImportIdInput = z.strictObject({ id: typedId });

const { lanes } = segmentLimits;

export const ChangeSegmentInput = z.strictObject({
  id: typedId,
  /** as it was when the form was opened */
  updatedAt: z.iso.datetime(),
  name: filledName('A road'),
  serviceClass: z.enum(serviceClasses, 'Choose a service class.'),
  lanes: typedNumber(
    z
      .number('The number of lanes is needed.')
      .int('Lanes are whole.')
      .min(lanes.min, `A road has at least ${lanes.min} lane.`)
      .max(lanes.max, `A road has at most ${lanes.max} lanes.`),
  ),
  surface: z.enum(roadSurfaces, 'Choose a surface.'),
  exposure: z.enum(exposures, 'Choose an exposure.'),
  isSensitive: typedBoolean,
});
export type ChangeSegmentInput = z.output<typeof ChangeSegmentInput>;

/** Filter of the list of roads; part of the page's address. */
export const SegmentFilter = z.object({
  find: z.string().trim().max(80).catch(''),
  serviceClass: z.enum(['', ...serviceClasses]).catch(''),
  assumed: z.enum(['', ...assumedAttributes]).catch(''),
  page: z.coerce.number().int().min(1).max(10_000).catch(1),
});
export type SegmentFilter = z.output<typeof SegmentFilter>;
