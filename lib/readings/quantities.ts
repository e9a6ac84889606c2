import { type Quantity as ShownAs } from '@/lib/units/quantity';

/** What a station can measure and the readings table can hold; the name carries the SI unit. */
export const numericQuantities = [
  'pavementTempC',
  'airTempC',
  'dewPointC',
  'relativeHumidity',
  'windSpeedMPerS',
  'windGustMPerS',
  'windDirectionDeg',
  'precipitationMm',
  'subsurfaceTempC',
  'freezingPointC',
  'solarWPerM2',
  'visibilityM',
  'waterMm',
] as const;
export type NumericQuantity = (typeof numericQuantities)[number];

/** What comes as a word or a code. */
export const wordQuantities = ['precipitationType', 'surfaceStatus'] as const;
export type WordQuantity = (typeof wordQuantities)[number];

export const quantities = [...numericQuantities, ...wordQuantities] as const;
export type ReadingQuantity = (typeof quantities)[number];

export type UnitFamily = 'temperature' | 'fraction' | 'speed' | 'direction' | 'fallen' | 'depth' | 'flux' | 'distance';

export interface QuantityFacts {
  readonly label: string;
  readonly family: UnitFamily | 'word';
  /** How the person's units show it; null where the figure is shown as it is. */
  readonly shownAs: ShownAs | null;
}

/** Label, family of units and how it is shown, for each quantity. */
export const quantityFacts: Readonly<Record<ReadingQuantity, QuantityFacts>> = {
  pavementTempC: { label: 'Pavement temperature', family: 'temperature', shownAs: 'temperature' },
  airTempC: { label: 'Air temperature', family: 'temperature', shownAs: 'temperature' },
  dewPointC: { label: 'Dew point', family: 'temperature', shownAs: 'temperature' },
  relativeHumidity: { label: 'Relative humidity', family: 'fraction', shownAs: 'percent' },
  windSpeedMPerS: { label: 'Wind, mean', family: 'speed', shownAs: 'windSpeed' },
  windGustMPerS: { label: 'Wind, gust', family: 'speed', shownAs: 'windSpeed' },
  windDirectionDeg: { label: 'Wind, direction', family: 'direction', shownAs: null },
  precipitationMm: { label: 'Precipitation', family: 'fallen', shownAs: 'depth' },
  subsurfaceTempC: { label: 'Temperature below the surface', family: 'temperature', shownAs: 'temperature' },
  freezingPointC: { label: 'Freezing point on the road', family: 'temperature', shownAs: 'temperature' },
  solarWPerM2: { label: 'Sun', family: 'flux', shownAs: 'heatFlux' },
  visibilityM: { label: 'Visibility', family: 'distance', shownAs: 'distance' },
  waterMm: { label: 'Water or ice on the road', family: 'depth', shownAs: 'depth' },
  precipitationType: { label: 'Kind of precipitation', family: 'word', shownAs: null },
  surfaceStatus: { label: 'State of the road', family: 'word', shownAs: null },
};

const wordSet: ReadonlySet<string> = new Set(wordQuantities);

/** True for quantities that come as a word or a code. */
export function isWordQuantity(quantity: ReadingQuantity): quantity is WordQuantity {
  return wordSet.has(quantity);
}
