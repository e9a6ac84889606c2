import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { seedMinimal } from '@/db/seeds/minimal';
import { execute, inTransaction, selectRows } from '@/db/transaction';
import { testDatabase, type TestDatabase } from '../setup/database';

/*
 *  pass 1      pass 2        pass 3
 *  00:00       03:00         06:00
 *    v1          v3            v2    published 23:00, 01:00 and, early, 00:30
 */
const at = (time: string) => new Date(`2026-12-01T${time}:00Z`);
let database: TestDatabase;

beforeAll(async () => {
  database = await testDatabase();
  const ids = await seedMinimal({ now: at('00:00') });
  await inTransaction((tx) =>
    execute(
      tx,
      `insert into storms (number, name, from_at, until_at, opened_at, opened_by)
         values (1, 'Night', :from, :until, :from, :by);
       insert into storm_passes (storm_id, number, starts_at)
         values (1, 1, :pass1), (1, 2, :pass2), (1, 3, :pass3);
       insert into plans (storm_id, pass_number, version, policy_version, worked_out_at, worked_out_by, published_at, published_by, inputs, summary)
         values (1, 1, 1, 1, :from, :by, :from, :by, '{}', '{}'),
                (1, 3, 2, 1, :from, :by, :early, :by, '{}', '{}'),
                (1, 2, 3, 1, :from, :by, :later, :by, '{}', '{}'),
                (1, 2, 4, 1, :from, :by, null, null, '{}', '{}')`,
      {
        from: new Date('2026-11-30T23:00:00Z'),
        until: at('09:00'),
        pass1: at('00:00'),
        pass2: at('03:00'),
        pass3: at('06:00'),
        early: at('00:30'),
        later: at('01:00'),
        by: ids.people.dispatcher,
      },
    ),
  );
});
afterAll(() => database.close());

async function versionAt(time: Date): Promise<number | null> {
  const rows = await selectRows<{ version: number }>('select version from plans where id = plan_in_force(1, :time)', {
    time,
  });
  return rows[0]?.version ?? null;
}

describe('the plan in force', () => {
  it('is none before anything is published, and the first pass from then until its time', async () => {
    expect(await versionAt(new Date('2026-11-30T22:59:00Z'))).toBeNull();
    expect(await versionAt(new Date('2026-11-30T23:05:00Z'))).toBe(1);
  });

  it('is not taken over by a later pass that was published early', async () => {
    expect(await versionAt(at('00:45'))).toBe(1);
    expect(await versionAt(at('02:00'))).toBe(1);
  });

  it('changes when the trucks of the next pass load, and never to a draft', async () => {
    expect(await versionAt(at('02:20'))).toBe(3);
    expect(await versionAt(at('05:00'))).toBe(3);
    expect(await versionAt(at('05:20'))).toBe(2);
  });
});
