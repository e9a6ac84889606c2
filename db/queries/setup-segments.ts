import { type SegmentFilter } from '@/lib/contracts/network';
import { selectRows } from '../transaction';

export const SEGMENTS_A_PAGE = 50;

export interface SetupSegment {
  id: number;
  name: string;
  roadClass: string;
  serviceClass: 'A' | 'B' | 'C' | 'D';
  lanes: number;
  widthM: number;
  surface: 'asphalt' | 'concrete' | 'open-graded' | 'gravel' | 'paving';
  exposure: 'open' | 'sheltered' | 'shaded' | 'ridge' | 'shore';
  speedKmPerH: number;
  isOneWay: boolean;
  isBridge: boolean;
  isSensitive: boolean;
  lengthM: number;
  assumed: string[];
  edited: string[];
  source: string | null;
  updatedAt: Date;
}

const where = `
  s.retired_at is null
  and (:find = '' or s.name ilike :pattern)
  and (:serviceClass = '' or s.service_class = :serviceClass)
  and (:assumed = '' or :assumed = any(s.assumed))`;

const bindings = ({ find, serviceClass, assumed }: SegmentFilter) => ({
  find,
  pattern: `%${find.replace(/[\\%_]/g, '\\$&')}%`,
  serviceClass,
  assumed,
});

/** One page of the roads in use, by name. */
export async function listSetupSegments(filter: SegmentFilter): Promise<SetupSegment[]> {
  return selectRows<SetupSegment>(
    `select s.id, s.name, s.road_class as "roadClass", s.service_class as "serviceClass", s.lanes, s.width_m as "widthM",
            s.surface, s.exposure, s.speed_km_per_h as "speedKmPerH", s.is_one_way as "isOneWay",
            s.is_bridge as "isBridge", s.is_sensitive as "isSensitive", s.length_m as "lengthM", s.assumed, s.edited,
            nullif(i.source, '') as source, s.updated_at as "updatedAt"
       from segments s left join network_imports i on i.id = s.import_id
      where ${where} order by s.name, s.id limit :limit offset :offset`,
    { ...bindings(filter), limit: SEGMENTS_A_PAGE, offset: (filter.page - 1) * SEGMENTS_A_PAGE },
  );
}

export interface SegmentTotals {
  segments: number;
  lengthM: number;
  laneM: number;
}

/** Count, length and lane length of the roads that the filter leaves. */
export async function sumSetupSegments(filter: SegmentFilter): Promise<SegmentTotals> {
  const rows = await selectRows<SegmentTotals>(
    `select count(*)::int as segments, coalesce(sum(s.length_m), 0) as "lengthM",
            coalesce(sum(s.length_m * s.lanes), 0) as "laneM"
       from segments s where ${where}`,
    bindings(filter),
  );
  return rows[0] ?? { segments: 0, lengthM: 0, laneM: 0 };
}
