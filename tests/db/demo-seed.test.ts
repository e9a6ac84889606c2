import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { appendDemoWeather } from '@/db/commands/append-demo-weather';
import { passwordMatches } from '@/db/passwords';
import { anchorOf, demoPassword, demoSignIns, isEmptyDatabase, seedDemo } from '@/db/seeds/demo';
import { selectRows } from '@/db/transaction';
import { roles } from '@/lib/permissions';
import { testDatabase, type TestDatabase } from '../setup/database';

const now = new Date('2026-12-08T02:46:10Z');
const hour = 3_600_000;
let database: TestDatabase;

async function count(sql: string): Promise<number> {
  const [row] = await selectRows<{ n: number }>(`select count(*)::int as n from ${sql}`);
  return row?.n ?? -1;
}

beforeAll(async () => {
  database = await testDatabase();
  expect(await isEmptyDatabase()).toBe(true);
  await seedDemo({ now });
}, 60_000);
afterAll(() => database.close());

describe('the demo seed', () => {
  it('is anchored to the last ten-minute mark and is no longer empty', async () => {
    expect(anchorOf(now).toISOString()).toBe('2026-12-08T02:40:00.000Z');
    expect(await isEmptyDatabase()).toBe(false);
    const agencies = await selectRows<object>('select name, is_demo as "isDemo", demo_anchor_at as at from agency');
    expect(agencies).toEqual([{ name: 'Isle of Skerrow', isDemo: true, at: anchorOf(now) }]);
  });

  it('has people of every role, all with the one password, kept as argon2id', async () => {
    const people = await selectRows<{ role: string; hash: string }>('select role, password_hash as hash from people');
    expect(new Set(people.map(({ role }) => role))).toEqual(new Set(roles));
    expect(people.length).toBe(demoSignIns.length);
    expect(people.every(({ hash }) => hash.startsWith('$argon2id$'))).toBe(true);
    expect(await passwordMatches(people[0]?.hash ?? '', demoPassword)).toBe(true);
  });

  it('has 3 yards, 6 stations, 8 trucks each with a spreader and a route, and 6 materials', async () => {
    expect(await count('yards')).toBe(3);
    expect(await count('stations')).toBe(6);
    expect(await count('trucks t join spreaders s on s.truck_id = t.id join routes r on r.truck_id = t.id')).toBe(8);
    expect(await count('materials')).toBe(6);
  });

  it('has some 340 segments as long as their geometry, each on one route', async () => {
    const segments = await count('segments');
    expect(segments).toBeGreaterThanOrEqual(325);
    expect(segments).toBeLessThanOrEqual(355);
    expect(await count('route_segments')).toBe(segments);
    expect(await count('segments where abs(st_length(geometry::geography) / length_m - 1) > 0.006')).toBe(0);
    expect(
      await count(`segments s join nodes a on a.id = s.from_node_id join nodes b on b.id = s.to_node_id
        where not st_equals(a.position, st_startpoint(s.geometry)) or not st_equals(b.position, st_endpoint(s.geometry))`),
    ).toBe(0);
  });

  it('has a coast, rivers, a lake, contours, four towns and names of waters, all valid', async () => {
    const kinds = await selectRows<{ kind: string }>('select distinct kind from base_features order by kind');
    expect(kinds.map(({ kind }) => kind)).toEqual(['coast', 'contour', 'lake', 'river', 'town', 'water-name']);
    expect(await count(`base_features where kind = 'town'`)).toBe(4);
    expect(await count('base_features where not st_isvalid(geometry)')).toBe(0);
  });

  it('has two weeks of readings of every station, in their months, the last at the anchor', async () => {
    expect(await count('readings')).toBe(14 * 144 * 6);
    const [last] = await selectRows<{ at: Date }>('select max(observed_at) as at from readings');
    expect(last?.at).toEqual(anchorOf(now));
    expect(await count('readings where dew_point_c > air_temp_c')).toBe(0);
  });

  it('has forecasts of 36 hours as issued every three hours over both storms, the newest under three hours old', async () => {
    const issued = await selectRows<{ at: Date; hours: number }>(
      `select issued_at as at, (select count(*)::int from forecast_hours h where h.forecast_id = f.id) as hours
         from forecasts f order by issued_at desc`,
    );
    expect(issued.length).toBeGreaterThanOrEqual(12);
    expect(issued.every(({ hours }) => hours === 36 * 6)).toBe(true);
    expect(anchorOf(now).getTime() - (issued[0]?.at.getTime() ?? 0)).toBeLessThan(3 * hour);
  });

  it('has one storm closed with five published plans and one open with three and a draft, each for every segment', async () => {
    const storms = await selectRows<{ number: number; isOpen: boolean; passes: number; published: number }>(
      `select number, closed_at is null as "isOpen",
              (select count(*)::int from storm_passes p where p.storm_id = s.id) as passes,
              (select count(*)::int from plans p where p.storm_id = s.id and published_at is not null) as published
         from storms s order by number`,
    );
    expect(storms).toEqual([
      { number: 6, isOpen: false, passes: 5, published: 5 },
      { number: 7, isOpen: true, passes: 5, published: 3 },
    ]);
    expect(await count('plans where published_at is null')).toBe(1);
    expect(await count('plan_treatments')).toBe(9 * (await count('segments')));
    expect(await count('plans where published_at < worked_out_at')).toBe(0);
  });

  it('has trucks out and trucks back, and nothing that lies after the anchor', async () => {
    const out = await count('runs where finished_at is null');
    expect(out).toBeGreaterThan(1);
    expect(out).toBeLessThan(8);
    const at = `'${anchorOf(now).toISOString()}'`;
    expect(await count(`spread_entries where recorded_at > ${at} or spread_at > recorded_at`)).toBe(0);
    expect(await count(`runs where finished_at > ${at} or started_at > ${at}`)).toBe(0);
    expect(await count(`loads where loaded_at > ${at}`)).toBe(0);
    expect(
      await count(`runs a join runs b on a.truck_id = b.truck_id and a.id <> b.id
        and b.started_at >= a.started_at and b.started_at < coalesce(a.finished_at, 'infinity')`),
    ).toBe(0);
  });

  it('holds each entry to the plan that was published for its storm and road before it was spread', async () => {
    expect(
      await count(`spread_entries e join runs r on r.id = e.run_id left join plans p on p.id = e.plan_id
        left join plan_treatments t on t.plan_id = p.id and t.segment_id = e.segment_id
        where p.storm_id is distinct from r.storm_id or p.published_at > e.spread_at
           or t.rate_g_per_m2 is distinct from e.recommended_rate_g_per_m2
           or t.material_id is distinct from e.recommended_material_id`),
    ).toBe(0);
  });

  it('shows one spreader giving about 22 % over the plan, and the others near it', async () => {
    const rows = await selectRows<{ truck: number; ratio: number }>(
      `select t.number as truck, sum(e.rate_g_per_m2 * e.area_m2) / sum(e.recommended_rate_g_per_m2 * e.area_m2) as ratio
         from spread_entries e join runs r on r.id = e.run_id join trucks t on t.id = r.truck_id
         join storms s on s.id = r.storm_id where s.number = 6 and e.outcome = 'spread' group by t.number order by 1`,
    );
    for (const { truck, ratio } of rows) {
      expect(ratio, `truck ${truck}`).toBeGreaterThan(truck === 4 ? 1.17 : 0.94);
      expect(ratio, `truck ${truck}`).toBeLessThan(truck === 4 ? 1.27 : 1.06);
    }
    expect(rows.length).toBe(8);
  });

  it('has an audit row for each thing done', async () => {
    for (const [action, table] of [
      ['run.log', 'spread_entries'],
      ['run.start', 'runs'],
      ['load.record', 'loads'],
      ['plans.publish', 'plans where published_at is not null'],
      ['storms.open', 'storms'],
    ] as const) {
      expect(await count(`audit_log where action = '${action}'`), action).toBe(await count(table));
    }
  });
});

describe('the weather that goes on after the demo was made', () => {
  it('brings the readings since the last and the forecasts due, and nothing the second time', async () => {
    const later = new Date(anchorOf(now).getTime() + 65 * 60_000);
    const added = await appendDemoWeather({ now: later });
    expect(added).toEqual({ readings: 6 * 6, forecasts: 1 });
    expect(await appendDemoWeather({ now: later })).toEqual({ readings: 0, forecasts: 0 });
    const [last] = await selectRows<{ at: Date }>('select max(observed_at) as at from readings');
    expect(last?.at.toISOString()).toBe('2026-12-08T03:40:00.000Z');
  });

  it('comes once when two workers ask at the same time, over the end of a month too', async () => {
    const later = new Date('2027-01-01T00:20:00Z');
    await Promise.all([appendDemoWeather({ now: later }), appendDemoWeather({ now: later })]);
    expect(await count(`(select 1 from forecasts group by source, issued_at having count(*) > 1) twice`)).toBe(0);
    expect(await count(`readings where observed_at >= '2027-01-01'`)).toBe(3 * 6);
  });
});
