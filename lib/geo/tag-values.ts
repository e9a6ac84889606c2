import { MILE_KM } from './limits';

/** What could be made of a speed tag. */
export type SpeedReading = { kind: 'speed'; speedKmPerH: number } | { kind: 'no-limit' } | { kind: 'unreadable' };

/** Legal speeds outside signs, km/h, by country and zone word; the usual statutory figures, as drivers learn them. */
const zoneSpeedKmPerH: Readonly<Record<string, number>> = {
  'DE:urban': 50,
  'DE:rural': 100,
  'DE:living_street': 7,
  'DE:zone30': 30,
  'AT:urban': 50,
  'AT:rural': 100,
  'AT:motorway': 130,
  'AT:trunk': 100,
  'CH:urban': 50,
  'CH:rural': 80,
  'CH:trunk': 100,
  'CH:motorway': 120,
  'CZ:urban': 50,
  'CZ:rural': 90,
  'FR:urban': 50,
  'FR:rural': 80,
  'FR:motorway': 130,
  'FI:urban': 50,
  'FI:rural': 80,
  'SE:urban': 50,
  'SE:rural': 70,
  'NO:urban': 50,
  'NO:rural': 80,
  'PL:urban': 50,
  'PL:rural': 90,
  'IT:urban': 50,
  'IT:rural': 90,
  'GB:nsl_restricted': 30 * MILE_KM,
  'GB:nsl_single': 60 * MILE_KM,
  'GB:nsl_dual': 70 * MILE_KM,
  'GB:motorway': 70 * MILE_KM,
  'UK:nsl_restricted': 30 * MILE_KM,
  'UK:nsl_single': 60 * MILE_KM,
  'UK:nsl_dual': 70 * MILE_KM,
  'UK:motorway': 70 * MILE_KM,
};

const WALKING_KM_PER_H = 7;
const KNOT_KM_PER_H = 1.852;

/**
 * A speed limit in km/h from an open road tag: `50`, `30 mph`, `walk`, `DE:rural`, `none`, and lists (`70;50`, of
 * which the lowest counts). Numbers without a unit are km/h. `30 mph` is 48.28 km/h.
 */
export function readSpeed(text: string): SpeedReading {
  const readings = text.split(/[;|]/).map((part) => readOneSpeed(part.trim()));
  const speeds = readings.flatMap((reading) => (reading.kind === 'speed' ? [reading.speedKmPerH] : []));
  if (speeds.length > 0) return { kind: 'speed', speedKmPerH: Math.min(...speeds) };
  return readings.find((reading) => reading.kind === 'no-limit') ?? { kind: 'unreadable' };
}

function readOneSpeed(text: string): SpeedReading {
  if (text === 'none') return { kind: 'no-limit' };
  if (text === 'walk') return { kind: 'speed', speedKmPerH: WALKING_KM_PER_H };
  const zone = Object.hasOwn(zoneSpeedKmPerH, text) ? zoneSpeedKmPerH[text] : undefined;
  if (zone !== undefined) return { kind: 'speed', speedKmPerH: zone };
  const found = /^(\d+(?:[.,]\d+)?)\s*(km\/h|kmh|kph|mph|knots)?$/i.exec(text);
  if (!found?.[1]) return { kind: 'unreadable' };
  const speed = Number(found[1].replace(',', '.'));
  const unit = found[2]?.toLowerCase();
  const factor = unit === 'mph' ? MILE_KM : unit === 'knots' ? KNOT_KM_PER_H : 1;
  return speed > 0 ? { kind: 'speed', speedKmPerH: speed * factor } : { kind: 'unreadable' };
}

/**
 * A width in metres from an open road tag: `3.5`, `3,5 m`, `350 cm`, `12 ft`, `12'`, `10'6"`; null when it cannot be
 * read or is not positive. `12'` is 3.6576 m.
 */
export function readWidthM(text: string): number | null {
  const trimmed = text.trim().replace(',', '.');
  const feet = /^(\d+(?:\.\d+)?)\s*(?:'|ft|feet)\s*(?:(\d+(?:\.\d+)?)\s*(?:"|in))?$/i.exec(trimmed);
  if (feet?.[1]) return positive(Number(feet[1]) * 0.3048 + Number(feet[2] ?? 0) * 0.0254);
  const metric = /^~?(\d+(?:\.\d+)?)\s*(m|cm|metres|meters)?$/i.exec(trimmed);
  if (!metric?.[1]) return null;
  return positive(Number(metric[1]) * (metric[2]?.toLowerCase() === 'cm' ? 0.01 : 1));
}

/** A number of lanes, whole and 1 or more, from a tag: `2`; of a list (`2;3`) the lowest; null when unreadable. */
export function readLanes(text: string): number | null {
  const counts = text.split(/[;|]/).map((part) => (/^\s*\d+(\.\d+)?\s*$/.test(part) ? Math.floor(Number(part)) : 0));
  const lowest = Math.min(...counts);
  return lowest >= 1 ? lowest : null;
}

function positive(value: number): number | null {
  return value > 0 ? value : null;
}
