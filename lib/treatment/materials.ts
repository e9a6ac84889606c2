import { chlorideMassFraction, salts, type Salt } from '../brine/salts';
import { fastLiquidus } from '../brine/fast';
import { type Product } from '../road/pass';

export const materialForms = ['liquid', 'prewet', 'solid', 'abrasive'] as const;
export type MaterialForm = (typeof materialForms)[number];

/** A product as bought or made, and what is known of it. */
export interface Material {
  readonly id: string;
  readonly name: string;
  readonly form: MaterialForm;
  /** kg of anhydrous salt per kg of product; what salts and water leave is inert */
  readonly composition: Readonly<Partial<Record<Salt, number>>>;
  readonly waterMassFraction: number;
  readonly densityKgPerM3: number;
  /** coldest pavement on which it melts usefully in 15 to 20 minutes, °C; null when nobody said */
  readonly practicalMinimumC: number | null;
  readonly costCentsPerTonne: number;
}

/** Time constants of dissolving, min; common practice, no source. */
const DISSOLVE_MIN: Readonly<Record<MaterialForm, number>> = { liquid: 0, prewet: 5, solid: 15, abrasive: 15 };

export function productOf(material: Material): Product {
  return {
    composition: material.composition,
    waterMassFraction: material.waterMassFraction,
    dissolveMin: DISSOLVE_MIN[material.form],
  };
}

/**
 * A pre-wetted product from its parts, `liquidMassFraction` of it liquid by mass. The limit is the warmer of the two
 * limits' colder: the solid's, since most of the salt is there. 70 % NaCl with 30 % of a 23.3 % brine: 0.7699 kg of
 * salt per kg.
 */
export function prewetMaterial(mix: {
  id: string;
  name: string;
  solid: Material;
  liquid: Material;
  liquidMassFraction: number;
}): Material {
  const { solid, liquid, liquidMassFraction: share } = mix;
  if (!(share > 0 && share < 1)) throw new RangeError(`The share of liquid lies between 0 and 1, not ${share}`);
  const mixed = (of: (part: Material) => number) => (1 - share) * of(solid) + share * of(liquid);
  const composition: Partial<Record<Salt, number>> = {};
  for (const salt of salts) {
    const massFraction = mixed((part) => part.composition[salt] ?? 0);
    if (massFraction > 0) composition[salt] = massFraction;
  }
  return {
    id: mix.id,
    name: mix.name,
    form: 'prewet',
    composition,
    waterMassFraction: mixed((part) => part.waterMassFraction),
    // The liquid fills the voids of the heap: its volume does not add.
    densityKgPerM3: solid.densityKgPerM3 / (1 - share),
    practicalMinimumC: solid.practicalMinimumC,
    costCentsPerTonne: Math.round(mixed((part) => part.costCentsPerTonne)),
  };
}

/** kg of anhydrous salts per kg of product. */
export function saltMassFraction(material: Pick<Material, 'composition'>): number {
  return salts.reduce((sum, salt) => sum + (material.composition[salt] ?? 0), 0);
}

/** kg of chloride per kg of product. Rock salt with 2 % moisture: 0.594. */
export function chlorideShare(material: Pick<Material, 'composition'>): number {
  return salts.reduce((sum, salt) => sum + (material.composition[salt] ?? 0) * chlorideMassFraction(salt), 0);
}

const eutectics = new Map<Salt, number>();

function eutecticOfSaltC(salt: Salt): number {
  const known = eutectics.get(salt) ?? fastLiquidus(salt).eutecticC;
  eutectics.set(salt, known);
  return known;
}

/** °C below which no salt of the product makes brine: the coldest eutectic among them; 0 with no salt. */
export function eutecticLimitC(material: Pick<Material, 'composition'>): number {
  return salts.reduce(
    (coldest, salt) => ((material.composition[salt] ?? 0) > 0 ? Math.min(coldest, eutecticOfSaltC(salt)) : coldest),
    0,
  );
}

/** mL/m² of a product of that density from g/m². 23.3 % brine, 30 g/m²: 25.5. */
export function rateMLPerM2Of(rateGPerM2: number, densityKgPerM3: number): number {
  return (rateGPerM2 / densityKgPerM3) * 1000;
}
