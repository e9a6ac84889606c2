import { type z } from 'zod';
import { zdanovskiiFreezingPoint } from '../lib/brine/blend';
import { brineDensityKgPerM3 } from '../lib/brine/density';
import { massFractionFromSpecificGravity } from '../lib/brine/hydrometer';
import { icePointC } from '../lib/brine/ice-point';
import { eutecticOf, freezingPoint, massFractionAt } from '../lib/brine/liquidus';
import { iceMeltedPerKgSalt } from '../lib/brine/melt';
import { saltPerWaterOf, type Solute } from '../lib/brine/salts';
import { formatNumber } from '../lib/units/format';
import { CalcRequest } from './calc-request';

export type CalcAnswer =
  | ({ readonly ok: true } & Readonly<Record<string, string | number | null | true>>)
  | { readonly ok: false; readonly reason: string; readonly code: string; readonly [limit: string]: unknown };

interface Refusal {
  readonly reason: string;
  readonly limitC?: number;
  readonly limitMassFraction?: number;
  readonly limitSpecificGravity?: number;
}

/** A millionth is far below what any of it is known to. */
const round = (value: number): number => Math.round(value * 1e6) / 1e6 + 0;
const degrees = (tempC = Number.NaN): string => `${formatNumber(tempC, 2)} °C`;
const percent = (massFraction = Number.NaN): string => `${formatNumber(100 * massFraction, 2)} %`;

const sentences: Readonly<Record<string, (refusal: Refusal, subject: string) => string>> = {
  'below-eutectic': ({ limitC }, subject) => `No ${subject} brine is liquid below ${degrees(limitC)}, its eutectic.`,
  'above-freezing': () => 'There is no ice above 0 °C, so no strength is needed.',
  'above-saturation': ({ limitMassFraction, limitSpecificGravity }, subject) =>
    limitMassFraction === undefined
      ? `The reading is beyond saturated ${subject} brine, which reads ${formatNumber(limitSpecificGravity ?? 0, 3)}.`
      : `More ${subject} than the water can hold: the limit is ${percent(limitMassFraction)}.`,
  'below-model': ({ limitC }) => `The answer would be colder than ${degrees(limitC)}, where the model ends.`,
  'above-model': ({ limitC }) => `The model ends at ${degrees(limitC)}.`,
  'below-water': ({ limitSpecificGravity }) =>
    `The reading is lighter than water, which reads ${formatNumber(limitSpecificGravity ?? 0, 3)} at that temperature.`,
};

function refuse(refusal: Refusal, subject: string): CalcAnswer {
  const { reason: code, limitC, limitMassFraction, limitSpecificGravity } = refusal;
  const reason = sentences[code]?.(refusal, subject) ?? `Refused: ${code}.`;
  return {
    ok: false,
    reason,
    code,
    ...(limitC === undefined ? {} : { limitC: round(limitC) }),
    ...(limitMassFraction === undefined ? {} : { limitMassFraction: round(limitMassFraction) }),
    ...(limitSpecificGravity === undefined ? {} : { limitSpecificGravity: round(limitSpecificGravity) }),
  };
}

const orNull = (value: number | null): number | null => (value === null ? null : round(value));
const namesOf = (solutes: readonly Solute[]): string =>
  [...new Set(solutes.filter(({ massFraction }) => massFraction > 0).map(({ salt }) => salt))].join(' + ') || 'water';

function answerFreezing(solutes: readonly Solute[]): CalcAnswer {
  const result = freezingPoint(solutes);
  if (!result.ok) return refuse(result, namesOf(solutes));
  const { freezingPointC, solid, icePointC: ice, saltPointC } = result;
  return {
    ok: true,
    freezingPointC: round(freezingPointC),
    solid,
    icePointC: orNull(ice),
    saltPointC: orNull(saltPointC),
  };
}

function answerSaturation(solutes: readonly Solute[]): CalcAnswer {
  const result = freezingPoint(solutes);
  if (!result.ok) return refuse(result, namesOf(solutes));
  if (result.saltPointC === null || result.saltSolid === null) {
    return {
      ok: false,
      code: 'no-salt',
      reason: 'No salt crystallises from this brine down to −70 °C; ice comes first.',
    };
  }
  return { ok: true, saturationTempC: round(result.saltPointC), solid: result.saltSolid };
}

