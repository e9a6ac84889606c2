import { type Salt } from '@/lib/brine/salts';
import { selectRows } from '../transaction';

export interface MaterialRecord {
  id: number;
  name: string;
  form: 'solid' | 'prewet' | 'liquid' | 'abrasive';
  composition: Partial<Record<Salt, number>>;
  waterMassFraction: number;
  densityKgPerM3: number;
  costCentsPerTonne: number;
  practicalMinimumC: number | null;
  solidMaterialId: number | null;
  liquidMaterialId: number | null;
  liquidMassFraction: number | null;
  isActive: boolean;
}

/** Every material, those in use first. */
export async function listMaterials(): Promise<MaterialRecord[]> {
  return selectRows<MaterialRecord>(
    `select id, name, form, composition, water_mass_fraction as "waterMassFraction",
            density_kg_per_m3 as "densityKgPerM3", cost_cents_per_tonne as "costCentsPerTonne",
            practical_minimum_c as "practicalMinimumC", solid_material_id as "solidMaterialId",
            liquid_material_id as "liquidMaterialId", liquid_mass_fraction as "liquidMassFraction",
            is_active as "isActive"
       from materials
      order by not is_active, array_position(array['liquid', 'prewet', 'solid', 'abrasive'], form), name`,
  );
}
