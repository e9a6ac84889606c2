import { saltGPerM2, waterMmOf } from '../road/film';
import { isSnowLike } from '../road/precipitation';
import { chlorideShare, type Material } from './materials';
import { type Caution } from './cautions';
import { leastRate, passOverRoadOf, type HoldInput, type RateAnswer } from './least-rate';
import { coldestC, isDryColdBlowing } from './rules';
import { shorterCycle, type ShorterCycle } from './shorter-cycle';
import { isKeptThrough, tryRate } from './trial';

export const treatmentActions = [
  'nothing',
  'plough',
  'anti-ice',
  'pre-wet',
  'solid',
  'abrasives',
  'undecided',
] as const;
export type TreatmentAction = (typeof treatmentActions)[number];

export interface ChoiceInput extends Omit<HoldInput, 'isPloughed'> {
  /** products at hand, in any order */
  materials: readonly Material[];
  /** the most each form can be dosed by the trucks that come here, g/m²; null or absent: not known */
  spreaderMaxGPerM2?: Readonly<Partial<Record<Material['form'], number | null>>>;
  isSensitive?: boolean;
}

/** One product's own answer. */
export interface MaterialAnswer {
  readonly materialId: string;
  readonly answer: RateAnswer;
  /** chloride that the rate puts down, g/m²; null where there is no rate */
  readonly chlorideGPerM2: number | null;
  /** of the rate, cents per 1,000 m² */
  readonly costCentsPer1000M2: number | null;
}

export interface Treatment {
  readonly action: TreatmentAction;
  readonly isPloughed: boolean;
  readonly materialId: string | null;
  readonly rateGPerM2: number | null;
  readonly rateMLPerM2: number | null;
  /** the answer that the rate comes from */
  readonly chosen: Extract<RateAnswer, { ok: true }> | null;
  /** offered where no rate within the limits lasts to the next pass */
  readonly shorterCycle: ShorterCycle | null;
  readonly cautions: readonly Caution[];
  readonly options: readonly MaterialAnswer[];
  /** water to deal with before the next pass: now, after the plough, and falling, mm; and earlier salt that stays */
  readonly water: { nowMm: number; afterPloughMm: number; fallingMm: number; earlierSaltGPerM2: number };
  readonly coldestC: number;
}

const actionOf = { liquid: 'anti-ice', prewet: 'pre-wet', solid: 'solid', abrasive: 'abrasives' } as const;

/** A pass ploughs when enough snow lies there by its coming; bonded ice and plain wet are left. */
export function ploughs({ film, weather, policy }: Pick<ChoiceInput, 'film' | 'weather' | 'policy'>): boolean {
  const isFrozen = film.frozenMm > 0 || (weather.tempsC[0] ?? 0) < 0;
  return isFrozen && !film.isBonded && film.fellAsSnowMm > 0 && waterMmOf(film) >= policy.ploughFromMm;
}

function fallingMm({ weather }: ChoiceInput, untilIndex: number): { allMm: number; snowMm: number } {
  let allMm = 0;
  let snowMm = 0;
  for (let index = 1; index <= untilIndex; index += 1) {
    const mm = weather.precipitationMm[index] ?? 0;
    allMm += mm;
    if (isSnowLike(weather.precipitationTypes[index] ?? 'none', weather.tempsC[index] ?? 0)) snowMm += mm;
  }
  return { allMm, snowMm };
}

function answersOf(input: ChoiceInput, isPloughed: boolean): MaterialAnswer[] {
  return input.materials.map((material) => {
    const spreaderMaxGPerM2 = input.spreaderMaxGPerM2?.[material.form] ?? null;
    const answer = leastRate({ ...input, material, isPloughed, spreaderMaxGPerM2 });
    return {
      materialId: material.id,
      answer,
      chlorideGPerM2: answer.ok ? answer.rateGPerM2 * chlorideShare(material) : null,
      costCentsPer1000M2: answer.ok ? (answer.rateGPerM2 * material.costCentsPerTonne) / 1000 : null,
    };
  });
}

/** The cheapest that keeps the promise; on sensitive ground the one with the least chloride. */
function best(options: readonly MaterialAnswer[], isSensitive: boolean): MaterialAnswer | null {
  const weight = (option: MaterialAnswer) =>
    (isSensitive ? option.chlorideGPerM2 : option.costCentsPer1000M2) ?? Infinity;
  return options.reduce<MaterialAnswer | null>((least, option) => {
    if (!option.answer.ok) return least;
    return least === null || weight(option) < weight(least) ? option : least;
  }, null);
}

interface Found {
  options: readonly MaterialAnswer[];
  isPloughed: boolean;
  input: ChoiceInput;
}

type Decision = Pick<Treatment, 'action' | 'materialId' | 'rateGPerM2' | 'rateMLPerM2' | 'chosen' | 'shorterCycle'>;

