import { QueryTypes, type Transaction } from 'sequelize';
import { database, openTransaction } from './connection';
import { translateDatabaseError } from './errors';

export type Tx = Transaction;

/** Runs `work` in one transaction. Queries inside it must be given `tx`; one that is not throws. */
export async function inTransaction<T>(work: (tx: Tx) => Promise<T>): Promise<T> {
  try {
    return await database().sequelize.transaction((tx) => openTransaction.run(tx, () => work(tx)));
  } catch (error) {
    throw translateDatabaseError(error);
  }
}

export type Bindings = Record<string, unknown>;

/** Rows of a select in plain SQL with named replacements (`:stormId`). */
export async function selectRows<Row extends object>(
  sql: string,
  replacements: Bindings = {},
  tx?: Tx,
): Promise<Row[]> {
  return database().sequelize.query<Row>(sql, {
    type: QueryTypes.SELECT,
    replacements,
    ...(tx ? { transaction: tx } : {}),
  });
}

/** Runs a statement in plain SQL with named replacements; always inside a transaction. */
export async function execute(tx: Tx, sql: string, replacements: Bindings = {}): Promise<void> {
  await database().sequelize.query(sql, { replacements, transaction: tx });
}
