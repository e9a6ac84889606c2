import { parseHstore } from './hstore';
import { type NetworkWarning, type SourceLine } from './network';
import { type Position } from './position';

export type GeoJsonFault =
  'empty' | 'not-json' | 'not-geojson' | 'other-coordinates' | 'swapped-coordinates' | 'no-lines';

export type GeoJsonReading =
  | { ok: true; lines: SourceLine[]; skipped: Record<string, number>; warnings: NetworkWarning[] }
  | { ok: false; reason: GeoJsonFault; sentence: string };

type Plain = Readonly<Record<string, unknown>>;
type Failure = Extract<GeoJsonReading, { ok: false }>;

const WGS84_NAMES = /(CRS:?84|EPSG:(:|\d|\.)*4326|EPSG:(:|\d|\.)*4979)$/i;

/**
 * Reads the text of a GeoJSON file (RFC 7946, WGS 84) into lines with tags. A FeatureCollection or one Feature;
 * LineStrings are taken as they are, MultiLineStrings in pieces, every third coordinate as height; other geometry is
 * skipped and counted. What cannot be read answers `ok: false` with a sentence that says what to do.
 */
export function readGeoJson(text: string): GeoJsonReading {
  const trimmed = text.replace(/^\uFEFF/, '').trim();
  if (trimmed === '') return failure('empty', 'The file is empty. Choose a GeoJSON file that holds road lines.');
  try {
    return readGeoJsonValue(JSON.parse(trimmed));
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    return failure('not-json', whyNotJson(trimmed));
  }
}

/** Like `readGeoJson`, of a value that has been parsed already. */
export function readGeoJsonValue(value: unknown): GeoJsonReading {
  const found = findFeatures(value);
  if ('ok' in found) return found;
  const { features } = found;
  const gathering: Gathering = { lines: [], skipped: {}, warnings: [] };
  for (const feature of features) gatherFeature(feature, gathering);
  return judge(gathering, features.length);
}

interface Gathering {
  lines: SourceLine[];
  skipped: Record<string, number>;
  warnings: NetworkWarning[];
}

function failure(reason: GeoJsonFault, sentence: string): Failure {
  return { ok: false, reason, sentence };
}

