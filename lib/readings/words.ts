import { type WordQuantity } from './quantities';

/** Codes of NTCIP 1204 essSurfaceStatus; 1 (other) and 2 (error) say nothing. */
const surfaceCodes: Readonly<Record<string, string | null>> = {
  1: null,
  2: null,
  3: 'dry',
  4: 'moist',
  5: 'wet',
  6: 'chemically-wet',
  7: 'ice',
  8: 'ice-watch',
  9: 'snow',
  10: 'snow-watch',
  11: 'moist',
  12: 'dew',
  13: 'frost',
  14: 'moist',
};

/** Codes of NTCIP 1204 essPrecipSituation: unidentified, snow, rain and frozen, each slight, moderate and heavy. */
const precipitationCodes: Readonly<Record<string, string | null>> = {
  1: null,
  2: null,
  3: 'none',
  4: 'unknown',
  5: 'unknown',
  6: 'unknown',
  7: 'snow',
  8: 'snow',
  9: 'snow',
  10: 'rain',
  11: 'rain',
  12: 'rain',
  13: 'sleet',
  14: 'sleet',
  15: 'sleet',
};

const surfaceWords: readonly (readonly [RegExp, string])[] = [
  [/chemical/, 'chemically-wet'],
  [/ice watch/, 'ice-watch'],
  [/snow watch/, 'snow-watch'],
  [/black ice|\bice\b|\bicy\b|eis|glatt/, 'ice'],
  [/slush|matsch/, 'slush'],
  [/snow|schnee/, 'snow'],
  [/frost|reif|rime/, 'frost'],
  [/\bdew\b|^tau$/, 'dew'],
  [/moist|damp|trace|feucht|absor/, 'moist'],
  [/wet|nass|naß/, 'wet'],
  [/dry|trocken/, 'dry'],
];

const precipitationWords: readonly (readonly [RegExp, string])[] = [
  [/^no$|^none$|no precip|^dry$|kein|trocken/, 'none'],
  [/freezing drizzle|gefrierender nieselregen/, 'freezing-drizzle'],
  [/freezing|gefrierend/, 'freezing-rain'],
  [/sleet|ice pellets|hail|mixed|frozen|schneeregen|graupel/, 'sleet'],
  [/snow|schnee/, 'snow'],
  [/drizzle|niesel/, 'drizzle'],
  [/rain|shower|regen/, 'rain'],
  [/frost/, 'frost'],
  [/^yes$|^precip|unidentified|unknown/, 'unknown'],
];

const tables = {
  surfaceStatus: { codes: surfaceCodes, words: surfaceWords },
  precipitationType: { codes: precipitationCodes, words: precipitationWords },
};

/**
 * A word or an NTCIP 1204 code as the word that is stored: `5` and `Wet` as a state of the road are both `wet`.
 * `missing` where the code says that nothing is known; null for what is neither a known code nor a known word.
 */
export function readWord(text: string, quantity: WordQuantity): string | 'missing' | null {
  const { codes, words } = tables[quantity];
  const key = text.trim().toLowerCase().replaceAll(/[-_]/g, ' ');
  if (key in codes) return codes[key] ?? 'missing';
  return words.find(([pattern]) => pattern.test(key))?.[1] ?? null;
}
