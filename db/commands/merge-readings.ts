import { DatabaseError, QueryTypes } from 'sequelize';
import { type Mapping } from '@/lib/readings/mapping';
import { isWordQuantity, quantityFacts, type ReadingQuantity } from '@/lib/readings/quantities';
import { database } from '../connection';
import { readingColumns } from '../queries/readings';
import { execute, selectRows, type Tx } from '../transaction';

interface Merge {
  stationId: number;
  uploadId: number;
  mapping: Mapping;
  /** how many are in `incoming` */
  readings: number;
  /** each later than the one before, or each earlier: no instant comes twice */
  isStrictlyOrdered: boolean;
}

export interface MergeCounts {
  added: number;
  filled: number;
  unchanged: number;
}

const columnsOf = ({ columns }: Mapping) => columns.map(({ quantity }) => readingColumns[quantity]);

/** The table that one COPY fills, good rows and bad: dropped with the transaction. */
export function incomingTable(mapping: Mapping): string {
  const values = mapping.columns.map(
    ({ quantity }) => `${readingColumns[quantity]} ${isWordQuantity(quantity) ? 'text' : 'double precision'}`,
  );
  return `create temp table incoming (line integer not null, observed_at timestamptz, ${values.join(', ')},
            flags text, reject_column text, reject_reason text, raw text) on commit drop`;
}

async function affected(tx: Tx, sql: string, replacements: Record<string, unknown>): Promise<number> {
  const [, rows] = await database().sequelize.query(sql, { type: QueryTypes.UPDATE, replacements, transaction: tx });
  return rows;
}

/**
 * Takes `incoming` into the readings of a station. The first value of an instant stays: what is the same changes
 * nothing, what was missing is filled, what differs is kept as a rejected row. Uploads of one station wait for each
 * other, so that two at once cannot both be first.
 */
export async function mergeReadings(tx: Tx, merge: Merge): Promise<MergeCounts> {
  const { stationId, uploadId, mapping, isStrictlyOrdered } = merge;
  await execute(
    tx,
    `insert into upload_rejects (upload_id, line, column_name, reason, raw)
     select :uploadId, line, reject_column, reject_reason, raw from incoming where reject_reason is not null`,
    { stationId, uploadId },
  );
  const source = isStrictlyOrdered ? '(select * from incoming where observed_at is not null)' : 'merged';
  const count = isStrictlyOrdered ? merge.readings : await gatherByInstant(tx, mapping);
  const added = await add(tx, source, merge);
  if (added === count && isStrictlyOrdered) return { added, filled: 0, unchanged: 0 };
  await execute(tx, 'analyze incoming');
  const { filled, unchanged } = await compare(tx, source, merge);
  if (filled > 0) await fill(tx, source, merge);
  await rejectOthers(tx, merge);
  return { added, filled, unchanged };
}

/**
 * Where nothing is stored between the first and the last instant, a plain insert does, in half the time; should somebody
 * else have been quicker after all, or else, only what is new goes in.
 */
async function add(tx: Tx, source: string, { stationId, uploadId, mapping }: Merge): Promise<number> {
  const columns = columnsOf(mapping).join(', ');
  const insert = `insert into readings (station_id, observed_at, ${columns}, flags, upload_id)
    select :stationId, observed_at, ${columns}, cast(flags as jsonb), :uploadId from ${source} s`;
  const ids = { stationId, uploadId };
  const [{ isFree } = { isFree: false }] = await selectRows<{ isFree: boolean }>(
    `select not exists (
       select 1 from readings r, (select min(observed_at) as first_at, max(observed_at) as last_at from incoming) span
        where r.station_id = :stationId and r.observed_at between span.first_at and span.last_at) as "isFree"`,
    ids,
    tx,
  );
  if (isFree) {
    await execute(tx, 'savepoint plain_insert');
    try {
      return await affected(tx, insert, ids);
    } catch (error) {
      if (!isTaken(error)) throw error;
      await execute(tx, 'rollback to savepoint plain_insert');
    }
  }
  return affected(tx, `${insert} on conflict (station_id, observed_at) do nothing`, ids);
}

const UNIQUE_VIOLATION = '23505';
const isTaken = (error: unknown) =>
  error instanceof DatabaseError && (error.parent as { code?: string }).code === UNIQUE_VIOLATION;

