import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { applyNetworkImport } from '@/db/commands/apply-network-import';
import { changeSegment } from '@/db/commands/change-segment';
import { discardNetworkImport, previewNetworkImport, remapNetworkImport } from '@/db/commands/preview-network-import';
import { undoNetworkImport } from '@/db/commands/undo-network-import';
import { findAgency } from '@/db/queries/agency';
import { compareNetwork } from '@/db/queries/network-compare';
import {
  findNetworkImport,
  listNetworkAttributions,
  listNetworkImports,
  networkOf,
} from '@/db/queries/network-imports';
import { listSetupSegments, sumSetupSegments } from '@/db/queries/setup-segments';
import { inTransaction, execute, selectRows } from '@/db/transaction';
import { type SourceLine } from '@/lib/geo/network';
import { type Position } from '@/lib/geo/position';
import { testDatabase, type TestDatabase } from '../setup/database';

/*
 *  a ── b ── c      1: a b c (Quay)      2: b d, one-way      3: c e, added in the second file
 *       │    │
 *       d    e
 */
const place = (column: number, row: number): Position => [11.5 + column * 0.001, 50 - row * 0.001];
const [a, b, c, d, e] = [place(0, 0), place(1, 0), place(2, 0), place(1, 1), place(2, 1)];
const line = (sourceId: string, positions: Position[], tags: Record<string, string> = {}): SourceLine => ({
  sourceId,
  positions,
  tags: { highway: 'tertiary', ...tags },
  heightM: null,
});
const first = [line('1', [a, b, c], { name: 'Quay' }), line('2', [b, d], { oneway: 'yes', highway: 'residential' })];
const second = [line('1', [a, b, c], { name: 'Quay', lanes: '3' }), line('3', [c, e])];

let database: TestDatabase;
let by = 0;
const at = (minute: number) => new Date(Date.UTC(2026, 11, 1, 2, minute));

beforeAll(async () => {
  database = await testDatabase();
  const rows = await selectRows<{ id: number }>(
    `insert into people (name, email, password_hash, role) values ('Ada', 'ada@example.org', 'x', 'administrator') returning id`,
  );
  by = rows[0]?.id ?? 0;
});
afterAll(() => database.close());
beforeEach(() =>
  inTransaction(async (tx) => {
    for (const table of ['route_segments', 'routes', 'segments', 'nodes', 'network_imports']) {
      await execute(tx, `delete from ${table}`);
    }
  }),
);

const preview = (lines: SourceLine[], sha256: string, source = 'County') =>
  previewNetworkImport({
    fileName: `${sha256}.geojson`,
    sha256,
    source,
    attribution: '© Somebody',
    mapping: {},
    payload: { lines, skipped: {}, warnings: [] },
    by,
    now: at(0),
  });
const apply = (id: number, minute = 1, source = 'County') =>
  applyNetworkImport({ id, source, attribution: '© Somebody', by, now: at(minute) });
/** Everything of the network that undo must bring back, ids and geometry included. */
const everything = async () => ({
  segments: await selectRows(`select *, geometry::text from segments order by id`),
  nodes: await selectRows(`select id, source_key, position::text from nodes order by id`),
});
const all = { find: '', serviceClass: '', assumed: '', page: 1 } as const;

describe('preview', () => {
  it('changes nothing of the network, and the same file again is the same preview', async () => {
    const { id } = await preview(first, 'one');
    expect(await everything()).toEqual({ segments: [], nodes: [] });
    expect((await preview(first, 'one')).id).toBe(id);
    expect(await listNetworkImports()).toMatchObject([{ id, state: 'previewed', segments: 3, createdByName: 'Ada' }]);
  });

  it('is built anew when classes are mapped otherwise', async () => {
    const { id } = await preview(first, 'one');
    await remapNetworkImport({ id, mapping: { residential: 'leave-out' } });
    const detail = await findNetworkImport({ id });
    expect(detail?.report).toMatchObject({ segments: 1, linesRead: 2 });
    expect(detail?.mapping).toEqual({ residential: 'leave-out' });
  });

  it('can be discarded, once and again, and then not saved', async () => {
    const { id } = await preview(first, 'one');
    await discardNetworkImport({ id, by });
    await discardNetworkImport({ id, by });
    await expect(apply(id)).rejects.toMatchObject({ code: 'not-possible-now' });
    expect(await listNetworkImports()).toEqual([]);
  });

  it('of a file whose every class is left out is kept, to be mapped, but cannot be saved so', async () => {
    const { id } = await preview([line('9', [a, b], { highway: 'track' })], 'track');
    await expect(apply(id)).rejects.toMatchObject({ code: 'not-possible-now' });
    await remapNetworkImport({ id, mapping: { track: 'D' } });
    expect(await apply(id)).toMatchObject({ added: 1 });
  });
});

