import { selectRows, type Tx } from '../transaction';

export interface ForecastRecord {
  id: number;
  source: string;
  issuedAt: Date;
  receivedAt: Date;
  /** last hour it speaks of */
  untilAt: Date | null;
}

/** The newest forecast that had come in by `at`; null when none had. */
export async function findForecast({ at }: { at: Date }, tx?: Tx): Promise<ForecastRecord | null> {
  const rows = await selectRows<ForecastRecord>(
    `select f.id, f.source, f.issued_at as "issuedAt", f.received_at as "receivedAt",
            (select max(valid_at) from forecast_hours where forecast_id = f.id) as "untilAt"
       from forecasts f
      where f.issued_at <= :at and f.received_at <= :at
      order by f.issued_at desc, f.id desc limit 1`,
    { at },
    tx,
  );
  return rows[0] ?? null;
}
