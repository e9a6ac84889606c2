import { type Film } from '../road/film';
import { filmParametersFor, type FilmParameters } from '../road/parameters';
import { type Material, rateMLPerM2Of } from './materials';
import { type Policy } from './policy';
import { type PromiseKind, type Target } from './promise';
import { forbid, type Refusal } from './rules';
import { isKeptThrough, needAt, tryRate, type JudgedStep, type Need, type PassOverRoad } from './trial';
import { type RoadWeather } from './weather';

/** A road, the pass over it now, and how long that has to last. */
export interface HoldInput {
  /** what lies there now, before the pass */
  film: Film;
  weather: RoadWeather;
  /** to the next pass, min; the policy's margin comes on top */
  untilMin: number;
  promise: PromiseKind;
  policy: Policy;
  isPloughed?: boolean;
  parameters?: FilmParameters;
  vehiclesPerH?: number;
  windMPerS?: number | null;
}

export interface LeastRateInput extends HoldInput {
  material: Material;
  /** what the truck's spreader can dose at most, g/m² of product; null when it is not known */
  spreaderMaxGPerM2?: number | null;
}

export interface LeastRate {
  readonly ok: true;
  /** g/m² of product to leave the spreader */
  readonly rateGPerM2: number;
  /** the same of a liquid, mL/m² */
  readonly rateMLPerM2: number | null;
  /** what physics asks for where the spreader's least dose is above it; else the rate */
  readonly leastGPerM2: number;
  /** when and what decides the rate: min from now, and then */
  readonly bindingMin: number;
  readonly waterAtBindingMm: number;
  readonly tempAtBindingC: number;
  readonly target: Target;
  readonly targetPhi: number;
  /** part of what leaves the spreader that is gone by then: scatter and traffic together */
  readonly lossFraction: number;
  readonly scatter: number;
  /** true when the heat that reaches the road, not the freezing curve, decided */
  readonly isHeatLimited: boolean;
}

export type RateAnswer = LeastRate | Refusal;

/** More than any spreader doses, g/m²: what needs more is no question of rate. */
const CEILING_G_PER_M2 = 2000;

export function passOverRoadOf(input: HoldInput): PassOverRoad {
  const { weather, policy } = input;
  const last = weather.tempsC.length - 1;
  const untilIndex = Math.min(last, Math.ceil((input.untilMin + policy.marginMin) / weather.stepMin - 1e-9));
  return {
    film: input.film,
    weather,
    isPloughed: input.isPloughed ?? false,
    parameters: input.parameters ?? filmParametersFor('asphalt'),
    vehiclesPerH: input.vehiclesPerH ?? 0,
    promise: { kind: input.promise, looseBrineShare: policy.looseBrineShare },
    fromIndex: Math.min(untilIndex, Math.ceil(policy.workInMin / weather.stepMin - 1e-9)),
    untilIndex,
  };
}

function greatestNeed(steps: readonly JudgedStep[], without: readonly JudgedStep[], spread: Spreading): Need | null {
  let greatest: Need | null = null;
  steps.forEach((step, position) => {
    const masses = without[position]?.masses;
    if (!masses) return;
    const need = needAt(step, masses, spread);
    if (!greatest || need.rateGPerM2 > greatest.rateGPerM2) greatest = need;
  });
  return greatest;
}

interface Spreading {
  material: Material;
  rateGPerM2: number;
  scatter: number;
}

/** The closed form, with the losses of the rate it gives: three or four rounds settle it. */
function closedForm(road: PassOverRoad, without: readonly JudgedStep[], start: Spreading): Need | null {
  let need = greatestNeed(without, without, { ...start, rateGPerM2: 0 });
  for (let round = 0; need && round < 8; round += 1) {
    const triedGPerM2 = need.rateGPerM2;
    if (!(triedGPerM2 < CEILING_G_PER_M2)) return need;
    const spread = { ...start, rateGPerM2: triedGPerM2 };
    need = greatestNeed(tryRate(road, spread), without, spread);
    if (need && Math.abs(need.rateGPerM2 - triedGPerM2) <= 0.002 * triedGPerM2) return need;
  }
  return need;
}

/** Where heat decides, brine share still grows with the rate: bracket and halve. Null when no rate is enough. */
function byBisection(road: PassOverRoad, spread: Spreading): number | null {
  const keeps = (rateGPerM2: number) => isKeptThrough(tryRate(road, { ...spread, rateGPerM2 }));
  if (!keeps(CEILING_G_PER_M2)) return null;
  let low = spread.rateGPerM2;
  let high = CEILING_G_PER_M2;
  while (high - low > 0.002 * high + 0.01) {
    const middle = (low + high) / 2;
    if (keeps(middle)) high = middle;
    else low = middle;
  }
  return high;
}

