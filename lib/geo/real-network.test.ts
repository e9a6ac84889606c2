import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { buildNetwork } from './build-network';
import { readGeoJson } from './read-geojson';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');
const file = path.resolve(root, '../shared/data/networks/north-bayreuth.geojson');
const isThere = existsSync(file);
const title = isThere ? 'a real network (OpenStreetMap, ODbL)' : `a real network: skipped, ${file} is not there`;

interface Raw {
  features: { properties: Record<string, string>; geometry: { coordinates: [number, number][] } }[];
}

describe.skipIf(!isThere)(title, () => {
  const text = isThere ? readFileSync(file, 'utf8') : '';
  const reading = readGeoJson(text);
  const network = buildNetwork(reading.ok ? reading.lines : []);
  const raw = isThere ? (JSON.parse(text) as Raw).features : [];

  it('has the nodes and segments that counting shared vertices by hand gives', () => {
    // independent of the importer: no rounding, no runs, only how often a vertex is written, and where
    const written = new Map<string, number>();
    const ends = new Set<string>();
    for (const { geometry } of raw) {
      geometry.coordinates.forEach((place, at) => {
        written.set(String(place), (written.get(String(place)) ?? 0) + 1);
        if (at === 0 || at === geometry.coordinates.length - 1) ends.add(String(place));
      });
    }
    const isNode = (place: [number, number]) => ends.has(String(place)) || (written.get(String(place)) ?? 0) > 1;
    const inner = raw.flatMap(({ geometry }) => geometry.coordinates.slice(1, -1)).filter(isNode).length;
    expect(network.segments).toHaveLength(raw.length + inner);
    expect(network.nodes).toHaveLength([...written].filter(([place, times]) => times > 1 || ends.has(place)).length);
    expect(network.report).toMatchObject({ linesRead: 725, linesUsed: 725, segments: 1028, nodes: 919 });
  });

  it('is 192 km long: the great-circle length of all lines, within what the ellipsoid differs from the sphere', () => {
    const radians = (degrees: number) => (degrees * Math.PI) / 180;
    let sphereM = 0;
    for (const { geometry } of raw) {
      geometry.coordinates.forEach(([lon, lat], at) => {
        const [lonBefore, latBefore] = geometry.coordinates[at - 1] ?? [lon, lat];
        const chord =
          Math.sin(radians(lat - latBefore) / 2) ** 2 +
          Math.cos(radians(lat)) * Math.cos(radians(latBefore)) * Math.sin(radians(lon - lonBefore) / 2) ** 2;
        sphereM += 2 * 6_371_008.8 * Math.asin(Math.sqrt(chord));
      });
    }
    expect(Math.round(network.report.lengthKm)).toBe(192);
    expect(Math.abs(network.report.lengthKm * 1000 - sphereM) / sphereM).toBeLessThan(0.003);
  });

  it('keeps the 102 tagged one-ways as drawn, and assumes lanes exactly where no lane tag is', () => {
    const tagged = raw.filter(({ properties }) => properties.oneway === 'yes').length;
    const oneWayLines = new Set(network.segments.filter(({ isOneWay }) => isOneWay).map(({ sourceId }) => sourceId));
    expect(oneWayLines.size).toBe(tagged);
    const assumedLines = new Set(
      network.segments.filter(({ assumed }) => assumed.includes('lanes')).map(({ sourceId }) => sourceId),
    );
    const untagged = raw.filter(
      ({ properties }) => !properties.lanes && !properties.other_tags?.includes('"lanes:forward"'),
    );
    expect(assumedLines.size).toBe(untagged.length);
  });

  it('reads bridges, drops nothing, and gives every segment a key of its own', () => {
    const bridges = raw.filter(({ properties }) => properties.bridge === 'yes').length;
    expect(network.report.bridges).toBe(bridges);
    expect(network.report).toMatchObject({ duplicates: [], zeroLength: [], skipped: {} });
    expect(new Set(network.segments.map(({ sourceKey }) => sourceKey)).size).toBe(network.segments.length);
    expect(network.report.components).toHaveLength(9);
  });
});
