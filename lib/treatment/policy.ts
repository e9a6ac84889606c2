import { type MaterialForm } from './materials';
import { type PromiseKind } from './promise';

export const serviceClasses = ['A', 'B', 'C', 'D'] as const;
export type ServiceClass = (typeof serviceClasses)[number];

type Salted = Exclude<MaterialForm, 'abrasive'>;

/** What an agency has adopted. Kept with its version beside every plan made under it. */
export interface Policy {
  readonly promises: Readonly<Record<ServiceClass, PromiseKind>>;
  /** brine share that keeps snow loose at and above −2 °C */
  readonly looseBrineShare: number;
  /** most that may be spread in one pass, g/m² of product; the truck's own limit counts too */
  readonly maxRateGPerM2: Readonly<Record<Salted, number>>;
  /** least that the spreaders can dose evenly, g/m² of product */
  readonly minRateGPerM2: Readonly<Record<Salted, number>>;
  /** part that does not stay on the lane, 0 to 1 */
  readonly scatter: Readonly<Record<Salted, number>>;
  /** held beyond the next pass, min */
  readonly marginMin: number;
  /** time a salt is given to work before the promise is judged, min */
  readonly workInMin: number;
  /** a pass ploughs from this much frozen or falling snow on, mm of water */
  readonly ploughFromMm: number;
  /** a shorter cycle is offered down to this, min */
  readonly shortestCycleMin: number;
  readonly abrasiveRateGPerM2: number;
  /** vehicles an hour over a lane at night */
  readonly vehiclesPerH: Readonly<Record<ServiceClass, number>>;
  /** wind from which chemical on a cold dry road catches blowing snow, m/s, and the pavement temperature below which */
  readonly blowingFromMPerS: number;
  readonly blowingBelowC: number;
}

/**
 * To begin with. Loose snow at 0.10: field study of NaCl solution in compacted snow, doi
 * 10.1061/(ASCE)CR.1943-5495.0000195. Work-in 20 min: a practical limit means useful melting in 15 to 20 minutes.
 * Blowing snow from 7.7 m/s: mean threshold of dry snow, Li and Pomeroy 1997; below 15 °F (−9.4 °C): Wisconsin DOT.
 * Abrasives 62 g/m²: mean of NCHRP 526, 800 lb/lane-mile. Scatter, margin, traffic, the limits and the cycle: common
 * practice, no source.
 */
export const defaultPolicy: Policy = {
  promises: { A: 'bare', B: 'passable', C: 'passable', D: 'low' },
  looseBrineShare: 0.1,
  maxRateGPerM2: { liquid: 60, prewet: 40, solid: 40 },
  minRateGPerM2: { liquid: 8, prewet: 5, solid: 5 },
  scatter: { liquid: 0.05, prewet: 0.15, solid: 0.3 },
  marginMin: 15,
  workInMin: 20,
  ploughFromMm: 1,
  shortestCycleMin: 45,
  abrasiveRateGPerM2: 62,
  vehiclesPerH: { A: 250, B: 120, C: 40, D: 12 },
  blowingFromMPerS: 7.7,
  blowingBelowC: -9.4,
};
