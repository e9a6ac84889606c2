import { selectRows } from '../transaction';

export interface CabTruck {
  id: number;
  number: number;
  name: string;
  yardName: string;
  hopperKg: number;
  tankL: number;
  /** who has it out now; null when it is free */
  outWith: string | null;
}

export async function listCabTrucks(): Promise<CabTruck[]> {
  return selectRows<CabTruck>(
    `select t.id, t.number, t.name, y.name as "yardName", coalesce(s.hopper_kg, 0) as "hopperKg",
            coalesce(s.tank_l, 0) as "tankL",
            (select p.name from runs r join people p on p.id = r.driver_id
              where r.truck_id = t.id and r.finished_at is null) as "outWith"
       from trucks t
       join yards y on y.id = t.yard_id
       left join lateral (select * from spreaders where truck_id = t.id order by id desc limit 1) s on true
      where t.is_active order by t.number`,
  );
}

export interface RoadChoice {
  id: number;
  name: string;
  serviceClass: string;
  lengthM: number;
  lanes: number;
}

export async function listRoadChoices(): Promise<RoadChoice[]> {
  return selectRows<RoadChoice>(
    `select id, name, service_class as "serviceClass", length_m as "lengthM", lanes
       from segments where retired_at is null order by name, id`,
  );
}

export interface CabMaterial {
  id: number;
  name: string;
  form: 'solid' | 'prewet' | 'liquid' | 'abrasive';
  densityKgPerM3: number;
}

export async function listCabMaterials(): Promise<CabMaterial[]> {
  return selectRows<CabMaterial>(
    `select id, name, form, density_kg_per_m3 as "densityKgPerM3" from materials where is_active
      order by case form when 'prewet' then 0 when 'solid' then 1 when 'liquid' then 2 else 3 end, name`,
  );
}

export async function listCabYards(): Promise<{ id: number; name: string }[]> {
  return selectRows<{ id: number; name: string }>('select id, name from yards where is_active order by name');
}
