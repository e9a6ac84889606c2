import { type Role } from '../permissions';
import { type RouteName } from './road-words';

/** Nobody here is anybody: the people of an invented island. */
export interface SkerrowPerson {
  name: string;
  email: string;
  role: Role;
}

const person = (name: string, localPart: string, role: Role): SkerrowPerson => ({
  name,
  email: `${localPart}@skerrow.example`,
  role,
});

export const people: readonly SkerrowPerson[] = [
  person('Una Kinnaird', 'dispatcher', 'dispatcher'),
  person('Ewan Strachan', 'e.strachan', 'dispatcher'),
  person('Tam Orme', 'driver', 'driver'),
  person('Jess Farrow', 'j.farrow', 'driver'),
  person('Sorrel Wick', 's.wick', 'driver'),
  person('Marta Aldous', 'm.aldous', 'driver'),
  person('Anders Bree', 'a.bree', 'driver'),
  person('Piet Lanty', 'p.lanty', 'driver'),
  person('Nell Harker', 'n.harker', 'driver'),
  person('Colm Tully', 'c.tully', 'driver'),
  person('Rhona Garth', 'r.garth', 'driver'),
  person('Ivo Sand', 'i.sand', 'driver'),
  person('Greer Maddock', 'supervisor', 'supervisor'),
  person('Dod Pirie', 'yard', 'yard'),
  person('Kirsty Vane', 'k.vane', 'yard'),
  person('Ailsa Thorn', 'administrator', 'administrator'),
  person('Bram Ettrick', 'observer', 'observer'),
];

/** Yards stand beside the road named. */
export interface SkerrowYard {
  name: string;
  besideRoad: string;
  solidCapacityKg: number;
  brineCapacityL: number;
}

export const yards: readonly SkerrowYard[] = [
  { name: 'Brannoch depot', besideRoad: 'Depot Close', solidCapacityKg: 420_000, brineCapacityL: 60_000 },
  { name: 'Hallow Quay yard', besideRoad: 'Slipway', solidCapacityKg: 350_000, brineCapacityL: 40_000 },
  { name: 'Skail shed', besideRoad: 'Bay Close', solidCapacityKg: 120_000, brineCapacityL: 15_000 },
];

export interface SkerrowTruck {
  number: number;
  name: string;
  yard: string;
  route: RouteName;
  /** who has it on the night of the storm */
  driver: string;
  ploughWidthM: number;
  hopperKg: number;
  tankL: number;
  minRateGPerM2: number;
  maxRateGPerM2: number;
  maxLiquidRateMlPerM2: number | null;
  calibratedDaysBefore: number;
}

type Spreader = Pick<
  SkerrowTruck,
  'hopperKg' | 'tankL' | 'minRateGPerM2' | 'maxRateGPerM2' | 'maxLiquidRateMlPerM2' | 'ploughWidthM'
>;

const large: Spreader = {
  ploughWidthM: 3.4,
  hopperKg: 9000,
  tankL: 2100,
  minRateGPerM2: 5,
  maxRateGPerM2: 60,
  maxLiquidRateMlPerM2: 60,
};
const middling: Spreader = {
  ploughWidthM: 3.0,
  hopperKg: 7500,
  tankL: 1200,
  minRateGPerM2: 5,
  maxRateGPerM2: 50,
  maxLiquidRateMlPerM2: 40,
};
const small: Spreader = {
  ploughWidthM: 2.6,
  hopperKg: 4000,
  tankL: 0,
  minRateGPerM2: 8,
  maxRateGPerM2: 40,
  maxLiquidRateMlPerM2: null,
};

export const trucks: readonly SkerrowTruck[] = [
  {
    number: 1,
    name: 'Kittiwake',
    yard: 'Hallow Quay yard',
    route: 'Quay and High Street',
    driver: 'Tam Orme',
    ...middling,
    calibratedDaysBefore: 12,
  },
  {
    number: 2,
    name: 'Fulmar',
    yard: 'Skail shed',
    route: 'Skail bridges',
    driver: 'Jess Farrow',
    ...middling,
    calibratedDaysBefore: 9,
  },
  {
    number: 3,
    name: 'Cormorant',
    yard: 'Brannoch depot',
    route: 'Toll loop',
    driver: 'Sorrel Wick',
    ...large,
    calibratedDaysBefore: 18,
  },
  {
    number: 4,
    name: 'Skua',
    yard: 'Brannoch depot',
    route: 'Ridge',
    driver: 'Marta Aldous',
    ...middling,
    calibratedDaysBefore: 212,
  },
  {
    number: 5,
    name: 'Gannet',
    yard: 'Hallow Quay yard',
    route: 'West shore',
    driver: 'Anders Bree',
    ...large,
    calibratedDaysBefore: 6,
  },
  {
    number: 6,
    name: 'Whimbrel',
    yard: 'Brannoch depot',
    route: 'Moss and Sound',
    driver: 'Piet Lanty',
    ...middling,
    calibratedDaysBefore: 15,
  },
  {
    number: 7,
    name: 'Wren',
    yard: 'Brannoch depot',
    route: 'Brannoch town',
    driver: 'Nell Harker',
    ...small,
    calibratedDaysBefore: 21,
  },
  {
    number: 8,
    name: 'Dunlin',
    yard: 'Brannoch depot',
    route: 'East shore',
    driver: 'Colm Tully',
    ...large,
    calibratedDaysBefore: 4,
  },
];

