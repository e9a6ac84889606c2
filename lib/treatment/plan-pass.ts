import { type Carried } from '../pavement/carry';
import { saltGPerM2, waterMmOf, type Film } from '../road/film';
import { filmParametersFor } from '../road/parameters';
import { filmFreezingPointC, filmMassFraction } from '../road/partition';
import { indexAt } from '../time/step-axis';
import { type Caution } from './cautions';
import { chooseTreatment, type ChoiceInput, type MaterialAnswer, type Treatment } from './choose-treatment';
import { productOf, type Material } from './materials';
import { type PromiseKind } from './promise';
import { holdMin, projectSegment } from './project-segment';
import { projectStorm, type SegmentProjection, type StormInputs, type StormSegment } from './project-storm';
import { reasonParts, type ReasonPart } from './reason';
import { weatherFrom, type RoadWeather } from './weather';

export interface PlannedSegment extends StormSegment {
  readonly isSensitive: boolean;
  /** most that the truck of its route doses of each form, g/m²; absent where no truck is set */
  readonly spreaderMaxGPerM2: NonNullable<ChoiceInput['spreaderMaxGPerM2']>;
}

export interface PassInputs extends Omit<StormInputs, 'segments' | 'filmAt'> {
  readonly segments: readonly PlannedSegment[];
  /** when trucks come, ms since 1970: the pass, or now for one that has begun */
  readonly passAt: number;
  readonly nextPassAt: number;
  /** products at hand */
  readonly materials: readonly Material[];
}

/** What a plan says of one road, and what it is made from. */
export interface PlannedRoad {
  readonly segmentId: number;
  readonly treatment: Pick<
    Treatment,
    'action' | 'isPloughed' | 'materialId' | 'rateGPerM2' | 'rateMLPerM2' | 'chosen' | 'shorterCycle' | 'water'
  >;
  readonly options: readonly MaterialAnswer[];
  readonly parts: readonly ReasonPart[];
  readonly cautions: readonly Caution[];
  readonly promise: PromiseKind;
  /** after the treatment, from the pass on, min; null while no end is in sight */
  readonly holdMin: number | null;
  readonly pavementTempC: number | null;
  readonly coldestC: number | null;
  readonly before: { waterMm: number; saltGPerM2: number; massFraction: number; freezingPointC: number } | null;
  readonly carried: Pick<
    Carried,
    'stationIds' | 'newestReadingAt' | 'ageMin' | 'status' | 'source' | 'siteOffsetC' | 'hasFlaggedReading'
  >;
}

const notWorkedOut: PlannedRoad['treatment'] = {
  action: 'undecided',
  isPloughed: false,
  materialId: null,
  rateGPerM2: null,
  rateMLPerM2: null,
  chosen: null,
  shorterCycle: null,
  water: { nowMm: 0, afterPloughMm: 0, fallingMm: 0, earlierSaltGPerM2: 0 },
};

function carriedFacts(carried: Carried): PlannedRoad['carried'] {
  const { stationIds, newestReadingAt, ageMin, status, source, siteOffsetC, hasFlaggedReading } = carried;
  return { stationIds, newestReadingAt, ageMin, status, source, siteOffsetC, hasFlaggedReading };
}

function cautionsOfPlace(segment: PlannedSegment, carried: Carried, coldestC: number | null): Caution[] {
  const cautions: Caution[] = [];
  if (carried.status === 'stale') cautions.push('stale-reading');
  if (carried.status === 'missing') cautions.push('no-reading');
  if (carried.hasFlaggedReading) cautions.push('flagged-reading');
  const freezesFirst = segment.isBridge || segment.exposure === 'shaded';
  if (freezesFirst && coldestC !== null && coldestC <= 1) cautions.push('bridges-first');
  return cautions;
}

function unknownRoad(segment: PlannedSegment, { carried }: SegmentProjection, inputs: PassInputs): PlannedRoad {
  return {
    segmentId: segment.id,
    treatment: notWorkedOut,
    options: [],
    parts: [{ kind: 'no-data' }],
    cautions: ['advice', ...cautionsOfPlace(segment, carried, null)],
    promise: inputs.policy.promises[segment.serviceClass],
    holdMin: null,
    pavementTempC: null,
    coldestC: null,
    before: null,
    carried: carriedFacts(carried),
  };
}

