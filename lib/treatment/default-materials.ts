import { prewetMaterial, type Material } from './materials';

/**
 * Products to begin with; an agency's own list replaces them. Practical minima: NaCl 15 °F (Wisconsin DOT, Salt
 * Institute), MgCl2 5 °F, CaCl2 −25 °F (agency guides). Densities: NaCl 80 lb/cu ft loose and abrasives 100 lb/cu ft
 * (common practice, no source); brines from the density model at 10 °C. Costs: invented round figures of the order of
 * published prices, cents per tonne.
 */
const rockSalt: Material = {
  id: 'rock-salt',
  name: 'Rock salt',
  form: 'solid',
  composition: { NaCl: 0.97 },
  waterMassFraction: 0.02,
  densityKgPerM3: 1281,
  practicalMinimumC: -9.4,
  costCentsPerTonne: 7200,
};

const saltBrine: Material = {
  id: 'salt-brine',
  name: 'Salt brine, 23 %',
  form: 'liquid',
  composition: { NaCl: 0.233 },
  waterMassFraction: 0.767,
  densityKgPerM3: 1178,
  practicalMinimumC: -9.4,
  costCentsPerTonne: 1900,
};

const calciumBrine: Material = {
  id: 'calcium-brine',
  name: 'Calcium chloride brine, 32 %',
  form: 'liquid',
  composition: { CaCl2: 0.32 },
  waterMassFraction: 0.68,
  densityKgPerM3: 1315,
  practicalMinimumC: -31.7,
  costCentsPerTonne: 19500,
};

const magnesiumBrine: Material = {
  id: 'magnesium-brine',
  name: 'Magnesium chloride brine, 30 %',
  form: 'liquid',
  composition: { MgCl2: 0.3 },
  waterMassFraction: 0.7,
  densityKgPerM3: 1284,
  practicalMinimumC: -15,
  costCentsPerTonne: 16500,
};

const sand: Material = {
  id: 'sand',
  name: 'Sand',
  form: 'abrasive',
  composition: {},
  waterMassFraction: 0.04,
  densityKgPerM3: 1602,
  practicalMinimumC: null,
  costCentsPerTonne: 2100,
};

export const defaultMaterials: readonly Material[] = [
  saltBrine,
  magnesiumBrine,
  calciumBrine,
  prewetMaterial({
    id: 'prewet-salt',
    name: 'Pre-wetted salt, 70:30',
    solid: rockSalt,
    liquid: saltBrine,
    liquidMassFraction: 0.3,
  }),
  rockSalt,
  sand,
];
