import { type Mapping } from '@/lib/readings/mapping';
import { hashStationKey } from '../station-key';
import { selectRows, type Tx } from '../transaction';

export interface StationRecord {
  id: number;
  name: string;
  zone: string;
  longitudeDeg: number;
  latitudeDeg: number;
  heightM: number;
  isActive: boolean;
}

/** A station with what it said last. The values are of its newest reading, whatever its age. */
export interface StationStatus extends StationRecord {
  observedAt: Date | null;
  pavementTempC: number | null;
  airTempC: number | null;
  dewPointC: number | null;
  windSpeedMPerS: number | null;
  surfaceStatus: string | null;
  /** flagged readings of the 24 h before its newest */
  flaggedCount: number;
  /** of the newest reading: quantity → checks it failed */
  flags: Record<string, string[]> | null;
  hasMapping: boolean;
}

const station = `
  s.id, s.name, s.zone, st_x(s.position) as "longitudeDeg", st_y(s.position) as "latitudeDeg",
  s.height_m as "heightM", s.is_active as "isActive"`;

export async function listStations({ now }: { now: Date }): Promise<StationStatus[]> {
  return selectRows<StationStatus>(
    `select ${station}, r.observed_at as "observedAt", r.pavement_temp_c as "pavementTempC",
            r.air_temp_c as "airTempC", r.dew_point_c as "dewPointC", r.wind_speed_m_per_s as "windSpeedMPerS",
            r.surface_status as "surfaceStatus", r.flags, coalesce(f.flagged, 0) as "flaggedCount",
            exists (select 1 from station_mappings m where m.station_id = s.id) as "hasMapping"
       from stations s
       left join lateral (select * from readings where station_id = s.id and observed_at <= :latestAt
                           order by observed_at desc limit 1) r on true
       left join lateral (select count(*)::int as flagged from readings
                           where station_id = s.id and flags is not null and observed_at <= r.observed_at
                             and observed_at > r.observed_at - interval '24 hours') f on true
      order by not s.is_active, s.name`,
    // A reading whose clock is ahead must not hide the true newest one for long.
    { latestAt: new Date(now.getTime() + 3_600_000) },
  );
}

export async function findStation({ id }: { id: number }, tx?: Tx): Promise<StationRecord | null> {
  const [row] = await selectRows<StationRecord>(`select ${station} from stations s where s.id = :id`, { id }, tx);
  return row ?? null;
}

export interface StationMappingRecord {
  mapping: Mapping;
  updatedAt: Date;
  updatedByName: string;
}

/** How a station's files are read, as it was saved last; null when nobody has said it yet. */
export async function findStationMapping({ stationId }: { stationId: number }): Promise<StationMappingRecord | null> {
  const [row] = await selectRows<StationMappingRecord>(
    `select m.mapping, m.updated_at as "updatedAt", p.name as "updatedByName"
       from station_mappings m join people p on p.id = m.updated_by where m.station_id = :stationId`,
    { stationId },
  );
  return row ?? null;
}

export interface StationKeyRecord {
  id: number;
  stationId: number;
  hint: string;
  issuedAt: Date;
  issuedByName: string;
  revokedAt: Date | null;
  lastUsedAt: Date | null;
}

export async function listStationKeys({ stationId }: { stationId: number }): Promise<StationKeyRecord[]> {
  return selectRows<StationKeyRecord>(
    `select k.id, k.station_id as "stationId", k.hint, k.issued_at as "issuedAt", p.name as "issuedByName",
            k.revoked_at as "revokedAt",
            (select max(finished_at) from uploads u where u.station_key_id = k.id) as "lastUsedAt"
       from station_keys k join people p on p.id = k.issued_by
      where k.station_id = :stationId
      order by k.revoked_at is not null, k.issued_at desc`,
    { stationId },
  );
}

/** The station that a key in use belongs to; null when there is none or it was revoked. */
export async function findStationByKey({ key }: { key: string }): Promise<{ keyId: number; stationId: number } | null> {
  const [row] = await selectRows<{ keyId: number; stationId: number }>(
    `select id as "keyId", station_id as "stationId" from station_keys
      where key_hash = :keyHash and revoked_at is null`,
    { keyHash: hashStationKey(key) },
  );
  return row ?? null;
}
