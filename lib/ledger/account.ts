import { chlorideMassFraction, type Salt } from '@/lib/brine/salts';

export interface LedgerMaterial {
  id: number;
  name: string;
  /** mass fractions of anhydrous salts in the product, 0–1 */
  composition: Readonly<Partial<Record<Salt, number>>>;
  costCentsPerTonne: number;
}

/** One road of one run, as logged. Amended entries are left out before this point. */
export interface LedgerEntry {
  runId: string;
  segmentId: number;
  areaM2: number;
  isSensitive: boolean;
  outcome: 'spread' | 'ploughed' | 'skipped';
  materialId: number | null;
  rateGPerM2: number | null;
  recommendedMaterialId: number | null;
  recommendedRateGPerM2: number | null;
}

export interface Account {
  roads: number;
  skipped: number;
  recommendedKg: number;
  spreadKg: number;
  /** kg of anhydrous salts in what was spread */
  saltKg: number;
  chlorideKg: number;
  chlorideOnSensitiveKg: number;
  costCents: number;
}

export const emptyAccount: Account = {
  roads: 0,
  skipped: 0,
  recommendedKg: 0,
  spreadKg: 0,
  saltKg: 0,
  chlorideKg: 0,
  chlorideOnSensitiveKg: 0,
  costCents: 0,
};

/** kg of product on `areaM2` (m²) at `rateGPerM2` (g/m²). */
export function massKg(rateGPerM2: number | null, areaM2: number): number {
  return rateGPerM2 === null ? 0 : (rateGPerM2 * areaM2) / 1000;
}

/** kg of chloride in `productKg` of a product. NaCl, 1000 kg: 606.6 kg. */
export function chlorideKg(material: LedgerMaterial, productKg: number): number {
  return sumOverSalts(material, (salt, fraction) => fraction * chlorideMassFraction(salt)) * productKg;
}

function sumOverSalts(material: LedgerMaterial, term: (salt: Salt, fraction: number) => number): number {
  return (Object.entries(material.composition) as [Salt, number][]).reduce(
    (sum, [salt, fraction]) => sum + term(salt, fraction),
    0,
  );
}

/**
 * What went down against what should have: masses in kg of product, chloride by species, cost in cents.
 * A road logged twice counts twice, as the material did. Order of entries does not matter.
 */
export function accountFor(entries: readonly LedgerEntry[], materials: ReadonlyMap<number, LedgerMaterial>): Account {
  return entries.reduce((account, entry) => addEntry(account, entry, materials), emptyAccount);
}

function addEntry(account: Account, entry: LedgerEntry, materials: ReadonlyMap<number, LedgerMaterial>): Account {
  const spreadKg = entry.outcome === 'spread' ? massKg(entry.rateGPerM2, entry.areaM2) : 0;
  const material = entry.materialId === null ? undefined : materials.get(entry.materialId);
  const chloride = material ? chlorideKg(material, spreadKg) : 0;
  return {
    roads: account.roads + 1,
    skipped: account.skipped + (entry.outcome === 'skipped' ? 1 : 0),
    recommendedKg: account.recommendedKg + massKg(entry.recommendedRateGPerM2, entry.areaM2),
    spreadKg: account.spreadKg + spreadKg,
    saltKg: account.saltKg + (material ? sumOverSalts(material, (_, fraction) => fraction) * spreadKg : 0),
    chlorideKg: account.chlorideKg + chloride,
    chlorideOnSensitiveKg: account.chlorideOnSensitiveKg + (entry.isSensitive ? chloride : 0),
    costCents: account.costCents + (material ? (material.costCentsPerTonne * spreadKg) / 1000 : 0),
  };
}

/** Spread above (+) or below (−) what was recommended, as a fraction of it; null when nothing was recommended. */
export function differenceFraction(account: Pick<Account, 'recommendedKg' | 'spreadKg'>): number | null {
  return account.recommendedKg === 0 ? null : (account.spreadKg - account.recommendedKg) / account.recommendedKg;
}

/** Middle of the rates, g/m², half-way between the two middle ones when even; null for none. */
export function medianRate(rates: readonly number[]): number | null {
  if (rates.length === 0) return null;
  const sorted = [...rates].sort((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  const upper = sorted[middle] ?? 0;
  return sorted.length % 2 === 1 ? upper : ((sorted[middle - 1] ?? 0) + upper) / 2;
}
