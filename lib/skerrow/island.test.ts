import { describe, expect, it } from 'vitest';
import { heightM, makeLand } from './land';
import { legsOf, toLonLat } from './plane';
import { materials, people, stations, trucks, yards } from './people';
import { createRandom } from './random';
import { makeRoads } from './roads';
import { skerrowSeed } from './skerrow-seed';
import { placeBeside, standingRoutes } from './standing-routes';
import { stationCount } from './weather';

const land = makeLand(skerrowSeed);
const network = makeRoads(land, skerrowSeed);

describe('the land of Skerrow', () => {
  it('is some 22 by 16 km in the open ocean about 61.4° N 10.2° W', () => {
    const lons = land.coast.map((point) => toLonLat(point)[0]);
    const lats = land.coast.map((point) => toLonLat(point)[1]);
    const widthKm = (Math.max(...lons) - Math.min(...lons)) * 53.42;
    const depthKm = (Math.max(...lats) - Math.min(...lats)) * 111.436;
    expect(widthKm).toBeGreaterThan(20.5);
    expect(widthKm).toBeLessThan(23.5);
    expect(depthKm).toBeGreaterThan(14.5);
    expect(depthKm).toBeLessThan(17);
    expect(land.coast.length).toBeGreaterThan(150);
    expect(land.coast[0]).toEqual(land.coast.at(-1));
  });

  it('rises to about 420 m in two tops and is sea level off the coast', () => {
    const heights: number[] = [];
    for (let xM = -9000; xM < 9000; xM += 120) {
      for (let yM = -7000; yM < 7500; yM += 120) heights.push(land.heightAt({ xM, yM }));
    }
    const top = Math.max(...heights);
    expect(top).toBeGreaterThan(390);
    expect(top).toBeLessThan(450);
    expect(land.contours.filter(({ heightM: level }) => level === 300).length).toBeGreaterThanOrEqual(2);
    expect(heightM(land, 61.5, -10.6)).toBe(0);
    expect(heightM(land, 61.4327, -10.1747)).toBeGreaterThan(300);
  });

  it('has rivers that end in the sea or in another river, and contours that close', () => {
    expect(land.rivers.length).toBe(3);
    for (const { line } of land.contours) expect(legsOf(line).length).toBeGreaterThan(6);
    expect(land.seaNames.map(({ name }) => name)).toContain('Sound of Orr');
  });

  it('is drawn by a generator whose first numbers are known: mulberry32 from 1', () => {
    const random = createRandom(1);
    expect([random(), random()].map((value) => value.toFixed(6))).toEqual(['0.627074', '0.002736']);
  });
});

describe('the people and things of Skerrow', () => {
  it('are two dispatchers, ten drivers, a supervisor, two yard hands, an administrator and an observer', () => {
    const count = (role: string) => people.filter((person) => person.role === role).length;
    expect(['dispatcher', 'driver', 'supervisor', 'yard', 'administrator', 'observer'].map(count)).toEqual([
      2, 10, 1, 2, 1, 1,
    ]);
    expect(new Set(people.map(({ email }) => email)).size).toBe(people.length);
    expect(people.every(({ email }) => email.endsWith('@skerrow.example'))).toBe(true);
  });

  it('have places: yards and stations stand beside roads that exist', () => {
    for (const { besideRoad } of [...yards, ...stations])
      expect(land.isLand(placeBeside(network, besideRoad)) || besideRoad === 'Skail Bridge deck').toBe(true);
    expect(stations.length).toBe(stationCount);
    expect(() => placeBeside(network, 'Nowhere Lane')).toThrow(RangeError);
  });

  it('mix pre-wet salt of the composition its parts give', () => {
    const prewet = materials.find(({ form }) => form === 'prewet');
    const parts = (name: string | undefined) => materials.find((material) => material.name === name);
    const mixed = prewet?.mixedFrom;
    const share = mixed?.liquidMassFraction ?? 0;
    const nacl =
      (1 - share) * (parts(mixed?.solid)?.composition.NaCl ?? 0) +
      share * (parts(mixed?.liquid)?.composition.NaCl ?? 0);
    expect(prewet?.composition.NaCl).toBeCloseTo(nacl, 3);
  });

  it('drive eight standing routes that together do every segment once', () => {
    const routes = standingRoutes(network);
    const keys = routes.flatMap(({ segmentKeys }) => segmentKeys);
    expect(routes.length).toBe(8);
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys.length).toBe(network.segments.length);
    expect(new Set(routes.map(({ truckNumber }) => truckNumber)).size).toBe(trucks.length);
    for (const route of routes) expect(route.segmentKeys.length, route.name).toBeGreaterThan(15);
  });
});
