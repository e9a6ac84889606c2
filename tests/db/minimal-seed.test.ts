import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { appendDemoWeather } from '@/db/commands/append-demo-weather';
import { signIn } from '@/db/commands/sign-in';
import { type MinimalIds, seedMinimal } from '@/db/seeds/minimal';
import { selectRows } from '@/db/transaction';
import { roles } from '@/lib/permissions';
import { testDatabase, type TestDatabase } from '../setup/database';

const now = new Date('2026-12-08T02:46:10Z');
let database: TestDatabase;
let ids: MinimalIds;

beforeAll(async () => {
  database = await testDatabase();
  ids = await seedMinimal({ now, password: 'only in this test' });
});
afterAll(() => database.close());

describe('the minimal seed', () => {
  it('is a yard, four segments, a truck and one person of each role', async () => {
    const [row] = await selectRows<object>(
      `select (select count(*)::int from yards) as yards, (select count(*)::int from segments) as segments,
              (select count(*)::int from nodes) as nodes, (select count(*)::int from trucks) as trucks,
              (select count(*)::int from people) as people, (select count(*)::int from policies) as policies`,
    );
    expect(row).toEqual({ yards: 1, segments: 4, nodes: 4, trucks: 1, people: roles.length, policies: 1 });
    expect([...ids.segments.keys()].sort()).toEqual(['east', 'north', 'south', 'west']);
  });

  it('lets the test sign in with the password it gave', async () => {
    const who = await signIn({ email: 'driver@minimal.example', password: 'only in this test', address: '::1', now });
    expect(who?.id).toBe(ids.people.driver);
  });

  it('is no demo: no invented weather comes to it', async () => {
    expect(await appendDemoWeather({ now })).toEqual({ readings: 0, forecasts: 0 });
  });
});
