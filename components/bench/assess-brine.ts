import { expectedFreezingError, expectedSaltPointError, type ExpectedError } from '@/lib/brine/accuracy';
import { brineDensityKgPerM3 } from '@/lib/brine/density';
import {
  massFractionFromSpecificGravity,
  salometerDegrees,
  SIXTY_F_C,
  specificGravity60F,
} from '@/lib/brine/hydrometer';
import { eutecticOf, freezingPoint, type FreezingPoint } from '@/lib/brine/liquidus';
import { type Salt } from '@/lib/brine/salts';

export interface BrineQuestion {
  readonly salt: Salt;
  readonly by: 'strength' | 'reading';
  readonly strength: number;
  readonly sg: number;
  readonly brineC: number;
}

/** Everything the bench says about one brine. */
export interface AssessedBrine {
  readonly ok: true;
  readonly salt: Salt;
  readonly massFraction: number;
  /** ± as a mass fraction; nought when the strength was given and not read. */
  readonly strengthError: number;
  readonly freezing: FreezingPoint;
  readonly error: ExpectedError | null;
  readonly isPastEutectic: boolean;
  readonly densityAt60FKgPerM3: number | null;
  readonly specificGravity: number;
  readonly salometer: number | null;
}

export type Assessment =
  | AssessedBrine
  | { readonly ok: false; readonly reason: 'below-water' | 'above-saturation'; readonly limitSpecificGravity: number }
  | { readonly ok: false; readonly reason: 'reading-too-cold' | 'reading-too-warm'; readonly limitC: number }
  | { readonly ok: false; readonly reason: 'too-strong'; readonly limitMassFraction: number };

/** A hydrometer read to one mark, ±1 kg/m³, and the density formula itself. */
const readingError: Readonly<Record<Salt, number>> = { NaCl: 0.002, CaCl2: 0.003, MgCl2: 0.003, KCl: 0.003 };

function strengthOf(question: BrineQuestion): { ok: true; massFraction: number } | Exclude<Assessment, AssessedBrine> {
  if (question.by === 'strength') return { ok: true, massFraction: question.strength };
  const read = massFractionFromSpecificGravity(question.salt, question.sg, question.brineC);
  if (read.ok || 'limitSpecificGravity' in read) return read;
  if (read.reason === 'below-eutectic') return { ok: false, reason: 'reading-too-cold', limitC: read.limitC };
  return { ok: false, reason: 'reading-too-warm', limitC: read.limitC };
}

/** From a strength or a reading to what the brine does, or why it cannot be said. */
export function assessBrine(question: BrineQuestion): Assessment {
  const strength = strengthOf(question);
  if (!strength.ok) return strength;
  const { massFraction } = strength;
  const { salt } = question;
  const freezing = freezingPoint([{ salt, massFraction }]);
  if (!freezing.ok) {
    const limitMassFraction = freezing.reason === 'above-saturation' ? freezing.limitMassFraction : 0;
    return { ok: false, reason: 'too-strong', limitMassFraction };
  }
  const density = brineDensityKgPerM3([{ salt, massFraction }], SIXTY_F_C);
  return {
    ok: true,
    salt,
    massFraction,
    strengthError: question.by === 'reading' ? readingError[salt] : 0,
    freezing,
    error:
      freezing.solid === 'ice' ? expectedFreezingError(salt, freezing.freezingPointC) : expectedSaltPointError(salt),
    isPastEutectic: massFraction > eutecticOf(salt).massFraction,
    densityAt60FKgPerM3: density.ok ? density.densityKgPerM3 : null,
    specificGravity: specificGravity60F(salt, massFraction),
    salometer: salt === 'NaCl' ? salometerDegrees(massFraction) : null,
  };
}
