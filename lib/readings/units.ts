import { fToC, ftToM, inchToMm, kmPerHToMPerS, knotsToMPerS, mileToKm, mphToMPerS } from '@/lib/units/convert';
import { quantityFacts, type ReadingQuantity, type UnitFamily } from './quantities';

/** How a number of a file becomes SI. `needsInterval`: an amount that depends on how long it was gathered. */
interface FileUnit {
  readonly family: UnitFamily;
  readonly toSi: (value: number, intervalMin: number) => number;
  readonly needsInterval?: true;
  /** Codes that stand for "missing" with this unit: the error values of NTCIP 1204's objects. */
  readonly missing?: readonly string[];
}

/**
 * The units a file can come in. Tenths are the integers of NTCIP 1204 exports: 1001 tenths of a degree is no
 * temperature but the error value. kJ/m² is the sum over the interval: 360 kJ/m² in an hour is 100 W/m².
 * mm/h and in/h are rates, taken for the interval: 1.2 mm/h over 10 min is 0.2 mm. g/m²/s in tenths: 10 is 3.6 mm/h.
 */
export const fileUnits = {
  '°C': { family: 'temperature', toSi: (value) => value },
  '°F': { family: 'temperature', toSi: fToC },
  '0.1 °C': { family: 'temperature', toSi: (value) => value / 10, missing: ['1001'] },
  K: { family: 'temperature', toSi: (value) => value - 273.15 },
  '%': { family: 'fraction', toSi: (value) => value / 100, missing: ['101'] },
  '0 to 1': { family: 'fraction', toSi: (value) => value },
  'm/s': { family: 'speed', toSi: (value) => value },
  'km/h': { family: 'speed', toSi: kmPerHToMPerS },
  mph: { family: 'speed', toSi: mphToMPerS },
  kn: { family: 'speed', toSi: knotsToMPerS },
  '0.1 m/s': { family: 'speed', toSi: (value) => value / 10, missing: ['65535'] },
  '°': { family: 'direction', toSi: (value) => value, missing: ['361'] },
  mm: { family: 'depth', toSi: (value) => value },
  in: { family: 'depth', toSi: inchToMm },
  '0.1 mm': { family: 'depth', toSi: (value) => value / 10, missing: ['65535'] },
  'mm/h': { family: 'fallen', toSi: (value, min) => (value * min) / 60, needsInterval: true },
  'in/h': { family: 'fallen', toSi: (value, min) => inchToMm((value * min) / 60), needsInterval: true },
  '0.1 g/m²/s': {
    family: 'fallen',
    toSi: (value, min) => (value * 0.36 * min) / 60,
    needsInterval: true,
    missing: ['65535'],
  },
  'W/m²': { family: 'flux', toSi: (value) => value },
  'kJ/m²': { family: 'flux', toSi: (value, min) => (value * 1000) / (min * 60), needsInterval: true },
  m: { family: 'distance', toSi: (value) => value },
  km: { family: 'distance', toSi: (value) => value * 1000 },
  mile: { family: 'distance', toSi: (value) => mileToKm(value) * 1000 },
  ft: { family: 'distance', toSi: ftToM },
  '0.1 m': { family: 'distance', toSi: (value) => value / 10, missing: ['1000001'] },
} as const satisfies Record<string, FileUnit>;

export type FileUnitName = keyof typeof fileUnits | 'word';
export const fileUnitNames = [...(Object.keys(fileUnits) as (keyof typeof fileUnits)[]), 'word'] as const;

/** The facts of a unit; null for words, which have none. */
export function factsOfUnit(unit: FileUnitName): FileUnit | null {
  return unit === 'word' ? null : fileUnits[unit];
}

/** The units that a quantity can come in, the likeliest first; a fallen amount comes as a depth or as a rate. */
export function unitsOf(quantity: ReadingQuantity): readonly FileUnitName[] {
  const { family } = quantityFacts[quantity];
  if (family === 'word') return ['word'];
  const names = Object.keys(fileUnits) as (keyof typeof fileUnits)[];
  const fits = (of: UnitFamily) => of === family || (family === 'fallen' && of === 'depth');
  return names.filter((name) => fits(fileUnits[name].family));
}

/** Whether the value is a sum or a rate over an interval, so that it matters whether its time is the end or the start. */
export function isOverInterval(quantity: ReadingQuantity): boolean {
  return quantity === 'precipitationMm' || quantity === 'solarWPerM2';
}
