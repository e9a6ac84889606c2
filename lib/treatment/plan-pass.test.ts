import { describe, expect, it } from 'vitest';
import { type Station } from '../pavement/station-series';
import { stepAxis } from '../time/step-axis';
import { defaultMaterials } from './default-materials';
import { planPass, type PassInputs, type PlannedSegment } from './plan-pass';
import { defaultPolicy } from './policy';

const hourMs = 3_600_000;
const nowAt = Date.UTC(2026, 11, 1, 3);

function station(forecastH: number): Station {
  const common = { pavementTempC: -4, precipitationType: 'snow', windSpeedMPerS: 3 };
  return {
    id: 7,
    latDeg: 60,
    lonDeg: 0,
    heightM: 0,
    readings: Array.from({ length: 13 }, (_, index) => ({
      ...common,
      at: nowAt - (12 - index) * 600_000,
      precipitationMm: 0.05,
      waterMm: 0,
      isFlagged: false,
    })),
    forecast: Array.from({ length: forecastH + 1 }, (_, index) => ({
      ...common,
      validAt: nowAt + index * hourMs,
      pavementErrorC: 1,
      precipitationMm: 0.3,
    })),
  };
}

const road = (id: number, change: Partial<PlannedSegment> = {}): PlannedSegment => ({
  id,
  latDeg: 60,
  lonDeg: 0.01,
  heightM: 0,
  exposure: 'open',
  isBridge: false,
  surface: 'asphalt',
  serviceClass: 'A',
  isSensitive: false,
  spreaderMaxGPerM2: {},
  ...change,
});

const inputs: PassInputs = {
  axis: stepAxis({ fromAt: nowAt - 2 * hourMs, untilAt: nowAt + 8 * hourMs, stepMin: 10 }),
  nowAt,
  passAt: nowAt + hourMs,
  nextPassAt: nowAt + 3 * hourMs,
  segments: [road(1), road(2, { isBridge: true }), road(3, { serviceClass: 'D' })],
  stations: [station(9)],
  treatments: [],
  policy: defaultPolicy,
  materials: defaultMaterials,
};

describe('a pass over all roads', () => {
  it('gives every road its treatment with its state before, its reason and where its numbers come from', () => {
    const planned = planPass(inputs);
    expect(planned.map(({ segmentId }) => segmentId)).toEqual([1, 2, 3]);
    for (const { treatment, parts, before, carried, options, holdMin } of planned) {
      expect(treatment.rateGPerM2).toBeGreaterThan(0);
      expect(parts[0]?.kind).toBe('loose-snow');
      expect(before?.waterMm).toBeGreaterThan(0.8);
      expect(carried).toMatchObject({ status: 'current', source: 'measured', stationIds: [7] });
      expect(options).toHaveLength(defaultMaterials.length);
      expect(holdMin ?? Infinity).toBeGreaterThanOrEqual(120);
    }
  });

  it('a colder bridge gets more than the road beside it, a lower class no more than a higher', () => {
    const [open, bridge, low] = planPass(inputs).map(
      ({ treatment, options }) =>
        options.flatMap(({ materialId, answer }) =>
          materialId === 'rock-salt' && answer.ok ? [answer.leastGPerM2] : [],
        )[0] ??
        treatment.rateGPerM2 ??
        0,
    );
    expect(bridge).toBeGreaterThan(open ?? Infinity);
    expect(low).toBeLessThan(open ?? 0);
    expect(planPass(inputs)[1]?.cautions).toContain('bridges-first');
  });

  it('a truck that carries no liquid rules out liquids with its limit of 0', () => {
    const [planned] = planPass({
      ...inputs,
      segments: [road(1, { spreaderMaxGPerM2: { liquid: 0, prewet: 0, solid: 50 } })],
    });
    const brine = planned?.options.find(({ materialId }) => materialId === 'salt-brine')?.answer;
    expect(brine).toMatchObject({ ok: false, reason: 'over-spreader-limit', limit: 0 });
    expect(planned?.treatment.action).toBe('solid');
  });

  it('a road whose temperature is not known until the next pass is undecided, not clear', () => {
    const [planned] = planPass({ ...inputs, stations: [station(2)] });
    expect(planned?.treatment).toMatchObject({ action: 'undecided', rateGPerM2: null });
    expect(planned?.parts).toEqual([{ kind: 'no-data' }]);
    expect(planPass({ ...inputs, stations: [] })[0]?.cautions).toContain('no-reading');
  });

  it('a next pass that is not after this one is a slip of the caller', () => {
    expect(() => planPass({ ...inputs, nextPassAt: inputs.passAt })).toThrow(RangeError);
  });
});
