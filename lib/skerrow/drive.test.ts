import { describe, expect, it } from 'vitest';
import { type Ask, driveRoute } from './drive';
import { makeLand } from './land';
import { trucks } from './people';
import { createRandom } from './random';
import { makeRoads } from './roads';
import { skerrowSeed } from './skerrow-seed';
import { standingRoutes } from './standing-routes';
import { departuresOf, storms } from './storms';

const network = makeRoads(makeLand(skerrowSeed), skerrowSeed);
const byKey = new Map(network.segments.map((segment) => [segment.key, segment]));
const leavesAt = new Date('2026-12-01T18:00:00Z');
const later = (hours: number) => new Date(leavesAt.getTime() + hours * 3_600_000);

function drive(
  truckNumber: number,
  options: { rateGPerM2?: number; hours?: number; storm?: number; pass?: number } = {},
) {
  const { rateGPerM2 = 20, hours = 12, storm = 6, pass = 1 } = options;
  const truck = trucks.find(({ number }) => number === truckNumber);
  const route = standingRoutes(network).find((candidate) => candidate.truckNumber === truckNumber);
  if (!truck || !route) throw new Error('no such truck');
  const roads = route.segmentKeys.flatMap((key) => byKey.get(key) ?? []);
  const asks = new Map(
    roads.map(({ key }): [string, Ask] => [key, { materialName: 'Salt', rateGPerM2, isPloughed: true }]),
  );
  const departure = departuresOf(storm, pass, truckNumber);
  const run = driveRoute({ roads, asks, truck, departure, leavesAt, untilAt: later(hours) }, createRandom(5));
  return { run, roads, truck };
}

const spreadKg = ({ run, roads }: ReturnType<typeof drive>, key?: string) =>
  run.entries
    .filter(({ segmentKey }) => key === undefined || segmentKey === key)
    .reduce((sum, { segmentKey, rateGPerM2 }) => {
      const road = roads.find((candidate) => candidate.key === segmentKey);
      return sum + ((rateGPerM2 ?? 0) * (road?.lengthM ?? 0) * (road?.widthM ?? 0)) / 1000;
    }, 0);

describe('a driven route', () => {
  it('does every road in order and is home before the trucks leave again', () => {
    for (const { number } of trucks) {
      const { run, roads } = drive(number);
      expect(run.entries.map(({ segmentKey }) => segmentKey)).toEqual(roads.map(({ key }) => key));
      expect(run.finishedAt).not.toBeNull();
      expect(run.finishedAt?.getTime() ?? Infinity).toBeLessThan(later(2.85).getTime());
      const times = run.entries.map(({ spreadAt }) => spreadAt.getTime());
      expect(times.every((time, index) => index === 0 || time > (times[index - 1] ?? 0))).toBe(true);
    }
  });

  it('never spreads more than was loaded, and reloads when the hopper runs out', () => {
    for (const rateGPerM2 of [8, 25, 40]) {
      const driven = drive(5, { rateGPerM2 });
      const loadedKg = driven.run.loads.reduce((sum, { massKg }) => sum + massKg, 0);
      expect(loadedKg).toBeGreaterThan(spreadKg(driven) * 0.97);
      expect(driven.run.loads.every(({ massKg }) => massKg <= driven.truck.hopperKg)).toBe(true);
      expect(driven.run.loads.length).toBe(rateGPerM2 === 8 ? 1 : Math.ceil(loadedKg / driven.truck.hopperKg));
    }
  });

  it('spreads 22 % over the plan with truck 4 in the finished storm', () => {
    const plan = drive(4, { storm: 0 });
    expect(spreadKg(drive(4)) / spreadKg(plan)).toBeCloseTo(1.22, 1);
  });

  it('is 38 minutes late with truck 3 in pass 3, and misses roads with truck 6 in pass 4', () => {
    expect(drive(3, { pass: 3 }).run.startedAt.getTime() - drive(3, { pass: 2 }).run.startedAt.getTime()).toBe(
      38 * 60_000,
    );
    const { run, roads } = drive(6, { pass: 4 });
    expect(run.entries.length).toBe(roads.length - 3);
    expect(run.entries.filter(({ outcome }) => outcome === 'skipped').length).toBeGreaterThan(0);
  });

  it('stands at the loader with trucks 3 and 7 in the present pass, with roads still to do', () => {
    for (const truckNumber of [3, 7]) {
      const { run, roads } = drive(truckNumber, { storm: 7, pass: 3, hours: 2.9 });
      expect(run.finishedAt).toBeNull();
      expect(run.entries.length).toBeLessThan(roads.length);
      const lastLoadAt = run.loads.at(-1)?.loadedAt.getTime() ?? 0;
      expect(lastLoadAt).toBeGreaterThan(run.entries.at(-1)?.spreadAt.getTime() ?? Infinity);
    }
  });

  it('knows nothing of what has not happened yet', () => {
    const { run } = drive(8, { hours: 1 });
    expect(run.finishedAt).toBeNull();
    expect(run.entries.length).toBeGreaterThan(3);
    expect(run.entries.every(({ recordedAt }) => recordedAt <= later(1))).toBe(true);
  });
});

describe('the storms', () => {
  it('are one finished of five passes and one under way with three of five published', () => {
    expect(storms.map(({ closedH }) => closedH === null)).toEqual([false, true]);
    expect(storms.map(({ passesH, publishedPasses }) => [passesH.length, publishedPasses])).toEqual([
      [5, 5],
      [5, 3],
    ]);
  });
});
