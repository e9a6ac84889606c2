import { formatTime, spanInWords } from '../time/format';
import { formatQuantity, type Quantity, type UnitSystem } from '../units/format';
import { cautionWords, type Caution } from './cautions';
import { type Treatment } from './choose-treatment';
import { type RefusalReason } from './rules';

/** How a reason is to be written: whose clock, which units, and when the pass was reckoned from. */
export interface Wording {
  readonly zone: string;
  readonly system: UnitSystem;
  /** ms since 1970 of entry 0 of the weather */
  readonly startAt: number;
}

/** What a sentence is made of, as it is kept beside a rate. */
export type ReasonPart =
  | { readonly kind: 'hold-water'; readonly waterMm: number; readonly tempC: number; readonly untilMin: number }
  | { readonly kind: 'loose-snow'; readonly waterMm: number; readonly tempC: number; readonly untilMin: number }
  | { readonly kind: 'loss'; readonly lossFraction: number }
  | { readonly kind: 'plough-first'; readonly nowMm: number; readonly leavesMm: number }
  | { readonly kind: 'raised'; readonly fromGPerM2: number }
  | { readonly kind: 'heat-limited' }
  | { readonly kind: 'holds-without'; readonly coldestC: number; readonly fallingMm: number }
  | {
      readonly kind: 'shorter-cycle';
      readonly neededGPerM2: number;
      readonly limitGPerM2: number;
      readonly holdMin: number;
    }
  | { readonly kind: 'earlier-salt'; readonly saltGPerM2: number }
  | { readonly kind: 'blowing' }
  | { readonly kind: 'nothing-works'; readonly reasons: readonly RefusalReason[] }
  | { readonly kind: 'no-data' };

/** Refusals in words; `limit` and the rate needed are added where there are any. */
const refusalWords: Readonly<Record<RefusalReason, string>> = {
  'not-needed': 'not needed',
  'melts-nothing': 'melts nothing',
  'below-eutectic': 'makes no brine at this temperature',
  'below-practical-limit': 'too cold to work in time',
  'over-spreader-limit': 'more than the spreader can dose',
  'over-policy-limit': 'more than the policy allows',
  'not-in-time': 'the ice cannot melt in time, whatever is spread',
  'brine-too-weak': 'the brine is weaker than the road would have to be',
  'liquid-before-rain': 'no liquid before rain',
  'liquid-in-freezing-rain': 'no liquid in freezing rain',
  'liquid-on-bonded': 'no liquid on bonded ice',
  'dry-cold-blowing': 'chemical would catch blowing snow',
};

const shown = (value: number, quantity: Quantity, { system }: Pick<Wording, 'system'>, digits?: number): string => {
  const { value: text, unit } = formatQuantity(value, quantity, system, digits === undefined ? {} : { digits });
  return `${text} ${unit}`;
};

const depth = (mm: number, wording: Wording) => shown(mm, 'depth', wording, wording.system === 'us' ? 3 : 2);
const clock = (min: number, { startAt, zone }: Wording) => formatTime(startAt + min * 60_000, zone);

/** A refusal in words: "more than the policy allows: 52 g/m² needed, 40 g/m² allowed". */
export function refusalSentence(
  refusal: { reason: RefusalReason; neededRateGPerM2?: number; limit?: number },
  wording: Pick<Wording, 'system'>,
): string {
  const words = refusalWords[refusal.reason];
  const { neededRateGPerM2: needed, limit } = refusal;
  if (limit === 0 && needed !== undefined) return 'the truck of the route cannot spread it';
  if (needed !== undefined && limit !== undefined) {
    return `${words}: ${shown(needed, 'rate', wording)} needed, ${shown(limit, 'rate', wording)} at most`;
  }
  return limit === undefined ? words : `${words}: its limit is ${shown(limit, 'temperature', wording)}`;
}