export interface SkerrowMaterial {
  name: string;
  form: 'solid' | 'prewet' | 'liquid' | 'abrasive';
  /** mass fractions of anhydrous salts in the product */
  composition: Readonly<Partial<Record<'NaCl' | 'CaCl2' | 'MgCl2', number>>>;
  waterMassFraction: number;
  densityKgPerM3: number;
  costCentsPerTonne: number;
  practicalMinimumC: number | null;
  mixedFrom?: { solid: string; liquid: string; liquidMassFraction: number };
}

/**
 * What the yards hold. Lowest practical temperatures as in `lib/treatment`: NaCl 15 °F (Wisconsin DOT, Salt
 * Institute), MgCl2 5 °F, CaCl2 −25 °F (agency guides); bulk densities common practice, no source; prices invented.
 */
export const materials: readonly SkerrowMaterial[] = [
  {
    name: 'Rock salt, dry',
    form: 'solid',
    composition: { NaCl: 0.97 },
    waterMassFraction: 0.01,
    densityKgPerM3: 1280,
    costCentsPerTonne: 8200,
    practicalMinimumC: -9.4,
  },
  {
    name: 'Salt brine 23 %',
    form: 'liquid',
    composition: { NaCl: 0.23 },
    waterMassFraction: 0.77,
    densityKgPerM3: 1176,
    costCentsPerTonne: 3100,
    practicalMinimumC: -9.4,
  },
  {
    name: 'Pre-wet salt 70:30',
    form: 'prewet',
    composition: { NaCl: 0.748 },
    waterMassFraction: 0.238,
    densityKgPerM3: 1300,
    costCentsPerTonne: 6670,
    practicalMinimumC: -9.4,
    mixedFrom: { solid: 'Rock salt, dry', liquid: 'Salt brine 23 %', liquidMassFraction: 0.3 },
  },
  {
    name: 'Magnesium chloride brine 30 %',
    form: 'liquid',
    composition: { MgCl2: 0.3 },
    waterMassFraction: 0.7,
    densityKgPerM3: 1283,
    costCentsPerTonne: 16500,
    practicalMinimumC: -15,
  },
  {
    name: 'Calcium chloride brine 32 %',
    form: 'liquid',
    composition: { CaCl2: 0.32 },
    waterMassFraction: 0.68,
    densityKgPerM3: 1315,
    costCentsPerTonne: 19800,
    practicalMinimumC: -31.7,
  },
  {
    name: 'Washed grit 3–6 mm',
    form: 'abrasive',
    composition: {},
    waterMassFraction: 0.03,
    densityKgPerM3: 1600,
    costCentsPerTonne: 3400,
    practicalMinimumC: null,
  },
];

/** A station stands beside the road named; the weather of each is told by its place in this list. */
export interface SkerrowStation {
  name: string;
  besideRoad: string;
  measures: readonly string[];
}

const basics = [
  'pavementTempC',
  'airTempC',
  'dewPointC',
  'relativeHumidity',
  'windSpeedMPerS',
  'windGustMPerS',
  'windDirectionDeg',
];
const full = [
  ...basics,
  'precipitationMm',
  'precipitationType',
  'subsurfaceTempC',
  'solarWPerM2',
  'visibilityM',
  'waterMm',
  'surfaceStatus',
];

export const stations: readonly SkerrowStation[] = [
  { name: 'Summit cut', besideRoad: 'Ridge Road, summit cut', measures: full },
  { name: 'Skail Bridge', besideRoad: 'Skail Bridge deck', measures: full },
  { name: 'Brannoch High Street', besideRoad: 'Brannoch High Street', measures: full },
  { name: 'Hallow harbour', besideRoad: 'The Quay', measures: full },
  { name: 'Moss Mere', besideRoad: 'Moss Lane, mere side', measures: full },
  { name: 'Nether Toll', besideRoad: 'Toll Main Street', measures: full },
];
