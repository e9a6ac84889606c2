import { salts, type Salt } from '@/lib/brine/salts';

export type MaterialForm = 'solid' | 'prewet' | 'liquid' | 'abrasive';

export interface ListedMaterial {
  id: number;
  name: string;
  form: MaterialForm;
  composition: Partial<Record<Salt, number>>;
  waterMassFraction: number;
  densityKgPerM3: number;
  costCentsPerTonne: number;
  practicalMinimumC: number | null;
  solidMaterialId: number | null;
  liquidMaterialId: number | null;
  liquidMassFraction: number | null;
  isActive: boolean;
  /** a liquid's freezing point as it stands; null for others */
  freezesAtC: number | null;
}

export const formNames: Readonly<Record<MaterialForm, string>> = {
  solid: 'solid',
  prewet: 'pre-wetted solid',
  liquid: 'liquid',
  abrasive: 'abrasive',
};

/** "NaCl 97 %, MgCl2 1 %": the salts of a material, largest first. */
export function compositionWords(composition: Partial<Record<Salt, number>>): string {
  const shares = salts
    .map((salt) => ({ salt, share: composition[salt] ?? 0 }))
    .filter(({ share }) => share > 0)
    .sort((a, b) => b.share - a.share);
  if (shares.length === 0) return 'no salt';
  return shares.map(({ salt, share }) => `${formula(salt)} ${Number((share * 100).toFixed(1))}\u00A0%`).join(', ');
}

const subscripts: Readonly<Record<string, string>> = { '2': '\u2082' };

export function formula(salt: Salt): string {
  return salt.replace(/\d/g, (digit) => subscripts[digit] ?? digit);
}
