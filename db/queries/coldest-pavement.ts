import { selectRows } from '../transaction';

export interface ColdestPavement {
  stationName: string;
  observedAt: Date;
  pavementTempC: number;
}

const freshForMs = 3 * 3_600_000;

/** The coldest of the stations' newest pavement temperatures, none older than three hours and none flagged. */
export async function findColdestPavement({ now }: { now: Date }): Promise<ColdestPavement | null> {
  const rows = await selectRows<ColdestPavement>(
    `select s.name as "stationName", r.observed_at as "observedAt", r.pavement_temp_c as "pavementTempC"
       from stations s
       join lateral (
         select observed_at, pavement_temp_c from readings
          where station_id = s.id and observed_at > :since and observed_at <= :now and pavement_temp_c is not null
            and not coalesce(jsonb_exists_any(flags, array['pavementTempC', 'pavement_temp_c']), false)
          order by observed_at desc limit 1) r on true
      where s.is_active
      order by r.pavement_temp_c limit 1`,
    { now, since: new Date(now.getTime() - freshForMs) },
  );
  return rows[0] ?? null;
}
