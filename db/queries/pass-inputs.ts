import { type Station } from '@/lib/pavement/station-series';
import { type Material } from '@/lib/treatment/materials';
import { type PlannedSegment } from '@/lib/treatment/plan-pass';
import { type StormTreatment } from '@/lib/treatment/project-storm';
import { selectRows, type Tx } from '../transaction';

export interface PassSegment extends PlannedSegment {
  readonly name: string;
  readonly lanes: number;
  readonly lengthM: number;
  readonly areaM2: number;
}

type SegmentRecord = Omit<PassSegment, 'spreaderMaxGPerM2'> & {
  hasTruck: boolean;
  maxRateGPerM2: number | null;
  maxLiquidRateMlPerM2: number | null;
  tankL: number | null;
};

/** 23 % brine; what a spreader's litres are taken as until a calibration of its own says more. */
const LIQUID_KG_PER_L = 1.18;

function spreaderMax(row: SegmentRecord): PassSegment['spreaderMaxGPerM2'] {
  if (!row.hasTruck) return {};
  const hasTank = (row.tankL ?? 0) > 0;
  const liquid = hasTank ? (row.maxLiquidRateMlPerM2 ?? 0) * LIQUID_KG_PER_L : 0;
  return { solid: row.maxRateGPerM2, prewet: hasTank ? row.maxRateGPerM2 : 0, liquid };
}

/**
 * Roads in use, by id, each at its middle, with what the least able truck of its standing routes can dose. A road on no
 * route has no such limit.
 */
export async function listPassSegments(tx?: Tx): Promise<PassSegment[]> {
  const rows = await selectRows<SegmentRecord>(
    `select g.id, g.name, g.lanes, g.length_m as "lengthM", g.length_m * g.width_m as "areaM2",
            ST_Y(middle.point) as "latDeg", ST_X(middle.point) as "lonDeg", g.height_m as "heightM", g.exposure,
            g.is_bridge as "isBridge", g.is_tunnel as "isTunnel", g.surface, g.service_class as "serviceClass",
            g.is_sensitive as "isSensitive", coalesce(able.trucks, 0) > 0 as "hasTruck",
            able.max_rate as "maxRateGPerM2", able.max_liquid as "maxLiquidRateMlPerM2", able.tank as "tankL"
       from segments g
       cross join lateral (select ST_LineInterpolatePoint(g.geometry, 0.5) as point) middle
       left join (
         select rs.segment_id, count(*)::int as trucks, min(s.max_rate_g_per_m2) as max_rate,
                min(coalesce(s.max_liquid_rate_ml_per_m2, 0)) as max_liquid, min(s.tank_l) as tank
           from route_segments rs
           join routes r on r.id = rs.route_id and r.is_active
           join lateral (select * from spreaders where truck_id = r.truck_id order by id desc limit 1) s on true
          group by rs.segment_id) able on able.segment_id = g.id
      where g.retired_at is null
      order by g.id`,
    {},
    tx,
  );
  return rows.map((row) => ({ ...row, spreaderMaxGPerM2: spreaderMax(row) }));
}

export interface PassStation extends Station {
  readonly name: string;
}

/** Stations in use with their readings up to `nowAt` and the hours of one forecast, times in ms since 1970. */
export async function listPassStations(
  of: { fromAt: Date; nowAt: Date; forecastId: number },
  tx?: Tx,
): Promise<PassStation[]> {
  const stations = await selectRows<Omit<PassStation, 'readings' | 'forecast'>>(
    `select id, name, ST_Y(position) as "latDeg", ST_X(position) as "lonDeg", height_m as "heightM"
       from stations where is_active order by id`,
    {},
    tx,
  );
  const readings = await selectRows<Station['readings'][number] & { stationId: number }>(
    `select station_id as "stationId", extract(epoch from observed_at)::float8 * 1000 as at,
            pavement_temp_c as "pavementTempC", precipitation_mm as "precipitationMm",
            precipitation_type as "precipitationType", water_mm as "waterMm", wind_speed_m_per_s as "windSpeedMPerS",
            coalesce(jsonb_exists_any(flags, array['pavementTempC', 'pavement_temp_c']), false) as "isFlagged"
       from readings where observed_at between :fromAt and :nowAt order by observed_at`,
    of,
    tx,
  );
  const hours = await selectRows<Station['forecast'][number] & { stationId: number }>(
    `select station_id as "stationId", extract(epoch from valid_at)::float8 * 1000 as "validAt",
            pavement_temp_c as "pavementTempC", pavement_error_c as "pavementErrorC",
            precipitation_mm as "precipitationMm", precipitation_type as "precipitationType",
            wind_speed_m_per_s as "windSpeedMPerS"
       from forecast_hours where forecast_id = :forecastId order by valid_at`,
    of,
    tx,
  );
  return stations.map((station) => ({
    ...station,
    readings: readings.filter(({ stationId }) => stationId === station.id),
    forecast: hours.filter(({ stationId }) => stationId === station.id),
  }));
}

