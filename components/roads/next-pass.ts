const msPerMin = 60_000;

export interface NextPassInput {
  readonly passes: readonly { readonly startsAt: number }[];
  /** minutes from the start of a pass until the truck is there; null when no route has the road */
  readonly arrivalMin: number | null;
  /** when the road was last logged, ms since 1970 */
  readonly lastAt: number | null;
  readonly nowAt: number;
}

/**
 * When a truck is next at a road, seen from `at`; null when none is to come. A pass under way that has not logged the
 * road is late: it may come at any moment from now on. A pass that has logged it is done.
 */
export function nextPassAt({ passes, arrivalMin, lastAt, nowAt }: NextPassInput, at: number): number | null {
  if (arrivalMin === null) return null;
  for (const [index, { startsAt }] of passes.entries()) {
    const followingAt = passes[index + 1]?.startsAt ?? Infinity;
    const isDone = lastAt !== null && lastAt >= startsAt && lastAt < followingAt;
    if (isDone) continue;
    const isUnderWay = startsAt <= nowAt && nowAt < followingAt;
    const dueAt = startsAt + arrivalMin * msPerMin;
    const comesAt = isUnderWay ? Math.max(dueAt, nowAt) : dueAt;
    if (comesAt >= at) return comesAt;
  }
  return null;
}
