import { selectRows } from '../transaction';

export interface YardRecord {
  id: number;
  name: string;
  longitudeDeg: number;
  latitudeDeg: number;
  solidCapacityKg: number;
  brineCapacityL: number;
  isActive: boolean;
}

export interface TruckRecord {
  id: number;
  number: number;
  name: string;
  yardId: number;
  yardName: string;
  ploughWidthM: number | null;
  isActive: boolean;
}

export interface SpreaderRecord {
  id: number;
  truckId: number;
  name: string;
  hopperKg: number;
  tankL: number;
  minRateGPerM2: number;
  maxRateGPerM2: number;
  maxLiquidRateMlPerM2: number | null;
  calibratedOn: string | null;
}

export async function listYards(): Promise<YardRecord[]> {
  return selectRows<YardRecord>(
    `select id, name, st_x(position) as "longitudeDeg", st_y(position) as "latitudeDeg",
            solid_capacity_kg as "solidCapacityKg", brine_capacity_l as "brineCapacityL", is_active as "isActive"
       from yards order by not is_active, name`,
  );
}

export async function listTrucks(): Promise<TruckRecord[]> {
  return selectRows<TruckRecord>(
    `select t.id, t.number, t.name, t.yard_id as "yardId", y.name as "yardName",
            t.plough_width_m as "ploughWidthM", t.is_active as "isActive"
       from trucks t join yards y on y.id = t.yard_id
      order by not t.is_active, t.number`,
  );
}

export async function listSpreaders(): Promise<SpreaderRecord[]> {
  return selectRows<SpreaderRecord>(
    `select id, truck_id as "truckId", name, hopper_kg as "hopperKg", tank_l as "tankL",
            min_rate_g_per_m2 as "minRateGPerM2", max_rate_g_per_m2 as "maxRateGPerM2",
            max_liquid_rate_ml_per_m2 as "maxLiquidRateMlPerM2", calibrated_on as "calibratedOn"
       from spreaders order by truck_id, name`,
  );
}