describe('saving', () => {
  it('writes nodes and segments whose lengths are what PostGIS measures', async () => {
    const { id } = await preview(first, 'one');
    expect(await apply(id)).toMatchObject({ added: 3, updated: 0, retired: 0 });
    const rows = await selectRows<{ name: string; lengthM: number; measuredM: number; isOneWay: boolean }>(
      `select name, length_m as "lengthM", st_length(geometry::geography) as "measuredM", is_one_way as "isOneWay",
              st_equals(st_startpoint(geometry), f.position) and st_equals(st_endpoint(geometry), t.position) as "isTied"
         from segments s join nodes f on f.id = from_node_id join nodes t on t.id = to_node_id order by s.id`,
    );
    expect(rows).toMatchObject([
      { name: 'Quay', isOneWay: false, isTied: true },
      { name: 'Quay', isOneWay: false, isTied: true },
      { name: 'Unnamed, off Quay', isOneWay: true, isTied: true },
    ]);
    for (const { lengthM, measuredM } of rows) expect(Math.abs(lengthM / measuredM - 1)).toBeLessThan(1e-6);
    expect(await listNetworkAttributions()).toEqual(['© Somebody']);
    expect((await findAgency()).attribution).toBe('© Somebody');
  });

  it('twice is harmless, and so is saving from two places at once', async () => {
    const { id } = await preview(first, 'one');
    const both = await Promise.all([apply(id), apply(id)]);
    expect(both.filter(({ wasApplied }) => wasApplied)).toHaveLength(1);
    expect((await everything()).segments).toHaveLength(3);
    expect(await apply(id)).toMatchObject({ wasApplied: true });
  });

  it('the same file loaded again changes no road and adds none', async () => {
    await apply((await preview(first, 'one')).id);
    const before = await everything();
    const again = await preview(first, 'one');
    const detail = await findNetworkImport({ id: again.id });
    const { known } = await compareNetwork(networkOf(detail?.payload ?? { lines: [], skipped: {}, warnings: [] }, {}));
    expect([...known.values()]).toEqual(['same', 'same', 'same']);
    expect(await apply(again.id, 5)).toMatchObject({ added: 0, updated: 3, retired: 0 });
    const ids = (state: { segments: object[] }) => state.segments.map((row) => ('id' in row ? row.id : 0));
    expect(ids(await everything())).toEqual(ids(before));
    expect((await everything()).nodes).toEqual(before.nodes);
  });

  it('a later file of the source keeps ids, changes values in place and retires what it lacks', async () => {
    await apply((await preview(first, 'one')).id);
    const before = await selectRows<{ id: number; sourceKey: string }>(
      `select id, source_key as "sourceKey" from segments order by id`,
    );
    expect(await apply((await preview([line('1', [a, b], { name: 'Quay', lanes: '3' })], 'two')).id, 5)).toMatchObject({
      added: 0,
      updated: 1,
      retired: 2,
    });
    const after = await selectRows<{ id: number; lanes: number; isRetired: boolean }>(
      `select id, lanes, retired_at is not null as "isRetired" from segments order by id`,
    );
    expect(after.map(({ id }) => id)).toEqual(before.map(({ id }) => id));
    expect(after.map(({ lanes, isRetired }) => [lanes, isRetired])).toEqual([
      [3, false],
      [2, true],
      [1, true],
    ]);
  });

  it('a file of another source retires nothing', async () => {
    await apply((await preview(first, 'one')).id);
    const other = await preview([line('7', [d, e])], 'other', 'Town');
    expect(await apply(other.id, 5, 'Town')).toMatchObject({ added: 1, retired: 0 });
  });
});