const undecided: Decision = {
  action: 'undecided',
  materialId: null,
  rateGPerM2: null,
  rateMLPerM2: null,
  chosen: null,
  shorterCycle: null,
};

function salted(option: MaterialAnswer, materials: readonly Material[]): Decision {
  const material = materials.find(({ id }) => id === option.materialId);
  if (!material || !option.answer.ok) return undecided;
  const { rateGPerM2, rateMLPerM2 } = option.answer;
  return {
    ...undecided,
    action: actionOf[material.form],
    materialId: material.id,
    rateGPerM2,
    rateMLPerM2,
    chosen: option.answer,
  };
}

/** No rate within the limits lasts: a shorter cycle, else abrasives, else a person decides. Each says what it is. */
function fallback({ options, isPloughed, input }: Found): Decision {
  const cycle = shorterCycle(input, { options, isPloughed });
  if (cycle) {
    const { materialId, rateGPerM2, rateMLPerM2 } = cycle;
    const form = input.materials.find(({ id }) => id === materialId)?.form ?? 'solid';
    return { ...undecided, action: actionOf[form], materialId, rateGPerM2, rateMLPerM2, shorterCycle: cycle };
  }
  const abrasive = input.materials.find(({ form }) => form === 'abrasive');
  if (!abrasive) return undecided;
  const rateGPerM2 = input.policy.abrasiveRateGPerM2;
  return { ...undecided, action: 'abrasives', materialId: abrasive.id, rateGPerM2 };
}

function decide(found: Found): Decision {
  const { options, isPloughed, input } = found;
  const road = passOverRoadOf({ ...input, isPloughed });
  const untouched = { material: null, rateGPerM2: 0, scatter: 0 };
  const still: Decision = { ...undecided, action: isPloughed ? 'plough' : 'nothing' };
  if (isKeptThrough(tryRate(road, untouched))) return still;
  if (isDryColdBlowing({ ...input, untilIndex: road.untilIndex, windMPerS: input.windMPerS ?? null })) return still;
  const option = best(options, input.isSensitive ?? false);
  return option ? salted(option, input.materials) : fallback(found);
}

function cautionsOf(decision: Decision, { options, input }: Found, coldest: number): Caution[] {
  const cautions: Caution[] = ['advice', 'pavement-not-air'];
  const refused = new Set(options.flatMap(({ answer }) => (answer.ok ? [] : [answer.reason])));
  const form = input.materials.find(({ id }) => id === decision.materialId)?.form;
  const composition = input.materials.find(({ id }) => id === decision.materialId)?.composition ?? {};
  if (decision.rateGPerM2 !== null && coldest > -2) cautions.push('near-freezing');
  if (refused.has('below-eutectic') || refused.has('below-practical-limit')) cautions.push('below-limit');
  if (refused.has('liquid-before-rain') || refused.has('liquid-in-freezing-rain')) cautions.push('liquid-rain');
  if (refused.has('liquid-on-bonded')) cautions.push('liquid-bonded');
  if (refused.has('dry-cold-blowing')) cautions.push('blowing-snow');
  if ((composition.CaCl2 ?? 0) + (composition.MgCl2 ?? 0) > 0) cautions.push('slippery-residue');
  if (saltGPerM2(input.film) > 0.5) cautions.push('residual-estimate');
  if (form === 'abrasive') cautions.push('abrasive-dust');
  if (input.isSensitive && decision.chosen) cautions.push('sensitive-ground');
  if (decision.shorterCycle) cautions.push('shorter-cycle');
  return cautions;
}

/**
 * What to do on a road at this pass: nothing, plough only, or plough where there is enough snow and spread the product
 * that keeps the promise for the least money (on salt-sensitive ground the least chloride), with every product's own
 * answer beside it. Where no product keeps it within the limits the answer is, in this order and said as such, the
 * limit rate with a shorter cycle, abrasives, or `undecided`.
 */
export function chooseTreatment(input: ChoiceInput): Treatment {
  const isPloughed = ploughs(input);
  const options = answersOf(input, isPloughed);
  const found = { options, isPloughed, input };
  const decision = decide(found);
  const { untilIndex } = passOverRoadOf(input);
  const nowMm = waterMmOf(input.film);
  const residualMm = input.parameters?.ploughResidualMm ?? 0.3;
  const coldest = coldestC(input.weather, untilIndex);
  const afterPloughMm = isPloughed ? Math.min(nowMm, residualMm) : nowMm;
  return {
    ...decision,
    isPloughed,
    options,
    cautions: cautionsOf(decision, found, coldest),
    water: {
      nowMm,
      afterPloughMm,
      earlierSaltGPerM2: nowMm > 0 ? (saltGPerM2(input.film) * afterPloughMm) / nowMm : saltGPerM2(input.film),
      fallingMm: fallingMm(input, untilIndex).allMm,
    },
    coldestC: coldest,
  };
}
