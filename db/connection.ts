import { AsyncLocalStorage } from 'node:async_hooks';
import pg from 'pg';
import { Sequelize, type Transaction } from 'sequelize';
import { env } from '@/lib/server/env';
import { initModels, type Models } from './models/all';

export interface Database {
  sequelize: Sequelize;
  models: Models;
}

/** The transaction that is open on this line of work: a guard, never a carrier. */
export const openTransaction = new AsyncLocalStorage<Transaction>();

// double precision, never numeric; dates as text 'YYYY-MM-DD', instants as Date
pg.types.setTypeParser(pg.types.builtins.DATE, (value) => value);

function connect(url: string): Database {
  const sequelize = new Sequelize(url, {
    dialect: 'postgres',
    dialectModule: pg,
    logging: false,
    define: { underscored: true, timestamps: false },
    pool: { max: 10, min: 0, idle: 10_000, acquire: 20_000 },
    // The database may be recovering from a crash: that takes seconds, and asking again is right.
    retry: { match: [/57P03/, /ECONNREFUSED/, /terminating connection/], max: 4, backoffBase: 250 },
    dialectOptions: { application_name: 'rimewright', statement_timeout: 60_000 },
  });
  sequelize.addHook('beforeQuery', (options) => {
    const open = openTransaction.getStore();
    if (open && options.transaction !== open) {
      throw new Error('A query ran inside an open transaction without it: pass tx on.');
    }
  });
  return { sequelize, models: initModels(sequelize) };
}

// The bundler makes one copy of a module per layer; a model class initialised in one copy would be
// uninitialised in the other, so the whole result hangs on globalThis.
const shared = globalThis as typeof globalThis & { rimewrightDatabase?: Database | undefined };

export function database(): Database {
  shared.rimewrightDatabase ??= connect(env().DATABASE_URL);
  return shared.rimewrightDatabase;
}

export async function closeDatabase(): Promise<void> {
  await shared.rimewrightDatabase?.sequelize.close();
  shared.rimewrightDatabase = undefined;
}
