import { type Sequelize, type Transaction } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';

interface MigrationContext {
  sql: (text: string) => Promise<void>;
}

/** One step of the schema; each runs in a transaction of its own. */
export interface Migration {
  up: (context: MigrationContext) => Promise<void>;
  down: (context: MigrationContext) => Promise<void>;
}

interface NamedMigration extends Migration {
  name: string;
}

export function createMigrator(sequelize: Sequelize, migrations: readonly NamedMigration[]) {
  const inOwnTransaction = (run: (context: MigrationContext) => Promise<void>) =>
    sequelize.transaction((transaction: Transaction) =>
      run({
        sql: async (text) => {
          await sequelize.query(text, { transaction, raw: true });
        },
      }),
    );
  return new Umzug({
    migrations: migrations.map(({ name, up, down }) => ({
      name,
      up: () => inOwnTransaction(up),
      down: () => inOwnTransaction(down),
    })),
    storage: new SequelizeStorage({ sequelize, tableName: 'migrations' }),
    logger: undefined,
  });
}
