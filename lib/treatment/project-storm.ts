import { carry, carryParts, type Carried, type Site } from '../pavement/carry';
import { stationSeries, type Station, type StationSeries } from '../pavement/station-series';
import { plainFilm } from '../road/film';
import { filmParametersFor, type Surface } from '../road/parameters';
import { indexAt, type StepAxis } from '../time/step-axis';
import { productOf, type Material } from './materials';
import { type Policy, type ServiceClass } from './policy';
import { projectSegment, type Projection, type TimedPass } from './project-segment';

/** A road as the storm sees it; its place is that of its middle. */
export interface StormSegment extends Site {
  readonly id: number;
  readonly surface: Surface;
  readonly serviceClass: ServiceClass;
}

/** What was done to a road, or is planned; `at` in ms since 1970. */
export interface StormTreatment {
  readonly segmentId: number;
  readonly at: number;
  readonly isPloughed: boolean;
  readonly material: Material | null;
  readonly rateGPerM2: number;
}

export interface StormInputs {
  readonly axis: StepAxis;
  readonly nowAt: number;
  readonly segments: readonly StormSegment[];
  readonly stations: readonly Station[];
  /** logged ones and planned ones, in any order; those outside the axis are left out */
  readonly treatments: readonly StormTreatment[];
  readonly policy: Policy;
  /** the film of each road at this time is handed back, before a treatment there */
  readonly filmAt?: number;
}

export interface SegmentProjection extends Projection {
  readonly segmentId: number;
  /** pavement temperature and precipitation of the road, and where they come from */
  readonly carried: Carried;
}

function passOf({ isPloughed, material, rateGPerM2, at }: StormTreatment, inputs: StormInputs): TimedPass {
  const form = material?.form ?? 'abrasive';
  return {
    index: indexAt(inputs.axis, at),
    isPloughed,
    product: material ? productOf(material) : null,
    rateGPerM2,
    scatter: form === 'abrasive' ? 0 : inputs.policy.scatter[form],
  };
}

function passesBySegment(inputs: StormInputs): Map<number, TimedPass[]> {
  const { axis, treatments } = inputs;
  const endAt = axis.startAt + (axis.count - 1) * axis.stepMin * 60_000;
  const passes = new Map<number, TimedPass[]>();
  for (const treatment of treatments) {
    if (treatment.at < axis.startAt || treatment.at > endAt) continue;
    const known = passes.get(treatment.segmentId) ?? [];
    known.push(passOf(treatment, inputs));
    passes.set(treatment.segmentId, known);
  }
  for (const list of passes.values()) list.sort((a, b) => a.index - b.index);
  return passes;
}

export function seriesOf({ stations, axis, nowAt }: Pick<StormInputs, 'stations' | 'axis' | 'nowAt'>): StationSeries[] {
  return stations.map((station) => stationSeries(station, axis, nowAt));
}

/**
 * Every road through the steps of an axis: station temperatures and precipitation carried to it, its film from the
 * axis' start on, and what treatments did. The one way to compute it, for the map and for a plan alike. The film starts
 * with the water that the stations report there, without salt. 5,000 roads over 24 h in 10 min steps: see the bench.
 */
export function projectStorm(inputs: StormInputs): SegmentProjection[] {
  const { axis, segments, stations, policy, filmAt } = inputs;
  const series = seriesOf(inputs);
  const passes = passesBySegment(inputs);
  const filmAtIndex = filmAt === undefined ? undefined : indexAt(axis, filmAt);
  return segments.map((segment) => {
    const carried = carry(segment, carryParts(segment, stations), { series, count: axis.count });
    const projection = projectSegment({
      film: plainFilm({ liquidMm: carried.waterAtStartMm }),
      weather: { stepMin: axis.stepMin, ...carried },
      passes: passes.get(segment.id) ?? [],
      parameters: filmParametersFor(segment.surface),
      vehiclesPerH: policy.vehiclesPerH[segment.serviceClass],
      promise: { kind: policy.promises[segment.serviceClass], looseBrineShare: policy.looseBrineShare },
      filmAtIndex,
    });
    return { ...projection, segmentId: segment.id, carried };
  });
}
