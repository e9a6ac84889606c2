import { type PlanOption, type PlanWhy } from '@/lib/contracts/plans';
import { type PlannedRoad } from '@/lib/treatment/plan-pass';
import { reasonSentence, type Wording } from '@/lib/treatment/reason';

function optionOf({
  materialId,
  answer,
  chlorideGPerM2,
  costCentsPer1000M2,
}: PlannedRoad['options'][number]): PlanOption {
  if (!answer.ok) {
    return {
      ok: false,
      materialId: Number(materialId),
      reason: answer.reason,
      neededRateGPerM2: answer.neededRateGPerM2 ?? null,
      limit: answer.limit ?? null,
    };
  }
  return {
    ok: true,
    materialId: Number(materialId),
    rateGPerM2: answer.rateGPerM2,
    rateMlPerM2: answer.rateMLPerM2,
    leastGPerM2: answer.leastGPerM2,
    chlorideGPerM2: chlorideGPerM2 ?? 0,
    costCentsPer1000M2: costCentsPer1000M2 ?? 0,
  };
}

function bindingOf({ treatment: { chosen } }: PlannedRoad, passAt: number): PlanWhy['binding'] {
  if (!chosen) return null;
  return {
    at: passAt + chosen.bindingMin * 60_000,
    waterMm: chosen.waterAtBindingMm,
    tempC: chosen.tempAtBindingC,
    target: chosen.target,
    targetPhi: chosen.targetPhi,
    lossFraction: chosen.lossFraction,
    scatter: chosen.scatter,
    leastGPerM2: chosen.leastGPerM2,
    isHeatLimited: chosen.isHeatLimited,
  };
}

function whyOf(road: PlannedRoad, times: { passAt: number; untilAt: number }): PlanWhy {
  const { treatment, promise, pavementTempC, coldestC, before } = road;
  const { shorterCycle: cycle } = treatment;
  return {
    ...times,
    isPloughed: treatment.isPloughed,
    promise,
    pavementTempC,
    coldestC,
    before,
    water: treatment.water,
    binding: bindingOf(road, times.passAt),
    shorterCycle: cycle && { ...cycle, materialId: Number(cycle.materialId) },
    parts: [...road.parts],
    cautions: [...road.cautions],
    carried: { ...road.carried, stationIds: [...road.carried.stationIds] },
  };
}

/** A planned road as a row of `plan_treatments`, columns by their names in the database. */
export function planRow(
  road: PlannedRoad,
  plan: { planId: number; wording: Wording; times: { passAt: number; untilAt: number } },
): Record<string, unknown> {
  const { treatment } = road;
  return {
    plan_id: plan.planId,
    segment_id: road.segmentId,
    action: treatment.action,
    material_id: treatment.materialId === null ? null : Number(treatment.materialId),
    rate_g_per_m2: treatment.rateGPerM2,
    rate_ml_per_m2: treatment.rateMLPerM2,
    hold_min: road.holdMin,
    reason: reasonSentence(road.parts, plan.wording),
    why: whyOf(road, plan.times),
    options: road.options.map(optionOf),
  };
}