function whyNotJson(text: string): string {
  if (text.startsWith('<')) return 'This is an XML file (perhaps GPX, KML or OSM). Export the roads as GeoJSON.';
  if (text.startsWith('PK')) return 'This is a zip archive. Unpack it and choose the GeoJSON file inside.';
  if (/^\{.*\}\s*\n\s*\{/.test(text) && !/\]\s*\}\s*$/.test(text)) {
    return 'This file has one feature a line. Export it as one GeoJSON FeatureCollection.';
  }
  if (/^[{[]/.test(text)) {
    const last = text.at(-1) ?? '';
    return '}]'.includes(last)
      ? 'The file is not valid JSON. Export it again, and do not edit it by hand.'
      : 'The file breaks off before its end: it was cut while copying or downloading. Fetch it again.';
  }
  return 'This is not a JSON file. Choose a GeoJSON file that holds road lines.';
}

function isPlain(value: unknown): value is Plain {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function findFeatures(value: unknown): { features: readonly unknown[] } | Failure {
  if (!isPlain(value)) {
    return failure('not-geojson', 'The file holds JSON, but no GeoJSON FeatureCollection.');
  }
  const crs = otherCrs(value);
  if (crs !== null) {
    return failure('other-coordinates', `The file says its coordinates are ${crs}. Export it in WGS 84 (EPSG:4326).`);
  }
  if (value.type === 'Feature') return { features: [value] };
  if (value.type === 'Topology') {
    return failure('not-geojson', 'This is TopoJSON. Export the roads as GeoJSON.');
  }
  if (value.type !== 'FeatureCollection' || !Array.isArray(value.features)) {
    return failure('not-geojson', 'The file holds JSON, but no GeoJSON FeatureCollection.');
  }
  return { features: value.features };
}

function otherCrs(value: Plain): string | null {
  const properties = isPlain(value.crs) ? value.crs.properties : undefined;
  const name = isPlain(properties) && typeof properties.name === 'string' ? properties.name : null;
  return name === null || WGS84_NAMES.test(name) ? null : name;
}

function count(gathering: Gathering, what: string): void {
  gathering.skipped[what] = (gathering.skipped[what] ?? 0) + 1;
}

function gatherFeature(feature: unknown, gathering: Gathering): void {
  if (!isPlain(feature) || !isPlain(feature.geometry)) {
    count(gathering, 'no geometry');
    return;
  }
  const tags = readTags(isPlain(feature.properties) ? feature.properties : {});
  const sourceId = readSourceId(feature, tags);
  for (const piece of linesOf(feature.geometry, gathering)) {
    const line = readLine(piece);
    if (line) gathering.lines.push({ sourceId, tags, ...line });
    else count(gathering, 'line with unreadable coordinates');
  }
}

const otherGeometry = ['Point', 'MultiPoint', 'Polygon', 'MultiPolygon'];

function linesOf(geometry: Plain, gathering: Gathering): readonly unknown[] {
  if (geometry.type === 'LineString') return [geometry.coordinates];
  if (geometry.type === 'MultiLineString' && Array.isArray(geometry.coordinates)) return geometry.coordinates;
  if (geometry.type === 'GeometryCollection' && Array.isArray(geometry.geometries)) {
    return geometry.geometries.flatMap((part) => (isPlain(part) ? linesOf(part, gathering) : []));
  }
  const isNamed = otherGeometry.some((type) => type === geometry.type);
  count(gathering, isNamed ? String(geometry.type) : 'unknown geometry');
  return [];
}

function readLine(coordinates: unknown): Pick<SourceLine, 'positions' | 'heightM'> | null {
  if (!Array.isArray(coordinates) || coordinates.length === 0) return null;
  const positions: Position[] = [];
  let heightSumM = 0;
  let heights = 0;
  for (const place of coordinates as readonly unknown[]) {
    if (!Array.isArray(place)) return null;
    const [lonDeg, latDeg, heightM] = place as readonly unknown[];
    if (!isFiniteNumber(lonDeg) || !isFiniteNumber(latDeg)) return null;
    positions.push([lonDeg, latDeg]);
    if (isFiniteNumber(heightM)) {
      heightSumM += heightM;
      heights += 1;
    }
  }
  return { positions, heightM: heights > 0 ? heightSumM / heights : null };
}

function isFiniteNumber(value: unknown): value is number {
  return typeof value === 'number' && Number.isFinite(value);
}

/** Keys in lower case; numbers and yes/no values as text; `other_tags` unpacked, without covering a column. */
function readTags(properties: Plain): Record<string, string> {
  const tags: Record<string, string> = {};
  const nested = isPlain(properties.tags) ? properties.tags : {};
  for (const [key, value] of [...Object.entries(nested), ...Object.entries(properties)]) {
    const text = tagText(value);
    if (text !== null) tags[key.toLowerCase()] = text;
  }
  for (const column of ['other_tags', 'tags', 'all_tags']) {
    const packed = tags[column];
    if (packed === undefined || !packed.includes('=>')) continue;
    delete tags[column];
    for (const [key, value] of Object.entries(parseHstore(packed))) tags[key.toLowerCase()] ??= value;
  }
  return tags;
}

function tagText(value: unknown): string | null {
  if (typeof value === 'string') return value.trim() === '' ? null : value.trim();
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  return isFiniteNumber(value) ? String(value) : null;
}

const idKeys = ['osm_id', '@id', 'osm_way_id', 'full_id', 'id', 'way_id', 'gid', 'objectid', 'fid', 'segment_id'];

function readSourceId(feature: Plain, tags: Readonly<Record<string, string>>): string {
  const own = tagText(feature.id);
  if (own !== null) return own;
  for (const key of idKeys) {
    const value = tags[key];
    if (value !== undefined) return value;
  }
  return '';
}

function judge(gathering: Gathering, featureCount: number): GeoJsonReading {
  const { lines, skipped, warnings } = gathering;
  if (lines.length === 0) return failure('no-lines', noLinesSentence(skipped, featureCount));
  const outside = lines.flatMap((line) => line.positions).find((place) => isOutsideWgs84(place));
  if (!outside) return { ok: true, lines, skipped, warnings: [...warnings, ...repeatedIds(lines)] };
  const isSwapped = lines.every((line) => line.positions.every(([lon, lat]) => !isOutsideWgs84([lat, lon])));
  return isSwapped
    ? failure(
        'swapped-coordinates',
        `The coordinates look swapped (${outside[0]}, ${outside[1]}): GeoJSON writes longitude first. Export the file again.`,
      )
    : failure(
        'other-coordinates',
        `The coordinates (${outside[0]}, ${outside[1]}) look projected, not WGS 84. Export the file in WGS 84 (EPSG:4326).`,
      );
}

function isOutsideWgs84([lonDeg, latDeg]: Position): boolean {
  return Math.abs(lonDeg) > 180 || Math.abs(latDeg) > 90;
}

function noLinesSentence(skipped: Readonly<Record<string, number>>, featureCount: number): string {
  if (featureCount === 0) return 'The file holds no features at all. Choose a file with road lines.';
  const found = Object.entries(skipped).map(([what, times]) => `${times} × ${what}`);
  return `The file holds no lines (found: ${found.join(', ') || 'empty geometry'}). Roads are imported from their centre lines.`;
}

function repeatedIds(lines: readonly SourceLine[]): NetworkWarning[] {
  const times = new Map<string, number>();
  for (const { sourceId } of lines) if (sourceId !== '') times.set(sourceId, (times.get(sourceId) ?? 0) + 1);
  const repeated = [...times].filter(([, count]) => count > 1).map(([id]) => id);
  if (repeated.length === 0) return [];
  const sentence =
    repeated.length === 1
      ? `The id ${repeated[0]} is on several lines; each is kept as a road of its own.`
      : `${repeated.length} ids are on several lines each; every line is kept as a road of its own.`;
  const first = lines.find((line) => line.sourceId === repeated[0]);
  return [{ kind: 'repeated-id', sentence, sourceIds: repeated.slice(0, 50), at: first?.positions[0] ?? null }];
}