function answerBlend(solutes: readonly Solute[], method: 'pitzer' | 'zdanovskii'): CalcAnswer {
  if (method === 'zdanovskii') {
    const rule = zdanovskiiFreezingPoint(solutes);
    return rule.ok
      ? { ok: true, freezingPointC: round(rule.freezingPointC), solid: 'ice', method }
      : refuse(rule, namesOf(solutes));
  }
  const first = freezingPoint(solutes);
  if (!first.ok) return refuse(first, namesOf(solutes));
  const ice = icePointC(saltPerWaterOf(solutes));
  if (ice === null) return refuse({ reason: 'below-model', limitC: -70 }, namesOf(solutes));
  const { saltPointC, solid: firstSolid } = first;
  return { ok: true, freezingPointC: round(ice), solid: 'ice', method, firstSolid, saltPointC: orNull(saltPointC) };
}

const brineOf = (solutes: readonly { material: Solute['salt']; massFraction: number }[]): readonly Solute[] =>
  solutes.map(({ material, massFraction }) => ({ salt: material, massFraction }));

function answerAboutOneSalt(request: Exclude<CalcRequest, { solutes: unknown }>): CalcAnswer {
  const { material } = request;
  switch (request.ask) {
    case 'mass-fraction-at': {
      const result = massFractionAt(material, request.tempC);
      return result.ok ? { ok: true, massFraction: round(result.massFraction) } : refuse(result, material);
    }
    case 'eutectic': {
      const { tempC, massFraction, solid } = eutecticOf(material);
      return { ok: true, tempC: round(tempC), massFraction: round(massFraction), solid };
    }
    case 'strength-from-reading': {
      const result = massFractionFromSpecificGravity(material, request.specificGravity, request.tempC);
      return result.ok ? { ok: true, massFraction: round(result.massFraction) } : refuse(result, material);
    }
    case 'ice-melted': {
      const result = iceMeltedPerKgSalt(material, request.tempC);
      if (!result.ok) return refuse(result, material);
      if (Number.isFinite(result.iceKgPerKgSalt)) return { ok: true, iceKgPerKgSalt: round(result.iceKgPerKgSalt) };
      return {
        ok: false,
        code: 'unbounded',
        reason: 'At 0 °C any salt at all melts all the ice in the end.',
        limitC: 0,
      };
    }
  }
}

/** The answer to a question that has been checked. */
export function answer(request: CalcRequest): CalcAnswer {
  if (!('solutes' in request)) return answerAboutOneSalt(request);
  const solutes = brineOf(request.solutes);
  switch (request.ask) {
    case 'freezing-point':
      return answerFreezing(solutes);
    case 'saturation-temp':
      return answerSaturation(solutes);
    case 'blend-freezing-point':
      return answerBlend(solutes, request.method);
    case 'density': {
      const result = brineDensityKgPerM3(solutes, request.tempC);
      return result.ok ? { ok: true, densityKgPerM3: round(result.densityKgPerM3) } : refuse(result, namesOf(solutes));
    }
  }
}

function sayWhatIsWrong(error: z.ZodError): string {
  const [issue] = error.issues;
  if (issue === undefined) return 'The question could not be read.';
  if (issue.code === 'unrecognized_keys')
    return `The question has a field that is not known: ${issue.keys.join(', ')}.`;
  const where = issue.path.length > 0 && issue.path[0] !== 'ask' ? `${issue.path.join('.')}: ` : '';
  return `${where}${issue.message}.`;
}

/** One line of JSON in, one answer out; `null` for a blank line. Never throws. */
export function answerLine(line: string): CalcAnswer | null {
  if (line.trim() === '') return null;
  let question: unknown;
  try {
    question = JSON.parse(line);
  } catch {
    return { ok: false, code: 'bad-json', reason: 'The line is not JSON.' };
  }
  const parsed = CalcRequest.safeParse(question);
  if (!parsed.success) return { ok: false, code: 'bad-request', reason: sayWhatIsWrong(parsed.error) };
  try {
    return answer(parsed.data);
  } catch (error) {
    const detail = error instanceof RangeError ? `: ${error.message}` : '';
    return { ok: false, code: 'failed', reason: `The question could not be answered${detail}.` };
  }
}
