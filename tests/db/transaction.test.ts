import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { recordAudit } from '@/db/commands/audit';
import { database } from '@/db/connection';
import { seedMinimal, type MinimalIds } from '@/db/seeds/minimal';
import { execute, inTransaction, selectRows } from '@/db/transaction';
import { Problem } from '@/lib/problem';
import { testDatabase, type TestDatabase } from '../setup/database';

let db: TestDatabase;
let ids: MinimalIds;
beforeAll(async () => {
  db = await testDatabase();
  ids = await seedMinimal({ now: new Date('2026-12-01T02:40:00Z') });
});
afterAll(() => db.close());

const yards = async () =>
  (await selectRows<{ name: string }>('select name from yards order by id')).map(({ name }) => name);

describe('a transaction', () => {
  it('stops a query that runs inside it without it, in plain SQL and through a model', async () => {
    await expect(inTransaction(() => selectRows('select 1'))).rejects.toThrow('pass tx on');
    await expect(inTransaction(() => database().models.Yard.findAll())).rejects.toThrow('pass tx on');
  });

  it('lets queries run outside while another line of work has one open', async () => {
    await inTransaction(async (tx) => {
      await execute(tx, `select pg_sleep(0.05)`);
    });
    expect(await yards()).toEqual(['Yard']);
  });

  it('keeps nothing of a command that fails half way', async () => {
    const failing = inTransaction(async (tx) => {
      await execute(tx, `update yards set name = 'Half done'`);
      await recordAudit(tx, { personId: ids.people.administrator, action: 'try', subjectKind: 'yard', subjectId: 1 });
      throw new Problem('not-found', { what: 'second half' });
    });
    await expect(failing).rejects.toThrow('There is no such second half.');
    expect(await yards()).toEqual(['Yard']);
    expect(await selectRows(`select 1 from audit_log where action = 'try'`)).toEqual([]);
  });

  it('turns the database’s refusals into words', async () => {
    const taken = inTransaction((tx) =>
      execute(
        tx,
        `insert into trucks (number, name, yard_id) select number, 'Twin', yard_id from trucks where id = :truckId`,
        { truckId: ids.truckId },
      ),
    );
    await expect(taken).rejects.toMatchObject({
      code: 'already-exists',
      fields: { number: 'Another truck has this number.' },
    });
    const changed = inTransaction(async (tx) => {
      await recordAudit(tx, { personId: null, action: 'try', subjectKind: 'yard', subjectId: 1 });
      await execute(tx, `update audit_log set action = 'other'`);
    });
    await expect(changed).rejects.toMatchObject({ code: 'never-changed' });
  });
});