/** A column with a clock of its own, or a row repeated: what is said of one instant becomes one row, the first first. */
async function gatherByInstant(tx: Tx, mapping: Mapping): Promise<number> {
  const first = columnsOf(mapping).map((column) => `first_known(${column}) as ${column}`);
  await execute(
    tx,
    `create temp table merged on commit drop as
     select m.*, f.flags from (
       select observed_at, ${first.join(', ')}
         from (select * from incoming where observed_at is not null order by observed_at, line) i
        group by observed_at) m
       left join (
         select observed_at, jsonb_object_agg(key, value) as flags from (
           select distinct on (observed_at, key) observed_at, key, value
             from incoming, jsonb_each(cast(flags as jsonb)) where flags is not null
            order by observed_at, key, line) each_flag
          group by observed_at) f using (observed_at)`,
  );
  await execute(tx, 'analyze merged');
  const [row] = await selectRows<{ count: number }>('select count(*)::int as count from merged', {}, tx);
  return row?.count ?? 0;
}

const any = (columns: readonly string[], test: (column: string) => string) => `(${columns.map(test).join(' or ')})`;
const fills = (column: string) => `(r.${column} is null and s.${column} is not null)`;
const differs = (column: string) => `coalesce(r.${column} <> s.${column}, false)`;
const joined = `join readings r on r.station_id = :stationId and r.observed_at = s.observed_at
                and r.upload_id is distinct from :uploadId`;

async function compare(tx: Tx, source: string, { stationId, uploadId, mapping }: Merge) {
  const columns = columnsOf(mapping);
  const [row] = await selectRows<{ filled: number; unchanged: number }>(
    `select count(*) filter (where ${any(columns, fills)})::int as filled,
            count(*) filter (where not ${any(columns, fills)} and not ${any(columns, differs)})::int as unchanged
       from ${source} s ${joined}`,
    { stationId, uploadId },
    tx,
  );
  return row ?? { filled: 0, unchanged: 0 };
}

async function fill(tx: Tx, source: string, { stationId, uploadId, mapping }: Merge): Promise<void> {
  const columns = columnsOf(mapping);
  const sets = columns.map((column) => `${column} = coalesce(r.${column}, s.${column})`);
  const known = mapping.columns.map(
    ({ quantity }) => `case when r.${readingColumns[quantity]} is not null then '${quantity}' end`,
  );
  await execute(
    tx,
    `update readings r
        set ${sets.join(', ')},
            flags = nullif(coalesce(r.flags, '{}') || (coalesce(cast(s.flags as jsonb), '{}')
                     - array_remove(array[${known.join(', ')}]::text[], null)), '{}')
       from ${source} s
      where r.station_id = :stationId and r.observed_at = s.observed_at and r.upload_id is distinct from :uploadId
        and ${any(columns, fills)}`,
    { stationId, uploadId },
  );
}

const siUnits: Readonly<Record<string, string>> = {
  temperature: ' °C',
  fraction: ' %',
  speed: ' m/s',
  direction: '°',
  fallen: ' mm',
  depth: ' mm',
  flux: ' W/m²',
  distance: ' m',
};

/** A stored value as a reader of the rejects sees it, in SQL. */
function said(alias: string, quantity: ReadingQuantity): string {
  const column = `${alias}.${readingColumns[quantity]}`;
  const { family } = quantityFacts[quantity];
  if (family === 'word') return column;
  const figure = family === 'fraction' ? `${column} * 100` : column;
  return `round(cast(${figure} as numeric), 2) || '${siUnits[family] ?? ''}'`;
}

/** Runs last: whatever row differs from what is stored now was not the first to speak of its instant. */
async function rejectOthers(tx: Tx, { stationId, uploadId, mapping }: Merge): Promise<void> {
  const columns = columnsOf(mapping);
  const values = mapping.columns.map(
    ({ quantity }, index) =>
      `(:column${index}, ${differs(readingColumns[quantity])}, ${said('r', quantity)}, ${said('s', quantity)})`,
  );
  const names = Object.fromEntries(mapping.columns.map(({ column }, index) => [`column${index}`, column]));
  await execute(
    tx,
    `insert into upload_rejects (upload_id, line, column_name, reason, raw)
     select :uploadId, s.line, v.column_name,
            to_char(s.observed_at at time zone 'UTC', 'YYYY-MM-DD HH24:MI') || ' UTC already has ' || v.stored ||
            ', and this row says ' || v.given || '. The first stays.', coalesce(s.raw, '')
       from incoming s join readings r on r.station_id = :stationId and r.observed_at = s.observed_at
       cross join lateral (values ${values.join(', ')}) v(column_name, is_other, stored, given)
      where ${any(columns, differs)} and v.is_other
     on conflict do nothing`,
    { stationId, uploadId, ...names },
  );
}
