import { type ColumnMapping, USUAL_INTERVAL_MIN } from './mapping';
import { quantityFacts, type ReadingQuantity } from './quantities';
import { factsOfUnit, fileUnits, type FileUnitName, unitsOf } from './units';

/** Something of a guess that a person should look at; `part` is a column's name, or `clock`, `time`, `table`. */
export interface Doubt {
  part: string;
  sentence: string;
}

/** Heads as they are written in English and German exports, the more particular first. */
const heads: readonly (readonly [RegExp, ReadingQuantity])[] = [
  [/freez|gefrierp/, 'freezingPointC'],
  [/sub.?surf|sub.?grade|soil|tiefe|unter|ground temp|boden(?!feuchte)/, 'subsurfaceTempC'],
  [/(surf|pave|road|fahrbahn|belag|strassen|straßen).*(stat|cond|zustand)|^(road)?state$|zustand/, 'surfaceStatus'],
  [/water ?film|film|wasserfilm|ice.?or.?water|layer|schicht/, 'waterMm'],
  [/pave|surf|road|fahrbahn|belag|strasse|straße|deck|(?:^| )(srt|rst|fbt)(?: |$)/, 'pavementTempC'],
  [/dew|taupunkt|(?:^| )(td|tp)(?: |$)/, 'dewPointC'],
  [/humid|feuchte|(?:^| )(rh|rf|rel\.? ?hum)(?: |$)/, 'relativeHumidity'],
  [/gust|böe|boe|spitze|max.?wind/, 'windGustMPerS'],
  [/wind.*(dir|richt)|(?:^| )(wd|dir|drct)(?: |$)|windricht/, 'windDirectionDeg'],
  [/wind|(?:^| )(ws|ff|sknt)(?: |$)/, 'windSpeedMPerS'],
  [/(precip|niederschlag).*(type|kind|sit|art)|(?:^| )ptype(?: |$)|wetterart/, 'precipitationType'],
  [/precip|rain|niederschlag|regen|(?:^| )(rr|p01i|pcpn)(?: |$)/, 'precipitationMm'],
  [/solar|radiat|global|strahlung|irradi|(?:^| )(ghi|srad)(?: |$)/, 'solarWPerM2'],
  [/visib|sichtweite|(?:^| )vis(?: |$)/, 'visibilityM'],
  [/air|luft|temp|(?:^| )(ta|tl|tmpf|tmpc|t)(?: |$)/, 'airTempC'],
];

const units: readonly (readonly [RegExp, FileUnitName])[] = [
  [/kj/, 'kJ/m²'],
  [/w ?\/ ?m|wm-2|w m-2/, 'W/m²'],
  [/km ?\/ ?h|kph|kmh/, 'km/h'],
  [/mph|mi ?\/ ?h|miles? per/, 'mph'],
  [/kn(?:ots?)?\b|kts?\b|sknt/, 'kn'],
  [/m ?\/ ?s|mps\b|m s-1/, 'm/s'],
  [/mm ?\/ ?h/, 'mm/h'],
  [/in ?\/ ?h/, 'in/h'],
  [/°? ?f\b|fahrenheit|tmpf|_f\b|\bdeg ?f/, '°F'],
  [/° ?c\b|celsius|_c\b|\bdeg ?c|\(c\)|\[c\]/, '°C'],
  [/\bmm\b/, 'mm'],
  [/\bin(?:ch(?:es)?)?\b|p01i/, 'in'],
  [/\bkm\b/, 'km'],
  [/\bmi(?:les?)?\b/, 'mile'],
  [/\bft\b|feet/, 'ft'],
  [/\bm\b|met(?:re|er)s?/, 'm'],
  [/%|percent|prozent/, '%'],
  [/\bk\b|kelvin/, 'K'],
  [/°|deg|grad/, '°'],
];