function wordsOf(part: ReasonPart, wording: Wording): string {
  switch (part.kind) {
    case 'hold-water':
      return `${depth(part.waterMm, wording)} of water to hold at ${shown(part.tempC, 'temperature', wording)} until ${clock(part.untilMin, wording)}`;
    case 'loose-snow':
      return `${depth(part.waterMm, wording)} of snow to keep loose at ${shown(part.tempC, 'temperature', wording)} until ${clock(part.untilMin, wording)}`;
    case 'loss':
      return `${Math.round(part.lossFraction * 100)} % allowed for scatter and traffic`;
    case 'plough-first':
      return `plough first: ${depth(part.nowMm, wording)} lie there, ${depth(part.leavesMm, wording)} stay`;
    case 'raised':
      return `raised from ${shown(part.fromGPerM2, 'rate', wording)} to the least the spreader doses`;
    case 'heat-limited':
      return 'the heat that reaches the road decides, not the brine';
    case 'holds-without':
      return part.coldestC >= 0
        ? `stays at ${shown(part.coldestC, 'temperature', wording)} or warmer until the next pass`
        : `holds until the next pass without treatment at ${shown(part.coldestC, 'temperature', wording)}, ${depth(part.fallingMm, wording)} to come`;
    case 'shorter-cycle':
      return `${shown(part.neededGPerM2, 'rate', wording)} would be needed; ${shown(part.limitGPerM2, 'rate', wording)}, the most allowed, holds for ${spanInWords(part.holdMin)}: come back by ${clock(part.holdMin, wording)}`;
    case 'earlier-salt':
      return `${shown(part.saltGPerM2, 'rate', wording)} of earlier salt counted`;
    case 'blowing':
      return 'cold, dry and blowing: chemical would make ice that does not form without it';
    case 'nothing-works':
      return `no de-icer within its limits (${part.reasons.map((reason) => refusalWords[reason]).join('; ')})`;
    case 'no-data':
      return 'no pavement temperature is known here: do not treat as clear';
  }
}

function partsOfRate(treatment: Treatment, untilMin: number): ReasonPart[] {
  const { chosen } = treatment;
  if (!chosen) return [];
  const kind = chosen.target === 'loose-snow' ? ('loose-snow' as const) : ('hold-water' as const);
  const parts: ReasonPart[] = [
    { kind, waterMm: chosen.waterAtBindingMm, tempC: chosen.tempAtBindingC, untilMin },
    { kind: 'loss', lossFraction: chosen.lossFraction },
  ];
  if (chosen.isHeatLimited) parts.push({ kind: 'heat-limited' });
  if (chosen.rateGPerM2 > chosen.leastGPerM2) parts.push({ kind: 'raised', fromGPerM2: chosen.leastGPerM2 });
  return parts;
}

function partsOfNoRate(treatment: Treatment): ReasonPart[] {
  const { shorterCycle: cycle, options, cautions } = treatment;
  if (cycle) {
    const { neededRateGPerM2: neededGPerM2, rateGPerM2: limitGPerM2, holdMin } = cycle;
    return [{ kind: 'shorter-cycle', neededGPerM2, limitGPerM2, holdMin }];
  }
  if (treatment.action === 'nothing' || treatment.action === 'plough') {
    if (cautions.includes('blowing-snow')) return [{ kind: 'blowing' }];
    const { coldestC } = treatment;
    return [{ kind: 'holds-without', coldestC, fallingMm: treatment.water.fallingMm }];
  }
  const reasons = new Set(options.flatMap(({ answer }) => (answer.ok ? [] : [answer.reason])));
  reasons.delete('melts-nothing');
  return [{ kind: 'nothing-works', reasons: [...reasons] }];
}

/** The reason for a treatment in parts, the deciding one first. `untilMin`: to the next pass, from entry 0. */
export function reasonParts(treatment: Treatment, untilMin: number): ReasonPart[] {
  const { nowMm, afterPloughMm: leavesMm, earlierSaltGPerM2 } = treatment.water;
  const earlier: ReasonPart[] =
    earlierSaltGPerM2 >= 0.5 ? [{ kind: 'earlier-salt', saltGPerM2: earlierSaltGPerM2 }] : [];
  const plough: ReasonPart[] = treatment.isPloughed ? [{ kind: 'plough-first', nowMm, leavesMm }] : [];
  const parts = treatment.chosen ? partsOfRate(treatment, untilMin) : partsOfNoRate(treatment);
  return [...parts, ...plough, ...earlier];
}

/** "0.18 mm of water to hold at −6.2 °C until 05:40; 22 % allowed for scatter and traffic." */
export function reasonSentence(parts: readonly ReasonPart[], wording: Wording): string {
  const sentence = parts.map((part) => wordsOf(part, wording)).join('; ');
  return `${sentence.charAt(0).toUpperCase()}${sentence.slice(1)}.`;
}

export function cautionSentence(caution: Caution): string {
  return cautionWords[caution];
}
