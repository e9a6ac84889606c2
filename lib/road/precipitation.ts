/** What falls, by how it reaches the road. `frost` stands for hoarfrost and dew. */
export const precipitationTypes = [
  'none',
  'rain',
  'drizzle',
  'snow',
  'sleet',
  'freezing-rain',
  'freezing-drizzle',
  'frost',
  'unknown',
] as const;
export type PrecipitationType = (typeof precipitationTypes)[number];

const known: ReadonlySet<string> = new Set(precipitationTypes);

/** A stored word as a type; a word that is not one of them is `unknown`, none at all is `none`. */
export function precipitationTypeOf(word: string | null): PrecipitationType {
  if (word === null || word === '') return 'none';
  return known.has(word) ? (word as PrecipitationType) : 'unknown';
}

/**
 * The part of the water that arrives frozen, 0 to 1. Sleet half (common practice, no source); of an unknown type all
 * of it on a road at or below 0 °C.
 */
export function frozenShare(type: PrecipitationType, pavementTempC: number): number {
  switch (type) {
    case 'snow':
    case 'frost':
      return 1;
    case 'sleet':
      return 0.5;
    case 'unknown':
      return pavementTempC <= 0 ? 1 : 0;
    default:
      return 0;
  }
}

/** Snow and sleet stay loose if salted in time; what freezes on to the road does not. */
export function isSnowLike(type: PrecipitationType, pavementTempC: number): boolean {
  return type === 'snow' || type === 'sleet' || (type === 'unknown' && pavementTempC <= 0);
}

/** Liquid that freezes where it lands. */
export function isFreezingRain(type: PrecipitationType, pavementTempC: number): boolean {
  if (type === 'freezing-rain' || type === 'freezing-drizzle') return true;
  return (type === 'rain' || type === 'drizzle') && pavementTempC < 0;
}

export function isRain(type: PrecipitationType): boolean {
  return type === 'rain' || type === 'drizzle' || type === 'freezing-rain' || type === 'freezing-drizzle';
}
