import { describe, expect, it } from 'vitest';
import { makeLand } from './land';
import { crossing, distanceM, legsOf, lineLengthM, pointAlong } from './plane';
import { makeRoads, type RoadSegment } from './roads';
import { skerrowSeed } from './skerrow-seed';

const land = makeLand(skerrowSeed);
const network = makeRoads(land, skerrowSeed);
const { nodes, segments } = network;

function reachable(start: string, next: ReadonlyMap<string, string[]>): number {
  const reached = new Set([start]);
  const open = [start];
  for (let key = open.pop(); key !== undefined; key = open.pop()) {
    for (const neighbour of next.get(key) ?? []) {
      if (!reached.has(neighbour)) {
        reached.add(neighbour);
        open.push(neighbour);
      }
    }
  }
  return reached.size;
}

function driveable(isForward: boolean): Map<string, string[]> {
  const next = new Map<string, string[]>();
  const add = (from: string, to: string) => next.set(from, [...(next.get(from) ?? []), to]);
  for (const { fromNodeKey, toNodeKey, isOneWay } of segments) {
    if (isForward || !isOneWay) add(fromNodeKey, toNodeKey);
    if (!isForward || !isOneWay) add(toNodeKey, fromNodeKey);
  }
  return next;
}

function meetAwayFromNodes(a: RoadSegment, b: RoadSegment): string[] {
  const shared = nodes.filter(
    ({ key }) => [a.fromNodeKey, a.toNodeKey].includes(key) && [b.fromNodeKey, b.toNodeKey].includes(key),
  );
  return legsOf(a.line).flatMap((legA) =>
    legsOf(b.line).flatMap((legB) => {
      const hit = crossing(legA, legB);
      if (!hit) return [];
      const at = {
        xM: legA[0].xM + (legA[1].xM - legA[0].xM) * hit.alongFirst,
        yM: legA[0].yM + (legA[1].yM - legA[0].yM) * hit.alongFirst,
      };
      return shared.some((node) => distanceM(node.at, at) < 1) ? [] : [`${a.name} × ${b.name}`];
    }),
  );
}

describe('the roads of Skerrow', () => {
  it('are 340 segments, give or take 15, and 400 lane-km, give or take 25', () => {
    const laneKm = segments.reduce((sum, { lengthM, lanes }) => sum + (lengthM * lanes) / 1000, 0);
    expect(segments.length).toBeGreaterThanOrEqual(325);
    expect(segments.length).toBeLessThanOrEqual(355);
    expect(laneKm).toBeGreaterThan(375);
    expect(laneKm).toBeLessThan(425);
  });

  it('let a truck drive from anywhere to anywhere and back, one-way streets kept', () => {
    const start = nodes[0]?.key ?? '';
    expect(segments.filter(({ isOneWay }) => isOneWay).length).toBeGreaterThan(8);
    expect(reachable(start, driveable(true))).toBe(nodes.length);
    expect(reachable(start, driveable(false))).toBe(nodes.length);
  });

  it('never run through the sea, except on their two bridges over it', () => {
    const wet = segments.filter(({ line }) =>
      Array.from({ length: Math.ceil(lineLengthM(line) / 15) }, (_, step) => pointAlong(line, step * 15)).some(
        (point) => !land.isLand(point),
      ),
    );
    expect(wet.map(({ name }) => name).sort()).toEqual(['Skail Bridge deck', 'Sound Bridge deck']);
  });

  it('cross each other only at nodes', () => {
    const met = segments.flatMap((a, index) => segments.slice(index + 1).flatMap((b) => meetAwayFromNodes(a, b)));
    expect(met).toEqual([]);
  });

  it('cross rivers only on bridges', () => {
    const forded = segments
      .filter(({ isBridge }) => !isBridge)
      .filter(({ line }) =>
        land.rivers.some((river) =>
          legsOf(line).some((leg) => legsOf(river.line).some((other) => crossing(leg, other))),
        ),
      );
    expect(forded.map(({ name }) => name)).toEqual([]);
    expect(segments.filter(({ isBridge }) => isBridge).length).toBeGreaterThanOrEqual(9);
  });

  it('begin and end exactly at their nodes and are longer than 40 m', () => {
    const places = new Map(nodes.map(({ key, at }) => [key, at]));
    for (const { line, fromNodeKey, toNodeKey, lengthM, name } of segments) {
      expect(line[0], name).toEqual(places.get(fromNodeKey));
      expect(line.at(-1), name).toEqual(places.get(toNodeKey));
      expect(lengthM, name).toBeGreaterThan(40);
    }
  });

  it('all have a name of their own, the ones the trade talks about among them', () => {
    const names = segments.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    for (const name of [
      'Ridge Road, summit cut',
      'Moss Lane, north end',
      'Brannoch High Street',
      'Quarry Climb, upper',
    ]) {
      expect(names).toContain(name);
    }
  });

  it('have all four classes, three surfaces and five exposures', () => {
    expect(new Set(segments.map(({ serviceClass }) => serviceClass)).size).toBe(4);
    expect(new Set(segments.map(({ surface }) => surface)).size).toBe(3);
    expect(new Set(segments.map(({ exposure }) => exposure)).size).toBe(5);
  });

  it('are the same again from the same seed, and not from another', () => {
    expect(JSON.stringify(makeRoads(makeLand(skerrowSeed), skerrowSeed))).toBe(JSON.stringify(network));
    expect(JSON.stringify(makeRoads(land, skerrowSeed + 1))).not.toBe(JSON.stringify(network));
  });
});