function withinLimits(rate: LeastRate, input: LeastRateInput): RateAnswer {
  const { material, policy, spreaderMaxGPerM2 } = input;
  if (material.form === 'abrasive') return { ok: false, reason: 'melts-nothing' };
  const policyMax = policy.maxRateGPerM2[material.form];
  const spreaderMax = spreaderMaxGPerM2 ?? Infinity;
  const limit = Math.min(policyMax, spreaderMax);
  if (rate.leastGPerM2 > limit) {
    const reason = spreaderMax < policyMax ? 'over-spreader-limit' : 'over-policy-limit';
    return { ok: false, reason, limit, neededRateGPerM2: rate.leastGPerM2 };
  }
  return rate;
}

function answerOf(need: Need, rate: { leastGPerM2: number; isHeatLimited: boolean }, input: LeastRateInput): LeastRate {
  const { material, policy } = input;
  const form = material.form === 'abrasive' ? 'solid' : material.form;
  const rateGPerM2 = Math.max(rate.leastGPerM2, policy.minRateGPerM2[form]);
  return {
    ok: true,
    rateGPerM2,
    rateMLPerM2: material.form === 'liquid' ? rateMLPerM2Of(rateGPerM2, material.densityKgPerM3) : null,
    leastGPerM2: rate.leastGPerM2,
    bindingMin: need.step.index * input.weather.stepMin,
    waterAtBindingMm: need.step.waterMm,
    tempAtBindingC: need.step.tempC,
    target: need.step.target,
    targetPhi: need.step.targetPhi,
    lossFraction: 1 - need.remains,
    scatter: policy.scatter[form],
    isHeatLimited: rate.isHeatLimited,
  };
}

/**
 * The smallest rate of a material with which a road keeps its promise until the next pass and the policy's margin, or
 * why there is none.
 *
 * Where the freezing curve decides it is the closed form
 * `rate = max over t of (φ_t (W_t + m_t) − brine of the residue) / (brine held per gram − φ_t) / survival(t) / (1 − scatter)`
 * with W_t and survival from the film's own stepping; where heat decides (ice cannot melt faster than 334 kJ/kg
 * arrive) it is found by halving to 0.2 %. The first `workInMin` are not judged: salt needs them to work. NaCl, 1 mm of
 * water to keep loose at −5.3 °C with 20 % scatter: 16.5 g/m².
 *
 * A rate above the truck's or the policy's limit is refused with the rate it would take, never cut. RangeError when the
 * weather holds no step or an unknown temperature within the time to be held.
 */
export function leastRate(input: LeastRateInput): RateAnswer {
  const road = passOverRoadOf(input);
  assertKnown(road);
  const { material, policy } = input;
  const without = tryRate(road, { material: null, rateGPerM2: 0, scatter: 0 });
  if (isKeptThrough(without)) return { ok: false, reason: 'not-needed' };
  const { film, weather, windMPerS = null } = input;
  const forbidden = forbid(material, { film, weather, untilIndex: road.untilIndex, windMPerS, policy });
  if (forbidden || material.form === 'abrasive') return forbidden ?? { ok: false, reason: 'melts-nothing' };
  const start = { material, rateGPerM2: 0, scatter: policy.scatter[material.form] };
  const need = closedForm(road, without, start);
  if (!need) return { ok: false, reason: 'not-needed' };
  if (need.rateGPerM2 === Infinity) return { ok: false, reason: 'brine-too-weak' };
  return settleRate(need, { road, start, input });
}

function settleRate(
  need: Need,
  { road, start, input }: { road: PassOverRoad; start: Spreading; input: LeastRateInput },
): RateAnswer {
  const closed = Math.min(need.rateGPerM2, CEILING_G_PER_M2);
  // A hair more, so that rounding within the tolerance of the closed form does not call for halving.
  const isEnough = isKeptThrough(tryRate(road, { ...start, rateGPerM2: closed * 1.004 }));
  if (isEnough) {
    return withinLimits(answerOf(need, { leastGPerM2: need.rateGPerM2, isHeatLimited: false }, input), input);
  }
  const found = byBisection(road, { ...start, rateGPerM2: closed });
  if (found === null) return { ok: false, reason: 'not-in-time' };
  return withinLimits(answerOf(need, { leastGPerM2: found, isHeatLimited: true }, input), input);
}

function assertKnown(road: PassOverRoad): void {
  for (let index = 0; index <= road.untilIndex; index += 1) {
    const tempC = road.weather.tempsC[index] ?? NaN;
    if (Number.isNaN(tempC)) throw new RangeError(`The pavement temperature of step ${index} is not known`);
  }
  if (road.untilIndex < 1) throw new RangeError('The time to be held is at least one step');
}
