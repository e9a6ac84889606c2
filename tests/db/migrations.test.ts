import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { database } from '@/db/connection';
import { createMigrator } from '@/db/migrate';
import { migrations } from '@/db/migrations/all';
import { testDatabase, type TestDatabase } from '../setup/database';

let own: TestDatabase;
beforeAll(async () => {
  own = await testDatabase();
});
afterAll(() => own.close());

async function tables(): Promise<string[]> {
  const [rows] = await database().sequelize.query(
    `select c.relname as name from pg_class c join pg_namespace n on n.oid = c.relnamespace
     where n.nspname = 'public' and c.relkind in ('r', 'p') and not c.relispartition
       and not exists (select 1 from pg_depend d where d.objid = c.oid and d.deptype = 'e')
     order by 1`,
  );
  return (rows as { name: string }[]).map(({ name }) => name);
}

describe('migrations', () => {
  it('have all run in the copy of a test file', async () => {
    expect(await tables()).toContain('people');
    expect(await createMigrator(database().sequelize, migrations).pending()).toEqual([]);
  });
  it('go down to nothing and up to the same tables again', async () => {
    const before = await tables();
    const migrator = createMigrator(database().sequelize, migrations);
    await migrator.down({ to: 0 });
    expect(await tables()).toEqual(['migrations']);
    await migrator.up();
    expect(await tables()).toEqual(before);
  });
});
