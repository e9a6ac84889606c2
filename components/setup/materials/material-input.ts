import { salts } from '@/lib/brine/salts';
import { centsPerTonne } from '@/lib/units/money';
import { type UnitSystem } from '@/lib/units/format';
import { type MaterialForm } from './listed-material';

interface Typed {
  typed: Readonly<Record<string, FormDataEntryValue>>;
  form: MaterialForm;
  id: number | null;
  system: UnitSystem;
}

function costFrom(typed: FormDataEntryValue | undefined, system: UnitSystem): number | string {
  const text = String(typed ?? '')
    .replace(/\s/g, '')
    .replace(',', '.');
  const price = Number(text);
  return text === '' || Number.isNaN(price) ? text : centsPerTonne(price, system);
}

/** The fields of the form as the contract wants them: salts in one record, money in cents per tonne. */
export function materialInput({ typed, form, id, system }: Typed): Record<string, unknown> {
  const { name, practicalMinimumC, isActive, price } = typed;
  const shared = { id, form, name, practicalMinimumC, isActive };
  if (form === 'prewet') {
    const { solidMaterialId, liquidMaterialId, liquidMassFraction } = typed;
    return { ...shared, solidMaterialId, liquidMaterialId, liquidMassFraction };
  }
  return {
    ...shared,
    composition: Object.fromEntries(salts.map((salt) => [salt, typed[`salt.${salt}`] ?? ''])),
    waterMassFraction: typed.waterMassFraction,
    densityKgPerM3: typed.densityKgPerM3,
    costCentsPerTonne: costFrom(price, system),
  };
}
