import { closeDatabase, database } from '@/db/connection';
import { createMigrator } from '@/db/migrate';
import { migrations } from '@/db/migrations/all';

const direction = process.argv[2] ?? 'up';
const migrator = createMigrator(database().sequelize, migrations);
const ran = direction === 'down' ? await migrator.down({ to: 0 }) : await migrator.up();
console.log(ran.length === 0 ? 'The database is up to date.' : `${ran.length} migrations run ${direction}.`);
await closeDatabase();
