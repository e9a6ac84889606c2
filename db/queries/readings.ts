import { type ReadingQuantity } from '@/lib/readings/quantities';
import { selectRows } from '../transaction';

/** Where each quantity stands in the wide row. */
export const readingColumns: Readonly<Record<ReadingQuantity, string>> = {
  pavementTempC: 'pavement_temp_c',
  airTempC: 'air_temp_c',
  dewPointC: 'dew_point_c',
  relativeHumidity: 'relative_humidity',
  windSpeedMPerS: 'wind_speed_m_per_s',
  windGustMPerS: 'wind_gust_m_per_s',
  windDirectionDeg: 'wind_direction_deg',
  precipitationMm: 'precipitation_mm',
  subsurfaceTempC: 'subsurface_temp_c',
  freezingPointC: 'freezing_point_c',
  solarWPerM2: 'solar_w_per_m2',
  visibilityM: 'visibility_m',
  waterMm: 'water_mm',
  precipitationType: 'precipitation_type',
  surfaceStatus: 'surface_status',
};

export interface ReadingRecord {
  observedAt: Date;
  pavementTempC: number | null;
  airTempC: number | null;
  dewPointC: number | null;
  relativeHumidity: number | null;
  windSpeedMPerS: number | null;
  windGustMPerS: number | null;
  windDirectionDeg: number | null;
  precipitationMm: number | null;
  subsurfaceTempC: number | null;
  freezingPointC: number | null;
  solarWPerM2: number | null;
  visibilityM: number | null;
  waterMm: number | null;
  precipitationType: string | null;
  surfaceStatus: string | null;
  flags: Record<string, string[]> | null;
}

const columns = Object.entries(readingColumns)
  .map(([quantity, column]) => `${column} as "${quantity}"`)
  .join(', ');

/** The readings of a station in a half-open span, oldest first. */
export async function listReadings(given: {
  stationId: number;
  fromAt: Date;
  untilAt: Date;
}): Promise<ReadingRecord[]> {
  return selectRows<ReadingRecord>(
    `select observed_at as "observedAt", ${columns}, flags from readings
      where station_id = :stationId and observed_at >= :fromAt and observed_at < :untilAt order by observed_at`,
    given,
  );
}

export async function hasAnyReading({ stationId }: { stationId: number }): Promise<boolean> {
  const rows = await selectRows('select 1 from readings where station_id = :stationId limit 1', { stationId });
  return rows.length > 0;
}
