import { describe, expect, it } from 'vitest';
import { readGeoJson, readGeoJsonValue } from './read-geojson';

const line = (coordinates: unknown, properties: unknown = { highway: 'tertiary' }) => ({
  type: 'Feature',
  properties,
  geometry: { type: 'LineString', coordinates },
});
const collection = (...features: unknown[]) => ({ type: 'FeatureCollection', features });
const refused = (value: unknown) => {
  const reading = typeof value === 'string' ? readGeoJson(value) : readGeoJsonValue(value);
  if (reading.ok) throw new Error('was read');
  return reading;
};
const road = [
  [11.5, 50],
  [11.51, 50],
];

describe('what is read', () => {
  it('takes LineStrings, pieces of MultiLineStrings, lines in collections and a single Feature', () => {
    const reading = readGeoJsonValue(
      collection(
        line(road),
        { type: 'Feature', properties: null, geometry: { type: 'MultiLineString', coordinates: [road, road] } },
        {
          type: 'Feature',
          properties: {},
          geometry: { type: 'GeometryCollection', geometries: [{ type: 'LineString', coordinates: road }] },
        },
      ),
    );
    expect(reading.ok && reading.lines).toHaveLength(4);
    expect(readGeoJsonValue(line(road)).ok).toBe(true);
  });

  it('reads a byte order mark, a third coordinate as mean height, and an empty crs', () => {
    const value = {
      ...collection(
        line([
          [11.5, 50, 400],
          [11.51, 50, 410],
        ]),
      ),
      crs: null,
    };
    const reading = readGeoJson(`\uFEFF${JSON.stringify(value)}\n`);
    expect(reading.ok && reading.lines[0]).toMatchObject({ heightM: 405, positions: road });
  });

  it('gives every tag as text under a small-letter key, and unpacks other_tags without covering a column', () => {
    const reading = readGeoJsonValue(
      collection(
        line(road, {
          OSM_ID: 77,
          HIGHWAY: 'primary',
          lit: true,
          lanes: null,
          width: '3',
          other_tags: '"width"=>"9","bridge"=>"yes"',
        }),
      ),
    );
    expect(reading.ok && reading.lines[0]).toMatchObject({
      sourceId: '77',
      tags: { osm_id: '77', highway: 'primary', lit: 'yes', width: '3', bridge: 'yes' },
    });
  });

  it('counts points, polygons, missing geometry and broken lines, and drops none silently', () => {
    const reading = readGeoJsonValue(
      collection(
        line(road),
        { type: 'Feature', properties: {}, geometry: { type: 'Point', coordinates: [1, 2] } },
        { type: 'Feature', properties: {}, geometry: { type: 'Polygon', coordinates: [] } },
        { type: 'Feature', properties: {}, geometry: null },
        line([[1, 'x']]),
        line([]),
        'nonsense',
      ),
    );
    expect(reading.ok && reading.skipped).toEqual({
      Point: 1,
      Polygon: 1,
      'no geometry': 2,
      'line with unreadable coordinates': 2,
    });
  });

  it('says when several lines carry one id', () => {
    const reading = readGeoJsonValue(
      collection(
        { ...line(road), id: 5 },
        {
          ...line([
            [1, 1],
            [2, 2],
          ]),
          id: 5,
        },
      ),
    );
    expect(reading.ok && reading.warnings).toMatchObject([{ kind: 'repeated-id', sourceIds: ['5'] }]);
  });
});

describe('what is refused, and the sentence', () => {
  it.each([
    ['', 'empty', /empty/],
    ['  \n', 'empty', /empty/],
    ['{"type":"FeatureCollection","features":[{"type":"Feat', 'not-json', /breaks off/],
    ['{"type":"FeatureCollection" "features":[]}', 'not-json', /not valid JSON/],
    ['<gpx></gpx>', 'not-json', /XML/],
    ['PK\u0003\u0004', 'not-json', /zip/],
    ['id,name\n1,x', 'not-json', /not a JSON/],
    ['{"type":"Feature"}\n{"type":"Feature"}', 'not-json', /one feature a line/],
    ['[1,2]', 'not-geojson', /FeatureCollection/],
    ['{"hello":1}', 'not-geojson', /FeatureCollection/],
    ['{"type":"Topology"}', 'not-geojson', /TopoJSON/],
    ['{"type":"FeatureCollection","features":[]}', 'no-lines', /no features/],
  ] as const)('%j → %s', (text, reason, sentence) => {
    expect(refused(text)).toMatchObject({ reason, sentence: expect.stringMatching(sentence) as string });
  });

  it('points only: says what was found instead of lines', () => {
    const point = { type: 'Feature', properties: {}, geometry: { type: 'Point', coordinates: [1, 2] } };
    expect(refused(collection(point, point)).sentence).toContain('2 × Point');
  });

  it('projected metres are not WGS 84, whether the crs says so or only the numbers do', () => {
    const metres = line([
      [4468000, 5545000],
      [4468100, 5545000],
    ]);
    expect(refused(collection(line(road), metres))).toMatchObject({ reason: 'other-coordinates' });
    const named = { ...collection(line(road)), crs: { properties: { name: 'urn:ogc:def:crs:EPSG::25832' } } };
    expect(refused(named).sentence).toContain('25832');
  });

  it.each(['urn:ogc:def:crs:OGC:1.3:CRS84', 'EPSG:4326', 'urn:ogc:def:crs:EPSG::4326'])('%s is WGS 84', (name) => {
    expect(readGeoJsonValue({ ...collection(line(road)), crs: { properties: { name } } }).ok).toBe(true);
  });

  it('latitude first, where the longitude is beyond 90, is called swapped', () => {
    const swapped = line([
      [40.1, -100.2],
      [40.2, -100.2],
    ]);
    expect(refused(collection(swapped))).toMatchObject({ reason: 'swapped-coordinates' });
  });
});
