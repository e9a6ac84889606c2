import { describe, expect, it } from 'vitest';
import { defaultMaterials } from './default-materials';
import { type PlannedRoad } from './plan-pass';
import { summarisePlan } from './summarise-plan';

const road = (id: number, serviceClass: 'A' | 'B') => ({
  id,
  name: `Road ${id}`,
  serviceClass,
  lanes: 2,
  lengthM: 500,
  areaM2: 3500,
});

function planned(segmentId: number, rateGPerM2: number | null): PlannedRoad {
  return {
    segmentId,
    treatment: {
      action: rateGPerM2 === null ? 'nothing' : 'anti-ice',
      isPloughed: false,
      materialId: rateGPerM2 === null ? null : 'salt-brine',
      rateGPerM2,
      rateMLPerM2: null,
      chosen: null,
      shorterCycle: null,
      water: { nowMm: 0, afterPloughMm: 0, fallingMm: 0, earlierSaltGPerM2: 0 },
    },
    options: [
      {
        materialId: 'rock-salt',
        answer: { ok: false, reason: 'over-policy-limit', limit: 40, neededRateGPerM2: 40 + segmentId },
        chlorideGPerM2: null,
        costCentsPer1000M2: null,
      },
      {
        materialId: 'sand',
        answer: { ok: false, reason: 'melts-nothing' },
        chlorideGPerM2: null,
        costCentsPer1000M2: null,
      },
    ],
    parts: [],
    cautions: [],
    promise: 'bare',
    holdMin: null,
    pavementTempC: -3,
    coldestC: -4,
    before: null,
    carried: {
      stationIds: [],
      newestReadingAt: null,
      ageMin: null,
      status: 'missing',
      source: 'forecast',
      siteOffsetC: 0,
      hasFlaggedReading: false,
    },
  };
}

const summary = summarisePlan({
  roads: [road(1, 'B'), road(2, 'A'), road(3, 'A'), road(4, 'A')],
  planned: [planned(1, null), planned(2, 10), planned(3, 20), planned(4, 40)],
  materials: defaultMaterials,
});

describe('what a plan comes to', () => {
  it('is counted by class, action and material, the first class first', () => {
    expect(summary.groups.map(({ serviceClass, action, roads }) => [serviceClass, action, roads])).toEqual([
      ['A', 'anti-ice', 3],
      ['B', 'nothing', 1],
    ]);
    expect(summary.groups[0]).toMatchObject({ laneKm: 3, ratesGPerM2: [10, 20, 40], form: 'liquid' });
  });

  it('70 g/m² over 3,500 m² are 245 kg of brine, 57 kg of salt and 208 L', () => {
    expect(summary.massKg).toBeCloseTo(245, 9);
    expect(summary.saltKg).toBeCloseTo(57.085, 9);
    expect(summary.brineL).toBeCloseTo(207.98, 2);
    expect(summary.costCents).toBe(466);
  });

  it('refusals are counted with the worst rate needed; what melts nothing is no refusal', () => {
    expect(summary.refused).toEqual([
      { materialName: 'Rock salt', reason: 'over-policy-limit', roads: 4, neededRateGPerM2: 44, limit: 40 },
    ]);
  });
});
