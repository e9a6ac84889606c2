import { describe, expect, it } from 'vitest';
import { type RunRoad, type RunView } from '@/lib/contracts/runs';
import { askedOf, leftKg, neededKg, roadNow, roadsNext, roadWords, withPending } from './progress';

const road = (position: number, over: Partial<RunRoad> = {}): RunRoad => ({
  position,
  segmentId: position * 10,
  name: `Road ${position}`,
  serviceClass: 'A',
  lanes: 2,
  lengthM: 1000,
  areaM2: 7000,
  exposure: 'open',
  isBridge: false,
  isSensitive: false,
  action: 'pre-wet',
  materialId: 1,
  materialName: 'Pre-wet salt',
  rateGPerM2: 20,
  rateMlPerM2: null,
  reason: null,
  pavementTempC: -5.9,
  isPloughed: false,
  entryId: null,
  outcome: null,
  loggedRateGPerM2: null,
  loggedMaterialName: null,
  spreadAt: null,
  ...over,
});

const run: RunView = {
  id: 'r',
  driverId: 1,
  driverName: 'M. Aldous',
  truckId: 4,
  truckNumber: 4,
  hopperKg: 7500,
  tankL: 1200,
  minRateGPerM2: 5,
  maxRateGPerM2: 40,
  calibratedOn: null,
  routeName: 'Ridge',
  stormNumber: 7,
  passNumber: 3,
  planVersion: 1,
  startedAt: '2026-12-01T02:00:00Z',
  finishedAt: null,
  loadedKg: 1000,
  spreadKg: 100,
  roads: [road(1, { outcome: 'spread' }), road(2), road(3), road(4)],
};

describe('a run in the cab', () => {
  it('is at the first road not logged, or at the one chosen', () => {
    expect(roadNow(run, null)?.position).toBe(2);
    expect(roadNow(run, 3)?.position).toBe(3);
    expect(roadNow(run, 1)?.position).toBe(2);
  });

  it('comes back to roads left behind after those ahead', () => {
    expect(roadsNext(run, roadNow(run, 3)).map((next) => next.position)).toEqual([4, 2]);
  });

  it('counts a road that waits on the tablet as done, and its salt as spread', () => {
    const shown = withPending(run, [
      {
        entryId: 'e',
        segmentId: 20,
        outcome: 'spread',
        rateGPerM2: 30,
        materialName: 'Pre-wet salt',
        spreadAt: '2026-12-01T02:20:00Z',
      },
    ]);
    expect(roadNow(shown, null)?.position).toBe(3);
    expect(shown.roads[1]?.entryId).toBe('e');
    expect(shown.spreadKg).toBeCloseTo(310, 9);
    expect(leftKg(shown)).toBeCloseTo(690, 9);
    expect(neededKg(shown)).toBeCloseTo(280, 9);
  });

  it('lets go of its own picture once the server has the entry, and corrects the sum by a correction', () => {
    const logged = { entryId: 'e', outcome: 'spread', loggedRateGPerM2: 30, spreadAt: '2026-12-01T02:20:00Z' } as const;
    const server = {
      ...run,
      spreadKg: 310,
      roads: [road(1, { outcome: 'spread' }), road(2, logged), road(3), road(4)],
    };
    const own = { segmentId: 20, materialName: null, outcome: 'spread' } as const;
    const same = withPending(server, [{ ...own, entryId: 'e', rateGPerM2: 30, spreadAt: '2026-12-01T02:20:00Z' }]);
    expect(same.spreadKg).toBe(310);
    const corrected = withPending(server, [{ ...own, entryId: 'f', rateGPerM2: 20, spreadAt: '2026-12-01T02:25:00Z' }]);
    expect(corrected.spreadKg).toBeCloseTo(240, 9);
    expect(corrected.roads[1]?.loggedRateGPerM2).toBe(20);
  });

  it('says what is asked of a road', () => {
    expect(askedOf(road(1))).toBe('spread');
    expect(askedOf(road(1, { action: 'plough', rateGPerM2: null }))).toBe('ploughed');
    expect(askedOf(road(1, { action: 'nothing', rateGPerM2: null }))).toBe('nothing');
    expect(askedOf(road(1, { action: null, rateGPerM2: null }))).toBe('unknown');
    expect(roadWords(road(1, { isBridge: true, exposure: 'shaded', lanes: 1 }))).toBe(
      '1 lane, bridge, freezes first, shaded, holds frost',
    );
  });
});
