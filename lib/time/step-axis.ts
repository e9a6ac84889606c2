import { utcOffsetMin, type Instant } from './format';

const MS_PER_MIN = 60_000;

/** Equal steps of time: index 0 is `startAt`. */
export interface StepAxis {
  /** ms since 1970, UTC */
  readonly startAt: number;
  readonly stepMin: number;
  readonly count: number;
}

/**
 * The axis that covers `fromAt` to `untilAt` in steps of `stepMin`, both ends rounded outwards to whole steps of the
 * clock. A step that is not positive, or an end before the start, throws RangeError.
 */
export function stepAxis({
  fromAt,
  untilAt,
  stepMin,
}: {
  fromAt: Instant;
  untilAt: Instant;
  stepMin: number;
}): StepAxis {
  const stepMs = stepMin * MS_PER_MIN;
  if (!(stepMs > 0)) throw new RangeError(`A step must be above 0 min, not ${stepMin}`);
  const startAt = Math.floor(Number(fromAt) / stepMs) * stepMs;
  const endAt = Math.ceil(Number(untilAt) / stepMs) * stepMs;
  if (!(endAt >= startAt)) throw new RangeError('An axis must not end before it starts');
  return { startAt, stepMin, count: Math.round((endAt - startAt) / stepMs) + 1 };
}

/** The instant of a step, ms since 1970. */
export function timeAt(axis: StepAxis, index: number): number {
  return axis.startAt + index * axis.stepMin * MS_PER_MIN;
}

/** The instant of the last step. */
export function endOf(axis: StepAxis): number {
  return timeAt(axis, axis.count - 1);
}

/** The step nearest to an instant; the first or last one outside the axis. */
export function indexAt(axis: StepAxis, at: Instant): number {
  const index = Math.round((Number(at) - axis.startAt) / (axis.stepMin * MS_PER_MIN));
  return Math.min(axis.count - 1, Math.max(0, index));
}

/** The instant of the step nearest to `at`. */
export function snapTo(axis: StepAxis, at: Instant): number {
  return timeAt(axis, indexAt(axis, at));
}

/** True between the first and the last step. */
export function covers(axis: StepAxis, at: Instant): boolean {
  return Number(at) >= axis.startAt && Number(at) <= endOf(axis);
}

const hourSteps = [1, 2, 3, 6, 12, 24] as const;

/**
 * Ticks for a time line: whole local hours, as dense as leaves at least `minGapPx` between two. Over a change of
 * the clocks the ticks stay on whole local hours.
 */
export function hourTicks(line: {
  fromAt: number;
  untilAt: number;
  zone: string;
  widthPx: number;
  minGapPx: number;
}): number[] {
  const hours = (line.untilAt - line.fromAt) / 3_600_000;
  const fitting = hourSteps.find((step) => (line.widthPx / hours) * step >= line.minGapPx) ?? 24;
  const ticks: number[] = [];
  for (let at = Math.ceil(line.fromAt / 1_800_000) * 1_800_000; at <= line.untilAt; at += 1_800_000) {
    const localMin = Math.round(at / MS_PER_MIN) + utcOffsetMin(at, line.zone);
    if (localMin % (fitting * 60) === 0) ticks.push(at);
  }
  return ticks;
}
