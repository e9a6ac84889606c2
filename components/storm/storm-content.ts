import { type PlanInputs, type PlanSummary } from '@/lib/contracts/plans';
import { type PromiseKind } from '@/lib/treatment/promise';
import { type StormRowView } from './storms-table';

/** One version of a storm's plan. Times are ms since 1970. */
export interface PlanVersion {
  readonly id: number;
  readonly passNumber: number;
  readonly version: number;
  readonly policyVersion: number;
  readonly workedOutAt: number;
  readonly workedOutByName: string;
  readonly publishedAt: number | null;
  readonly publishedByName: string | null;
  /** null where a plan was kept without them */
  readonly inputs: PlanInputs | null;
  readonly summary: PlanSummary | null;
}

export interface PassView {
  readonly number: number;
  readonly startsAt: number;
  /** when the next pass leaves, or the storm ends */
  readonly untilAt: number;
}

export interface ClassView {
  readonly serviceClass: 'A' | 'B' | 'C' | 'D';
  readonly promise: PromiseKind;
  readonly roads: number;
  readonly laneKm: number;
}

export interface ForecastView {
  readonly source: string;
  readonly issuedAt: number;
  readonly untilAt: number | null;
}

/** All that the page of one storm shows. */
export interface StormContent {
  readonly storm: StormRowView;
  readonly passes: readonly PassView[];
  readonly plans: readonly PlanVersion[];
  readonly classes: readonly ClassView[];
  readonly forecast: ForecastView | null;
  readonly policyVersion: number | null;
  readonly currency: string;
  readonly zone: string;
  /** the moment the page was made */
  readonly nowAt: number;
}

const STEP_MS = 600_000;

/** Why a pass cannot be worked out now, or null. The command refuses for the same reasons. */
export function workOutRefusal(pass: PassView, content: StormContent, nowAt: number): string | null {
  if (content.storm.closedAt !== null) return 'The storm is closed.';
  if (content.classes.length === 0) return 'There are no roads yet: load a network in Set-up, Roads.';
  if (!content.forecast) return 'No forecast has come in yet.';
  if (pass.untilAt - Math.max(pass.startsAt, nowAt) < STEP_MS) return `Pass ${pass.number} is over.`;
  if ((content.forecast.untilAt ?? 0) < pass.untilAt) return 'The newest forecast ends before the pass after it.';
  return null;
}

/** The pass that is to be decided: the first that has no published plan and is not over. */
export function passToDecide(content: StormContent, nowAt: number): PassView | null {
  const published = new Set(content.plans.flatMap((plan) => (plan.publishedAt === null ? [] : [plan.passNumber])));
  const open = content.passes.filter((pass) => workOutRefusal(pass, content, nowAt) === null);
  return open.find((pass) => !published.has(pass.number)) ?? open[0] ?? null;
}