/** `airTemp_C` as `air temp_c`: words apart, small letters. */
const plain = (name: string) => name.replace(/([a-zäöü])([A-Z])/g, '$1 $2').toLowerCase();
const spaced = (name: string) =>
  plain(name)
    .replace(/[^a-z0-9äöüß.]+/g, ' ')
    .trim();

function unitByHead(name: string, quantity: ReadingQuantity): FileUnitName | null {
  const fitting = unitsOf(quantity);
  return units.find(([pattern, unit]) => fitting.includes(unit) && pattern.test(plain(name)))?.[1] ?? null;
}

const fallback: Partial<Readonly<Record<ReadingQuantity, FileUnitName>>> = {
  precipitationMm: 'mm',
  solarWPerM2: 'W/m²',
  visibilityM: 'm',
};

const isWhole = (values: readonly number[]) => values.every(Number.isInteger);
const share = (values: readonly number[], test: (value: number) => boolean) =>
  values.filter(test).length / Math.max(1, values.length);

/** The unit that the size of the numbers speaks for, where the head names none. */
function unitByValues(quantity: ReadingQuantity, values: readonly number[]): FileUnitName {
  const usual = fallback[quantity] ?? unitsOf(quantity)[0] ?? 'word';
  const { family } = quantityFacts[quantity];
  const codes = values.filter((value) => [1001, 65535, 361, 1000001].includes(value)).length > 0;
  const sound = values.filter((value) => Math.abs(value) < 900);
  if (family === 'temperature') {
    if (isWhole(values) && (codes || share(sound, (value) => Math.abs(value) > 60) > 0.3)) return '0.1 °C';
    return share(values, (value) => value > 200 && value < 330) > 0.9 ? 'K' : '°C';
  }
  if (family === 'fraction') return share(values, (value) => value >= 0 && value <= 1) > 0.95 ? '0 to 1' : '%';
  if (family === 'speed') return isWhole(values) && codes ? '0.1 m/s' : usual;
  if (family === 'flux') return values.some((value) => value > 1500) ? 'kJ/m²' : usual;
  if (family === 'distance') return isWhole(values) && codes ? '0.1 m' : usual;
  return usual;
}

const missingOf = (unit: FileUnitName): readonly string[] => factsOfUnit(unit)?.missing ?? [];

export interface ColumnGuess {
  columns: ColumnMapping[];
  doubts: Doubt[];
}

/**
 * What each column measures, by its head and the size of its numbers; columns that say nothing are left out. The first
 * column of a kind is taken: a second probe is a second station.
 */
export function guessColumns(
  names: readonly string[],
  numbersOf: (index: number) => number[],
  stepMin: number,
): ColumnGuess {
  const columns: ColumnMapping[] = [];
  const doubts: Doubt[] = [];
  const unnamed: string[] = [];
  names.forEach((name, index) => {
    const head = spaced(name);
    const quantity = heads.find(([pattern]) => pattern.test(head))?.[1];
    if (!quantity) return;
    const label = quantityFacts[quantity].label.toLowerCase();
    if (columns.some((column) => column.quantity === quantity)) {
      doubts.push({ part: name, sentence: `“${name}” looks like a second ${label} and is left out.` });
      return;
    }
    const named = unitByHead(name, quantity);
    const unit = named ?? unitByValues(quantity, numbersOf(index));
    if (!named && unit !== 'word') unnamed.push(`${unit} for “${name}”`);
    const intervalMin = unit !== 'word' && 'needsInterval' in fileUnits[unit] ? stepMin : USUAL_INTERVAL_MIN;
    columns.push({
      column: name,
      quantity,
      unit,
      clock: null,
      missing: missingOf(unit),
      intervalMin,
      timeIs: 'end',
    });
  });
  if (unnamed.length > 0) {
    const sentence = `Where the head names no unit, the size of the numbers speaks for it: ${unnamed.join(', ')}.`;
    doubts.push({ part: 'units', sentence });
  }
  return { columns, doubts };
}
