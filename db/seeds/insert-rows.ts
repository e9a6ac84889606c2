import { execute, selectRows, type Tx } from '../transaction';

const snake = (name: string) => name.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);

interface Rows {
  table: string;
  rows: readonly Readonly<Record<string, unknown>>[];
}

/** One statement for many rows: they travel as one JSON text, geometry as WKT with its SRID. */
function insertSql({ table, rows }: Rows): { sql: string; json: string } {
  const names = Object.keys(rows[0] ?? {});
  const columns = names.map(snake).join(', ');
  const json = JSON.stringify(
    rows.map((row) => Object.fromEntries(Object.entries(row).map(([name, value]) => [snake(name), value]))),
  );
  return {
    sql: `insert into ${table} (${columns}) select ${columns} from jsonb_populate_recordset(null::${table}, :json)`,
    json,
  };
}

/** Adds rows in bulk; all must name the same columns as the first, in camel case. */
export async function insertRows(tx: Tx, into: Rows): Promise<void> {
  if (into.rows.length === 0) return;
  const { sql, json } = insertSql(into);
  await execute(tx, sql, { json });
}

/** The same, and the ids that the database gave, by a column that tells the rows apart. */
export async function insertKeyed(tx: Tx, into: Rows & { key: string }): Promise<Map<string, number>> {
  if (into.rows.length === 0) return new Map();
  const { sql, json } = insertSql(into);
  const made = await selectRows<{ id: number; key: string }>(
    `${sql} returning id, ${snake(into.key)}::text as key`,
    { json },
    tx,
  );
  return new Map(made.map(({ id, key }) => [key, id]));
}

export function idOf(ids: ReadonlyMap<string, number>, key: string): number {
  const id = ids.get(key);
  if (id === undefined) throw new RangeError(`nothing was added under the name ${key}`);
  return id;
}
