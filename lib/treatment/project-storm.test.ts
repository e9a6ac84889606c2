import { describe, expect, it } from 'vitest';
import { type Station } from '../pavement/station-series';
import { indexAt, stepAxis } from '../time/step-axis';
import { defaultMaterials } from './default-materials';
import { defaultPolicy } from './policy';
import { projectStorm, type StormInputs } from './project-storm';

const hourMs = 3_600_000;
const nowAt = Date.UTC(2026, 11, 1, 3);
const axis = stepAxis({ fromAt: nowAt - 4 * hourMs, untilAt: nowAt + 6 * hourMs, stepMin: 10 });
const station: Station = {
  id: 7,
  latDeg: 60,
  lonDeg: 0,
  heightM: 0,
  readings: Array.from({ length: 25 }, (_, index) => ({
    at: nowAt - (24 - index) * 600_000,
    pavementTempC: -4,
    precipitationMm: 0.1,
    precipitationType: 'snow',
    waterMm: 0,
    windSpeedMPerS: 4,
    isFlagged: false,
  })),
  forecast: Array.from({ length: 8 }, (_, index) => ({
    validAt: nowAt + index * hourMs,
    pavementTempC: -4,
    pavementErrorC: 1,
    precipitationMm: 0.3,
    precipitationType: 'snow',
    windSpeedMPerS: 4,
  })),
};
const segment = {
  latDeg: 60,
  lonDeg: 0.01,
  heightM: 0,
  exposure: 'open',
  isBridge: false,
  surface: 'asphalt',
  serviceClass: 'A',
} as const;
const inputs: StormInputs = {
  axis,
  nowAt,
  segments: [
    { ...segment, id: 1 },
    { ...segment, id: 2 },
  ],
  stations: [station],
  treatments: [],
  policy: defaultPolicy,
};
const material = defaultMaterials.find(({ form }) => form === 'prewet') ?? null;

describe('a storm over a network', () => {
  it('roads without treatment snow up; the one treated keeps its promise for a time', () => {
    const treated = { segmentId: 2, at: nowAt, isPloughed: true, material, rateGPerM2: 30 };
    const [left, right] = projectStorm({ ...inputs, treatments: [treated] });
    const later = indexAt(axis, nowAt + hourMs);
    expect(left?.isKept[later]).toBe(0);
    expect(left?.waterMm[later]).toBeGreaterThan(2);
    expect(right?.isKept[later]).toBe(1);
    expect(right?.carried.stationIds).toEqual([7]);
  });

  it('the film of now is handed back before the treatment of now', () => {
    const treated = { segmentId: 1, at: nowAt, isPloughed: true, material, rateGPerM2: 30 };
    const [road] = projectStorm({ ...inputs, treatments: [treated], filmAt: nowAt });
    expect(road?.filmAt?.fellMm).toBeCloseTo(2.4, 6);
    expect(road?.filmAt?.dissolved.NaCl).toBe(0);
  });

  it('treatments outside the axis are left out, not moved to its ends', () => {
    const long = { segmentId: 1, at: axis.startAt - 1, isPloughed: false, material, rateGPerM2: 30 };
    const [road] = projectStorm({ ...inputs, treatments: [long] });
    expect(road?.brineMassFraction[0]).toBe(0);
    expect(road?.brineMassFraction[5]).toBe(0);
  });

  it('without stations every road is unknown', () => {
    const [road] = projectStorm({ ...inputs, stations: [] });
    expect(road?.knownUntil).toBe(0);
    expect(road?.freezeMarginC[0]).toBeNaN();
  });
});
