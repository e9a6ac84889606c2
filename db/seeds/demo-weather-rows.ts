import { forecastIssuedAt } from '@/lib/skerrow/forecast';
import { stations } from '@/lib/skerrow/people';
import { readingsBetween } from '@/lib/skerrow/weather';
import { execute, selectRows, type Tx } from '../transaction';
import { insertRows } from './insert-rows';

export const demoForecastSource = 'Skerrow weather office';

/** A station that someone has renamed since is no longer one of the demo's, and gets no more of its weather. */
const stationAt = (stationIds: ReadonlyMap<string, number>, stationIndex: number) =>
  stationIds.get(stations[stationIndex]?.name ?? '');

interface Span {
  fromAt: Date;
  untilAt: Date;
  anchorAt: Date;
}

function monthsOf({ fromAt, untilAt }: Span): Date[] {
  const months: Date[] = [];
  const month = new Date(Date.UTC(fromAt.getUTCFullYear(), fromAt.getUTCMonth(), 1));
  while (month <= untilAt) {
    months.push(new Date(month));
    month.setUTCMonth(month.getUTCMonth() + 1);
  }
  return months;
}

/** The readings of a span, from the demo's weather; those already there stay as they are. */
export async function addDemoReadings(tx: Tx, stationIds: ReadonlyMap<string, number>, span: Span): Promise<number> {
  const readings = readingsBetween(span);
  if (readings.length === 0) return 0;
  for (const month of monthsOf(span)) await execute(tx, 'select ensure_readings_partition(:month)', { month });
  const rows = readings
    .filter(({ stationIndex }) => stationAt(stationIds, stationIndex) !== undefined)
    .map(({ stationIndex, ...reading }) => ({
      station_id: stationAt(stationIds, stationIndex),
      observed_at: reading.observedAt,
      pavement_temp_c: reading.pavementTempC,
      air_temp_c: reading.airTempC,
      dew_point_c: reading.dewPointC,
      relative_humidity: reading.relativeHumidity,
      wind_speed_m_per_s: reading.windSpeedMPerS,
      wind_gust_m_per_s: reading.windGustMPerS,
      wind_direction_deg: reading.windDirectionDeg,
      precipitation_mm: reading.precipitationMm,
      precipitation_type: reading.precipitationType,
      subsurface_temp_c: reading.subsurfaceTempC,
      solar_w_per_m2: reading.solarWPerM2,
      visibility_m: reading.visibilityM,
      water_mm: reading.waterMm,
      surface_status: reading.surfaceStatus,
    }));
  await execute(
    tx,
    `insert into readings select * from jsonb_populate_recordset(null::readings, :json)
     on conflict (station_id, observed_at) do nothing`,
    { json: JSON.stringify(rows) },
  );
  return rows.length;
}

/** One forecast as issued; a second one of the same hour is not made. Answers its id, or null. */
export async function addDemoForecast(
  tx: Tx,
  stationIds: ReadonlyMap<string, number>,
  { issueAt, anchorAt, receivedAt }: { issueAt: Date; anchorAt: Date; receivedAt: Date },
): Promise<number | null> {
  const [forecast] = await selectRows<{ id: number }>(
    `insert into forecasts (source, issued_at, received_at)
     select :source, :issueAt, :receivedAt
      where not exists (select 1 from forecasts where source = :source and issued_at = :issueAt)
     returning id`,
    { source: demoForecastSource, issueAt, receivedAt },
    tx,
  );
  if (!forecast) return null;
  await insertRows(tx, {
    table: 'forecast_hours',
    rows: forecastIssuedAt(issueAt, anchorAt)
      .filter(({ stationIndex }) => stationAt(stationIds, stationIndex) !== undefined)
      .map(({ stationIndex, ...hour }) => ({
        forecastId: forecast.id,
        stationId: stationAt(stationIds, stationIndex),
        validAt: hour.validAt,
        pavementTempC: hour.pavementTempC,
        pavementErrorC: hour.pavementErrorC,
        airTempC: hour.airTempC,
        dewPointC: hour.dewPointC,
        windSpeedMPerS: hour.windSpeedMPerS,
        precipitationMm: hour.precipitationMm,
        precipitationType: hour.precipitationType,
      })),
  });
  return forecast.id;
}

const hourMs = 3_600_000;
export const forecastEveryMs = 3 * hourMs;

/** The issue times (every third whole hour UTC) after one time, up to and including another. */
export function issueTimes({ fromAt, untilAt }: { fromAt: Date; untilAt: Date }): Date[] {
  const times: Date[] = [];
  let nextMs = (Math.floor(fromAt.getTime() / forecastEveryMs) + 1) * forecastEveryMs;
  for (; nextMs <= untilAt.getTime(); nextMs += forecastEveryMs) times.push(new Date(nextMs));
  return times;
}
