import { z } from 'zod';
import { delimiters, encodings, faultsOfMapping, type Mapping } from '@/lib/readings/mapping';
import { isWordQuantity, quantities, type ReadingQuantity } from '@/lib/readings/quantities';
import { EARLIEST_MS } from '@/lib/readings/read-row';
import { fileUnitNames } from '@/lib/readings/units';
import { filledName, typedBoolean, typedId, typedIdOrNone, typedNumber } from './form-values';

const count = z.int().nonnegative();
const ColumnName = z.string().min(1, 'Name the column.').max(200);
const Pattern = z.string().trim().min(1, 'Say how the time is laid out.').max(60);
const MissingCodes = z.array(z.string().max(40, 'A code has at most 40 characters.')).max(50);

const ClockInput = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('zone'), zone: z.string().min(1, 'Name the time zone.').max(60) }),
  z.strictObject({ kind: z.literal('offset'), offsetMin: z.int('An offset is whole minutes.') }),
]);

const TimeInput = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('one'), column: ColumnName, pattern: Pattern }),
  z.strictObject({
    kind: z.literal('two'),
    dateColumn: ColumnName,
    datePattern: Pattern,
    timeColumn: ColumnName,
    timePattern: Pattern,
  }),
  z.strictObject({
    kind: z.literal('parts'),
    yearColumn: ColumnName,
    monthColumn: ColumnName,
    dayColumn: ColumnName,
    hourColumn: ColumnName,
    minuteColumn: ColumnName.nullable(),
    hourZero: z.enum(['begins-day', 'ends-day']),
  }),
]);

const ColumnInput = z.strictObject({
  column: ColumnName,
  quantity: z.enum(quantities),
  unit: z.enum(fileUnitNames),
  clock: ClockInput.nullable(),
  missing: MissingCodes,
  intervalMin: z.number('The interval must be a number of minutes.'),
  timeIs: z.enum(['end', 'start']),
});

/** How a station's files are read; what it says must hang together. */
export const MappingInput: z.ZodType<Mapping> = z
  .strictObject({
    version: z.literal(1),
    encoding: z.enum(encodings),
    delimiter: z.enum(delimiters),
    quote: z.enum(['"', "'"]),
    decimalMark: z.enum(['.', ',']),
    hasHeader: z.boolean(),
    skipLines: z.int().min(0).max(100, 'At most 100 lines can stand before the table.'),
    clock: ClockInput,
    time: TimeInput,
    missing: MissingCodes,
    columns: z.array(ColumnInput).max(quantities.length),
  })
  .superRefine((mapping, context) => {
    for (const [part, message] of Object.entries(faultsOfMapping(mapping))) {
      context.addIssue({ code: 'custom', path: [part], message });
    }
  });

/** One reading of a file with columns of these quantities, on its way into the database: the last gate. */
export function readingSchema(columns: readonly ReadingQuantity[], latestMs: number) {
  const Word = z.string().max(40).nullable();
  const Figure = z.number().nullable();
  const values = columns.map((quantity) => (isWordQuantity(quantity) ? Word : Figure));
  return z.object({
    atMs: z.int().min(EARLIEST_MS).max(latestMs),
    isTimeGuessed: z.boolean(),
    values: z.tuple(values as [typeof Figure, ...(typeof Figure)[]]),
  });
}

export const ImportReadingsQuery = z.strictObject({
  /** Needed from the screen; a station key knows its own. */
  station: z.coerce.number('A station is told by its number.').int().positive().optional(),
  fileName: z.string().trim().min(1).max(200).default('readings.csv'),
  /** The mapping's time of saving as the sender knows it: another one since then is refused. */
  mappingSavedAt: z.iso.datetime().optional(),
});

export const RejectView = z.object({
  line: z.int(),
  columnName: z.string(),
  reason: z.string(),
  raw: z.string(),
});
export type RejectView = z.output<typeof RejectView>;

export const ImportReadingsReply = z.object({
  /** of the earlier upload when the file had been read before */
  uploadId: z.int(),
  /** set when the same file was read in the same way before: nothing was changed now */
  alreadyReadAt: z.iso.datetime().nullable(),
  rowsRead: count,
  rowsAdded: count,
  rowsFilled: count,
  rowsUnchanged: count,
  rowsRejected: count,
  rowsFlagged: count,
  rowsEmpty: count,
  /** the first few; all of them are kept with the upload */
  firstRejects: z.array(RejectView),
  /** what happened, in a sentence */
  summary: z.string(),
});
export type ImportReadingsReply = z.output<typeof ImportReadingsReply>;

const ProblemLine = z.object({
  title: z.string(),
  detail: z.string(),
  code: z.string(),
  status: z.int(),
  fields: z.record(z.string(), z.string()),
});

/** One line of the reply to the screen, which follows the work as it goes. */
export const ImportProgressLine = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('reading'), rows: count, bytes: count }),
  z.object({ kind: z.literal('storing'), rows: count }),
  z.object({ kind: z.literal('done'), reply: ImportReadingsReply }),
  z.object({ kind: z.literal('problem'), problem: ProblemLine }),
]);
export type ImportProgressLine = z.output<typeof ImportProgressLine>;

export const UploadParams = z.object({ id: z.coerce.number().int().positive() });

export const SaveMappingInput = z.strictObject({ stationId: typedId, mapping: MappingInput });
export type SaveMappingInput = z.output<typeof SaveMappingInput>;

export const SaveStationInput = z.strictObject({
  id: typedIdOrNone,
  name: filledName('A station'),
  longitudeDeg: typedNumber(z.number('The longitude must be a number.').min(-180).max(180, 'Longitudes end at 180.')),
  latitudeDeg: typedNumber(z.number('The latitude must be a number.').min(-90).max(90, 'Latitudes end at 90.')),
  heightM: typedNumber(z.number('The height must be a number.').min(-450).max(9000, 'No road is that high.')),
  zone: z.string().trim().min(1, 'A station needs a time zone.').max(60),
  isActive: typedBoolean,
});
export type SaveStationInput = z.output<typeof SaveStationInput>;

export const IssueStationKeyInput = z.strictObject({ stationId: typedId });
export const RevokeStationKeyInput = z.strictObject({ keyId: typedId });