function holdAfter(segment: PlannedSegment, on: { film: Film; weather: RoadWeather }, found: Found): number | null {
  const { treatment, inputs } = found;
  const { policy } = inputs;
  const material = inputs.materials.find(({ id }) => id === treatment.materialId);
  const form = material?.form ?? 'abrasive';
  const projection = projectSegment({
    ...on,
    passes: [
      {
        index: 0,
        isPloughed: treatment.isPloughed,
        product: material ? productOf(material) : null,
        rateGPerM2: treatment.rateGPerM2 ?? 0,
        scatter: form === 'abrasive' ? 0 : policy.scatter[form],
      },
    ],
    parameters: filmParametersFor(segment.surface),
    vehiclesPerH: policy.vehiclesPerH[segment.serviceClass],
    promise: { kind: policy.promises[segment.serviceClass], looseBrineShare: policy.looseBrineShare },
  });
  return holdMin(projection, { index: 0, stepMin: on.weather.stepMin, graceMin: policy.workInMin });
}

interface Found {
  treatment: Treatment;
  inputs: PassInputs;
}

function choiceOf(
  segment: PlannedSegment,
  on: Pick<ChoiceInput, 'film' | 'weather' | 'untilMin'>,
  { carried, inputs }: { carried: Carried; inputs: PassInputs },
): ChoiceInput {
  const { policy, materials } = inputs;
  return {
    ...on,
    promise: policy.promises[segment.serviceClass],
    policy,
    materials,
    parameters: filmParametersFor(segment.surface),
    vehiclesPerH: policy.vehiclesPerH[segment.serviceClass],
    windMPerS: carried.windMPerS,
    isSensitive: segment.isSensitive,
    spreaderMaxGPerM2: segment.spreaderMaxGPerM2,
  };
}

function planRoad(segment: PlannedSegment, projection: SegmentProjection, inputs: PassInputs): PlannedRoad {
  const { axis, passAt, nextPassAt, policy } = inputs;
  const passIndex = indexAt(axis, passAt);
  const untilMin = (indexAt(axis, nextPassAt) - passIndex) * axis.stepMin;
  const film = projection.filmAt;
  const { carried } = projection;
  if (!film || projection.knownUntil <= passIndex + untilMin / axis.stepMin) {
    return unknownRoad(segment, projection, inputs);
  }
  const weather = weatherFrom({ stepMin: axis.stepMin, ...carried }, passIndex);
  const knownSteps = projection.knownUntil - passIndex;
  const known = { ...weather, tempsC: Array.from(weather.tempsC).slice(0, knownSteps) };
  const treatment = chooseTreatment(choiceOf(segment, { film, weather: known, untilMin }, { carried, inputs }));
  const { options, cautions, coldestC, ...rest } = treatment;
  return {
    segmentId: segment.id,
    treatment: rest,
    options,
    parts: reasonParts(treatment, untilMin),
    cautions: [...cautions, ...cautionsOfPlace(segment, carried, coldestC)],
    promise: policy.promises[segment.serviceClass],
    holdMin: holdAfter(segment, { film, weather: known }, { treatment, inputs }),
    pavementTempC: known.tempsC[0] ?? null,
    coldestC,
    before: {
      waterMm: waterMmOf(film),
      saltGPerM2: saltGPerM2(film),
      massFraction: filmMassFraction(film),
      freezingPointC: filmFreezingPointC(film),
    },
    carried: carriedFacts(carried),
  };
}

/**
 * A pass over all roads: their films from the axis' start to the pass through weather and earlier treatments, then for
 * each the least rate of every product until the next pass and the treatment chosen. A road whose pavement temperature
 * is not known all the way is `undecided` and says so. RangeError when the next pass is not after this one.
 */
export function planPass(inputs: PassInputs): PlannedRoad[] {
  const { axis, passAt, nextPassAt } = inputs;
  if (indexAt(axis, nextPassAt) <= indexAt(axis, passAt)) {
    throw new RangeError('The next pass is at least a step after this one, within the axis');
  }
  const projections = projectStorm({ ...inputs, filmAt: passAt });
  return inputs.segments.flatMap((segment, position) => {
    const projection = projections[position];
    return projection ? [planRoad(segment, projection, inputs)] : [];
  });
}
