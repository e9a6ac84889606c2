import { selectRows } from '../transaction';
import { listYards } from './fleet';
import { listMaterials, type MaterialRecord } from './materials';

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

export type CabMaterial = Pick<MaterialRecord, 'id' | 'name' | 'form' | 'densityKgPerM3'>;

/** What trucks carry most stands first. */
const formOrder = ['prewet', 'solid', 'liquid', 'abrasive'];

/** Materials in use, as a driver chooses among them. */
export async function listCabMaterials(): Promise<CabMaterial[]> {
  const materials = (await listMaterials()).filter((material) => material.isActive);
  return materials
    .map(({ id, name, form, densityKgPerM3 }) => ({ id, name, form, densityKgPerM3 }))
    .sort((a, b) => formOrder.indexOf(a.form) - formOrder.indexOf(b.form) || a.name.localeCompare(b.name));
}

/** Yards in use. */
export async function listCabYards(): Promise<{ id: number; name: string }[]> {
  return (await listYards()).filter((yard) => yard.isActive).map(({ id, name }) => ({ id, name }));
}
