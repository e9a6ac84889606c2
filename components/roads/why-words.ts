import { type PlanOption, type PlanWhy } from '@/lib/contracts/plans';
import { formatTime } from '@/lib/time/format';
import { cautionSentence, reasonSentence, refusalSentence } from '@/lib/treatment/reason';
import { formatQuantity, type Quantity, type UnitSystem } from '@/lib/units/format';
import { type WhyContent } from './why-content';

export interface WhySource {
  readonly why: PlanWhy | null;
  readonly options: readonly PlanOption[];
  readonly forecastIssuedAt: number | null;
  readonly policyVersion: number;
}

export interface WhyContext {
  readonly materials: readonly { readonly id: number; readonly name: string }[];
  readonly stations: readonly { readonly id: number; readonly name: string }[];
  /** material and rate that the plan chose */
  readonly materialName: string | null;
  readonly rateGPerM2: number | null;
  readonly zone: string;
  readonly system: UnitSystem;
}

const promiseWords = {
  bare: 'bare: no ice, snow kept loose',
  passable: 'passable: little ice, snow kept loose',
  low: 'low: some ice, snow half as loose',
} as const;

const statusWords = { current: '', stale: ', old', missing: ', no current reading' } as const;

type Input = WhyContent['inputs'][number];

const amount = (value: number, quantity: Quantity) => ({ amount: value, quantity });
const percent = (fraction: number) => `${Math.round(fraction * 100)} %`;

function stationInput(why: PlanWhy, { stations }: WhyContext): Input {
  const { stationIds, newestReadingAt, source, status } = why.carried;
  const names = stationIds.flatMap((id) => stations.find((station) => station.id === id)?.name ?? []).join(', ');
  return {
    label: 'Pavement when the truck comes',
    value: why.pavementTempC === null ? 'not known' : amount(why.pavementTempC, 'temperature'),
    source: `${source} at ${names || 'no station'}${statusWords[status]}, carried to this road`,
    at: newestReadingAt,
  };
}

function waterInputs(why: PlanWhy): Input[] {
  const inputs: Input[] = [
    {
      label: 'Water on the road',
      value: amount(why.water.nowMm, 'depth'),
      source: 'worked out from what fell and what was spread',
      at: null,
    },
    {
      label: 'Still to fall',
      value: amount(why.water.fallingMm, 'depth'),
      source: 'forecast, until the next pass',
      at: null,
    },
  ];
  if (why.water.earlierSaltGPerM2 >= 0.05) {
    const source = 'worked out from the log, less run-off, plough and traffic';
    inputs.push({ label: 'Salt still there', value: amount(why.water.earlierSaltGPerM2, 'rate'), source, at: null });
  }
  return inputs;
}

function inputsOf(source: WhySource, why: PlanWhy, context: WhyContext): Input[] {
  const { zone } = context;
  const inputs = [stationInput(why, context)];
  if (why.coldestC !== null) {
    const until = `until ${formatTime(why.untilAt, zone)}, the next pass`;
    inputs.push({
      label: 'Coldest to come',
      value: amount(why.coldestC, 'temperature'),
      source: `forecast ${until}`,
      at: source.forecastIssuedAt,
    });
  }
  inputs.push(...waterInputs(why));
  if (why.carried.siteOffsetC !== 0) {
    const value = amount(why.carried.siteOffsetC, 'temperatureDifference');
    inputs.push({ label: 'Exposure of this road', value, source: 'common practice, no source', at: null });
  }
  inputs.push({
    label: 'Promise',
    value: promiseWords[why.promise],
    source: `policy, version ${source.policyVersion}`,
    at: null,
  });
  return inputs;
}

/** The equation in words, with this road's figures. */
function stepsOf(why: PlanWhy, { system, zone, rateGPerM2, materialName }: WhyContext): string[] {
  const { binding } = why;
  if (!binding) return [];
  const shown = (value: number, quantity: Quantity, digits?: number) => {
    const { value: text, unit } = formatQuantity(value, quantity, system, digits === undefined ? {} : { digits });
    return `${text} ${unit}`;
  };
  const water = shown(binding.waterMm, 'depth', system === 'us' ? 3 : 2);
  const asked =
    binding.target === 'loose-snow'
      ? `Snow stays loose while ${percent(binding.targetPhi)} of what lies there is brine.`
      : `Of what lies there ${percent(binding.targetPhi)} has to be brine.`;
  return [
    `The hardest moment is ${formatTime(binding.at, zone)}: ${water} of water at ${shown(binding.tempC, 'temperature')}.`,
    `${asked} The freezing curve says how strong brine is at that temperature.`,
    `By then ${percent(binding.lossFraction)} of what leaves the spreader is gone: ${percent(binding.scatter)} scatters, traffic and run-off take the rest.`,
    `Rate = (brine share × water × salt that the brine holds − salt still there) ÷ (salt in the product × what is left of it) = ${shown(binding.leastGPerM2, 'rate')} of ${materialName ?? 'product'}.`,
    ...(rateGPerM2 !== null && rateGPerM2 > binding.leastGPerM2 + 0.05
      ? [`Raised to ${shown(rateGPerM2, 'rate')}, the least the spreader doses evenly.`]
      : []),
  ];
}

function optionsOf(
  options: readonly PlanOption[],
  { materials, materialName, rateGPerM2, system }: WhyContext,
): WhyContent['options'] {
  return options.map((option) => {
    const name = materials.find((material) => material.id === option.materialId)?.name ?? 'Unknown material';
    if (option.ok)
      return { materialName: name, rateGPerM2: option.rateGPerM2, refusal: null, isChosen: name === materialName };
    const { reason, neededRateGPerM2, limit } = option;
    const refusal = refusalSentence(
      { reason, ...(neededRateGPerM2 === null ? {} : { neededRateGPerM2 }), ...(limit === null ? {} : { limit }) },
      { system },
    );
    const isChosen = name === materialName;
    return { materialName: name, rateGPerM2: isChosen ? rateGPerM2 : null, refusal, isChosen };
  });
}

function limitsOf(why: PlanWhy, options: readonly PlanOption[]): string[] {
  const limits: string[] = [];
  if (options.length > 0 && options.every((option) => !option.ok)) {
    limits.push('No de-icer keeps the promise within its limits; what stopped each is named below.');
  }
  if (why.binding?.isHeatLimited)
    limits.push('The heat that reaches the road, not the freezing curve, decides the rate.');
  if (why.shorterCycle)
    limits.push(
      'No rate within the limits lasts to the next pass: the highest allowed was taken, with a shorter cycle.',
    );
  return limits;
}

/** Why a plan says so, in words and in the reader's units. Null for a plan that kept no reasons. */
export function whyInWords(source: WhySource, context: WhyContext): WhyContent | null {
  const { why, options } = source;
  if (!why) return null;
  return {
    inputs: inputsOf(source, why, context),
    steps: stepsOf(why, context),
    limits: limitsOf(why, options),
    cautions: why.cautions.map(cautionSentence),
    options: optionsOf(options, context),
  };
}

/** The reason of a plan in the reader's own units and zone. */
export function reasonInWords(why: PlanWhy, { zone, system }: Pick<WhyContext, 'zone' | 'system'>): string {
  return reasonSentence(why.parts, { zone, system, startAt: why.passAt });
}
