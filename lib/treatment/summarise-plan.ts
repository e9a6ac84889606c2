import { type TreatmentAction } from './choose-treatment';
import { chlorideShare, saltMassFraction, type Material, type MaterialForm } from './materials';
import { type PlannedRoad } from './plan-pass';
import { serviceClasses, type ServiceClass } from './policy';
import { type RefusalReason } from './rules';

export interface SummarisedRoad {
  readonly id: number;
  readonly name: string;
  readonly serviceClass: ServiceClass;
  readonly lanes: number;
  readonly lengthM: number;
  readonly areaM2: number;
}

export interface SummaryGroup {
  serviceClass: ServiceClass;
  action: TreatmentAction;
  materialName: string | null;
  form: MaterialForm | null;
  roads: number;
  shorterCycles: number;
  laneKm: number;
  ratesGPerM2: [number, number, number] | null;
  massKg: number;
  volumeL: number | null;
  costCents: number;
}

export interface SummaryRefusal {
  materialName: string;
  reason: RefusalReason;
  roads: number;
  neededRateGPerM2: number | null;
  limit: number | null;
}

export interface PlanFigures {
  roads: number;
  laneKm: number;
  massKg: number;
  saltKg: number;
  brineL: number;
  chlorideKg: number;
  costCents: number;
  groups: SummaryGroup[];
  refused: SummaryRefusal[];
}

interface Given {
  roads: readonly SummarisedRoad[];
  planned: readonly PlannedRoad[];
  materials: readonly Material[];
}

const laneKmOf = ({ lanes, lengthM }: SummarisedRoad) => (lanes * lengthM) / 1000;

function groupKey(road: SummarisedRoad, { treatment }: PlannedRoad): string {
  return [serviceClasses.indexOf(road.serviceClass), treatment.action, treatment.materialId ?? ''].join('|');
}

function spreadOf(rates: readonly number[]): [number, number, number] | null {
  const sorted = [...rates].sort((a, b) => a - b);
  const low = sorted[0];
  const middle = sorted[Math.floor((sorted.length - 1) / 2)];
  const high = sorted.at(-1);
  return low === undefined || middle === undefined || high === undefined ? null : [low, middle, high];
}

function groupOf(members: readonly { road: SummarisedRoad; planned: PlannedRoad }[], materials: Given['materials']) {
  const first = members[0];
  if (!first) return [];
  const material = materials.find(({ id }) => id === first.planned.treatment.materialId) ?? null;
  const massKg = members.reduce(
    (sum, { road, planned }) => sum + ((planned.treatment.rateGPerM2 ?? 0) * road.areaM2) / 1000,
    0,
  );
  const group: SummaryGroup = {
    serviceClass: first.road.serviceClass,
    action: first.planned.treatment.action,
    materialName: material?.name ?? null,
    form: material?.form ?? null,
    roads: members.length,
    shorterCycles: members.filter(({ planned }) => planned.treatment.shorterCycle !== null).length,
    laneKm: members.reduce((sum, { road }) => sum + laneKmOf(road), 0),
    ratesGPerM2: spreadOf(members.flatMap(({ planned }) => planned.treatment.rateGPerM2 ?? [])),
    massKg,
    volumeL: material?.form === 'liquid' ? (massKg / material.densityKgPerM3) * 1000 : null,
    costCents: material ? Math.round((massKg * material.costCentsPerTonne) / 1000) : 0,
  };
  return [{ group, material }];
}

function refusalsOf({ planned, materials }: Given): SummaryRefusal[] {
  const found = new Map<string, SummaryRefusal>();
  for (const { options } of planned) {
    for (const { materialId, answer } of options) {
      if (answer.ok || answer.reason === 'not-needed' || answer.reason === 'melts-nothing') continue;
      const materialName = materials.find(({ id }) => id === materialId)?.name ?? materialId;
      const key = `${materialId}|${answer.reason}|${answer.limit ?? ''}`;
      const known = found.get(key) ?? {
        materialName,
        reason: answer.reason,
        roads: 0,
        neededRateGPerM2: null,
        limit: answer.limit ?? null,
      };
      known.roads += 1;
      const needed = answer.neededRateGPerM2 ?? null;
      if (needed !== null) known.neededRateGPerM2 = Math.max(needed, known.neededRateGPerM2 ?? 0);
      found.set(key, known);
    }
  }
  return [...found.values()].sort((a, b) => b.roads - a.roads);
}

/** What a plan comes to: by class, action and material, in all, and which products limits forbid on how many roads. */
export function summarisePlan(given: Given): PlanFigures {
  const byId = new Map(given.roads.map((road) => [road.id, road]));
  const members = new Map<string, { road: SummarisedRoad; planned: PlannedRoad }[]>();
  for (const planned of given.planned) {
    const road = byId.get(planned.segmentId);
    if (!road) continue;
    const key = groupKey(road, planned);
    members.set(key, [...(members.get(key) ?? []), { road, planned }]);
  }
  const keys = [...members.keys()].sort();
  const made = keys.flatMap((key) => groupOf(members.get(key) ?? [], given.materials));
  const total = (of: (each: (typeof made)[number]) => number) => made.reduce((sum, each) => sum + of(each), 0);
  return {
    roads: total(({ group }) => group.roads),
    laneKm: total(({ group }) => group.laneKm),
    massKg: total(({ group }) => group.massKg),
    saltKg: total(({ group, material }) => (material ? group.massKg * saltMassFraction(material) : 0)),
    brineL: total(({ group }) => group.volumeL ?? 0),
    chlorideKg: total(({ group, material }) => (material ? group.massKg * chlorideShare(material) : 0)),
    costCents: total(({ group }) => group.costCents),
    groups: made.map(({ group }) => group),
    refused: refusalsOf(given),
  };
}