/** Materials in use, as the treatment engine takes them. */
export async function listPassMaterials(tx?: Tx): Promise<Material[]> {
  return selectRows<Material>(
    `select id::text as id, name, form, composition, water_mass_fraction as "waterMassFraction",
            density_kg_per_m3 as "densityKgPerM3", practical_minimum_c as "practicalMinimumC",
            cost_cents_per_tonne as "costCentsPerTonne"
       from materials where is_active order by id`,
    {},
    tx,
  );
}

interface TreatmentRow extends Omit<StormTreatment, 'material'> {
  materialId: string | null;
}

/** Materials of a treatment may be out of use by now: all are looked at. */
async function withMaterials(rows: readonly TreatmentRow[], tx?: Tx): Promise<StormTreatment[]> {
  const materials = await selectRows<Material>(
    `select id::text as id, name, form, composition, water_mass_fraction as "waterMassFraction",
            density_kg_per_m3 as "densityKgPerM3", practical_minimum_c as "practicalMinimumC",
            cost_cents_per_tonne as "costCentsPerTonne" from materials`,
    {},
    tx,
  );
  const byId = new Map(materials.map((material) => [material.id, material]));
  return rows.map(({ materialId, ...row }) => ({ ...row, material: byId.get(materialId ?? '') ?? null }));
}

/** What drivers had logged by `nowAt`, as done to the film; entries that an amendment then known replaces are left out. */
export async function listLoggedTreatments(of: { fromAt: Date; nowAt: Date }, tx?: Tx): Promise<StormTreatment[]> {
  const rows = await selectRows<TreatmentRow>(
    `select e.segment_id as "segmentId", extract(epoch from e.spread_at)::float8 * 1000 as at,
            (e.is_ploughed or e.outcome = 'ploughed') as "isPloughed", e.material_id::text as "materialId",
            case e.outcome when 'spread' then e.rate_g_per_m2 else 0 end as "rateGPerM2"
       from spread_entries e
      where e.outcome <> 'skipped' and e.spread_at between :fromAt and :nowAt and e.recorded_at <= :nowAt
        and not exists (select 1 from spread_entries a where a.amends_id = e.id and a.recorded_at <= :nowAt)
      order by e.spread_at`,
    of,
    tx,
  );
  return withMaterials(rows, tx);
}

/** What published plans of the storm ask for in passes that are still to come, before `untilAt`. */
export async function listPlannedTreatments(
  of: { stormId: number; nowAt: Date; untilAt: Date },
  tx?: Tx,
): Promise<StormTreatment[]> {
  const rows = await selectRows<TreatmentRow>(
    `select t.segment_id as "segmentId", extract(epoch from s.starts_at)::float8 * 1000 as at,
            (t.action = 'plough' or coalesce((t.why->>'isPloughed')::boolean, false)) as "isPloughed",
            t.material_id::text as "materialId", coalesce(t.rate_g_per_m2, 0) as "rateGPerM2"
       from storm_passes s
       join lateral (
         select id from plans
          where storm_id = s.storm_id and pass_number = s.number and published_at <= :nowAt
          order by version desc limit 1) p on true
       join plan_treatments t on t.plan_id = p.id and t.action not in ('nothing', 'undecided')
      where s.storm_id = :stormId and s.starts_at > :nowAt and s.starts_at < :untilAt
      order by s.starts_at`,
    of,
    tx,
  );
  return withMaterials(rows, tx);
}