describe('undo', () => {
  it('of the first import leaves nothing of it, twice is harmless, and it can be saved again', async () => {
    const { id } = await preview(first, 'one');
    await apply(id);
    expect(await undoNetworkImport({ id, by, now: at(2) })).toMatchObject({ removed: 3, kept: 0 });
    expect(await everything()).toEqual({ segments: [], nodes: [] });
    expect(await undoNetworkImport({ id, by, now: at(3) })).toMatchObject({ wasUndone: true });
    expect(await apply(id, 4)).toMatchObject({ added: 3 });
  });

  it('of a second import brings back every value, id and geometry of the first, bit for bit', async () => {
    await apply((await preview(first, 'one')).id);
    const before = await everything();
    const { id } = await preview(second, 'two');
    await apply(id, 5);
    expect(await everything()).not.toEqual(before);
    await undoNetworkImport({ id, by, now: at(6) });
    expect(await everything()).toEqual(before);
  });

  it('is refused while a later import stands on it', async () => {
    const one = await preview(first, 'one');
    await apply(one.id);
    await apply((await preview(second, 'two')).id, 5);
    await expect(undoNetworkImport({ id: one.id, by, now: at(6) })).rejects.toMatchObject({ code: 'not-possible-now' });
  });

  it('retires new roads that a route uses by now, rather than tearing them out', async () => {
    const { id } = await preview(first, 'one');
    await apply(id);
    await inTransaction(async (tx) => {
      await execute(
        tx,
        `insert into yards (name, position, solid_capacity_kg, brine_capacity_l)
         values ('Yard', st_setsrid(st_makepoint(11.5, 50), 4326), 0, 0)`,
      );
      await execute(tx, `insert into routes (name, yard_id) select 'North', id from yards limit 1`);
      await execute(
        tx,
        `insert into route_segments select (select max(id) from routes), 1, (select min(id) from segments)`,
      );
    });
    expect(await undoNetworkImport({ id, by, now: at(2) })).toMatchObject({ removed: 2, kept: 1 });
    const { segments, nodes } = await everything();
    expect(segments).toHaveLength(1);
    expect(nodes).toHaveLength(2);
    expect(await sumSetupSegments(all)).toMatchObject({ segments: 0 });
  });
});

describe('changes by hand', () => {
  it('are audited, no longer assumed, and outlive a repeated import', async () => {
    await apply((await preview(first, 'one')).id);
    const [road] = await listSetupSegments({ ...all, find: 'quay' });
    if (!road) throw new Error('no road');
    expect(road.assumed).toContain('lanes');
    const input = {
      id: road.id,
      updatedAt: road.updatedAt.toISOString(),
      name: 'Quay',
      serviceClass: 'A',
      lanes: 4,
      surface: road.surface,
      exposure: 'shore',
      isSensitive: true,
    } as const;
    await changeSegment({ input, by, now: at(3) });
    await expect(changeSegment({ input, by, now: at(4) })).rejects.toMatchObject({ code: 'changed-meanwhile' });
    await apply((await preview(second, 'two')).id, 5);
    const rows = await selectRows<{ edited: string[]; assumed: string[] }>(
      `select service_class, lanes, exposure, is_sensitive, edited, assumed from segments where id = :id`,
      { id: road.id },
    );
    expect(rows[0]).toMatchObject({ service_class: 'A', lanes: 4, exposure: 'shore', is_sensitive: true });
    expect(rows[0]?.edited.sort()).toEqual(['exposure', 'lanes', 'serviceClass']);
    expect(rows[0]?.assumed).not.toContain('exposure');
    const audit = await selectRows(`select 1 from audit_log where action = 'setup.roads.change'`);
    expect(audit).toHaveLength(1);
  });

  it('the list filters by words, class and what is assumed, and a % sign is only a sign', async () => {
    await apply((await preview(first, 'one')).id);
    expect(await sumSetupSegments({ ...all, serviceClass: 'D' })).toMatchObject({ segments: 1 });
    expect(await sumSetupSegments({ ...all, assumed: 'name' })).toMatchObject({ segments: 1 });
    expect(await sumSetupSegments({ ...all, find: '%' })).toMatchObject({ segments: 0 });
  });
});
