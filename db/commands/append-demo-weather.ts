import { stations } from '@/lib/skerrow/people';
import { findAgency } from '../queries/agency';
import { addDemoForecast, addDemoReadings, demoForecastSource, issueTimes } from '../seeds/demo-weather-rows';
import { inTransaction, selectRows, type Tx } from '../transaction';

interface LastTimes {
  observedAt: Date | null;
  issuedAt: Date | null;
}

/** A demo that was switched off for longer than this resumes with a gap, as a station would. */
const longestCatchUpMs = 14 * 86_400_000;
const hourMs = 3_600_000;

async function lastTimes(tx: Tx, stationIds: readonly number[]): Promise<LastTimes> {
  const [row] = await selectRows<LastTimes>(
    `select (select min(last_at) from (select (select max(observed_at) from readings r where r.station_id = s.id) as last_at
                                         from stations s where s.id in (:stationIds)) each_station) as "observedAt",
            (select max(issued_at) from forecasts where source = :source) as "issuedAt"`,
    { stationIds, source: demoForecastSource },
    tx,
  );
  return row ?? { observedAt: null, issuedAt: null };
}

async function demoStationIds(tx: Tx): Promise<ReadonlyMap<string, number>> {
  const rows = await selectRows<{ id: number; name: string }>(
    'select id, name from stations where name in (:names)',
    { names: stations.map(({ name }) => name) },
    tx,
  );
  return new Map(rows.map(({ id, name }) => [name, id]));
}

/**
 * When the agency is the demo: the readings since the last one, up to now, and the forecasts due since the last one,
 * from the demo's own weather. Safe to run twice, and side by side: what is there already stays.
 */
export async function appendDemoWeather({ now }: { now: Date }): Promise<{ readings: number; forecasts: number }> {
  const { isDemo, demoAnchorAt: anchorAt } = await findAgency();
  if (!isDemo || !anchorAt) return { readings: 0, forecasts: 0 };
  return inTransaction(async (tx) => {
    // Two workers must not both issue the forecast of an hour.
    await selectRows(`select pg_advisory_xact_lock(hashtext('demo-weather'))`, {}, tx);
    const stationIds = await demoStationIds(tx);
    if (stationIds.size === 0) return { readings: 0, forecasts: 0 };
    const last = await lastTimes(tx, [...stationIds.values()]);
    const earliestMs = now.getTime() - longestCatchUpMs;
    const since = (at: Date | null) => new Date(Math.max(at?.getTime() ?? earliestMs, earliestMs));
    const readings = await addDemoReadings(tx, stationIds, { fromAt: since(last.observedAt), untilAt: now, anchorAt });
    let forecasts = 0;
    // Only what was issued in the last two days still says something about the hours ahead.
    const fromAt = new Date(Math.max(since(last.issuedAt).getTime(), now.getTime() - 48 * hourMs));
    for (const issueAt of issueTimes({ fromAt, untilAt: now })) {
      if (await addDemoForecast(tx, stationIds, { issueAt, anchorAt, receivedAt: now })) forecasts += 1;
    }
    return { readings, forecasts };
  });
}
