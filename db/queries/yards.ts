import { selectRows } from '../transaction';

export interface YardSummary {
  id: number;
  name: string;
  solidCapacityKg: number;
  brineCapacityL: number;
  trucks: string;
  loadsLastDay: number;
  loadedKgLastDay: number;
}

export async function listYardSummaries({ now }: { now: Date }): Promise<YardSummary[]> {
  return selectRows<YardSummary>(
    `select y.id, y.name, y.solid_capacity_kg as "solidCapacityKg", y.brine_capacity_l as "brineCapacityL",
            coalesce((select string_agg(t.number::text, ', ' order by t.number) from trucks t where t.yard_id = y.id and t.is_active), '') as trucks,
            count(l.id)::int as "loadsLastDay", coalesce(sum(l.mass_kg), 0) as "loadedKgLastDay"
       from yards y
       left join loads l on l.yard_id = y.id and l.loaded_at > :since
      where y.is_active group by y.id order by y.name`,
    { since: new Date(now.getTime() - 24 * 3_600_000) },
  );
}

export interface LoadRecord {
  id: string;
  yardName: string;
  truckNumber: number;
  driverName: string;
  materialName: string;
  massKg: number;
  loadedAt: Date;
  recordedBy: string;
}

export async function listLoads({ limit }: { limit: number }): Promise<LoadRecord[]> {
  return selectRows<LoadRecord>(
    `select l.id, y.name as "yardName", t.number as "truckNumber", d.name as "driverName", m.name as "materialName",
            l.mass_kg as "massKg", l.loaded_at as "loadedAt", b.name as "recordedBy"
       from loads l
       join yards y on y.id = l.yard_id
       join materials m on m.id = l.material_id
       join runs r on r.id = l.run_id
       join trucks t on t.id = r.truck_id
       join people d on d.id = r.driver_id
       join people b on b.id = l.recorded_by
      order by l.loaded_at desc limit :limit`,
    { limit },
  );
}
