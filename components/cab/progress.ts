import { type RunRoad, type RunView } from '@/lib/contracts/runs';

/** What a waiting message says about a run: enough to draw the road as done before the server knows. */
export interface PendingRoad {
  entryId: string;
  segmentId: number;
  outcome: 'spread' | 'ploughed' | 'skipped';
  rateGPerM2: number | null;
  materialName: string | null;
  spreadAt: string;
}

/**
 * The run as the driver sees it: the server's, with what was logged on this tablet laid over it until the server's own
 * picture holds it. Without that a road just sent would come back as not done for a moment, and be logged twice.
 */
export function withPending(run: RunView, pending: readonly PendingRoad[]): RunView {
  const mine = new Map(pending.map((road) => [road.segmentId, road]));
  let spreadKg = run.spreadKg;
  const roads = run.roads.map((road): RunRoad => {
    const own = mine.get(road.segmentId);
    if (!own || isKnown(road, own)) return road;
    spreadKg += loggedKg(own.outcome, own.rateGPerM2, road) - loggedKg(road.outcome, road.loggedRateGPerM2, road);
    return {
      ...road,
      entryId: own.entryId,
      outcome: own.outcome,
      loggedRateGPerM2: own.rateGPerM2,
      loggedMaterialName: own.materialName,
      spreadAt: own.spreadAt,
    };
  });
  return { ...run, roads, spreadKg };
}

/** Whether the server's picture of a road is as new as the tablet's. */
function isKnown(road: RunRoad, own: PendingRoad): boolean {
  if (road.entryId === own.entryId) return true;
  return road.spreadAt !== null && new Date(road.spreadAt).getTime() > new Date(own.spreadAt).getTime();
}

function loggedKg(outcome: RunRoad['outcome'], rateGPerM2: number | null, road: RunRoad): number {
  return outcome === 'spread' ? ((rateGPerM2 ?? 0) * road.areaM2) / 1000 : 0;
}

/** The first road not yet logged, or the one the driver chose; null when all are. */
export function roadNow(run: RunView, chosenPosition: number | null): RunRoad | null {
  const open = run.roads.filter((road) => road.outcome === null);
  return open.find((road) => road.position === chosenPosition) ?? open[0] ?? null;
}

/** The roads still to do after `now`, in order: those behind it come last. */
export function roadsNext(run: RunView, now: RunRoad | null): RunRoad[] {
  const open = run.roads.filter((road) => road.outcome === null && road.position !== now?.position);
  const from = now?.position ?? 0;
  return [...open.filter((road) => road.position > from), ...open.filter((road) => road.position < from)];
}

/** What the plan asks for on a road, as one of four things a driver can do. */
export function askedOf(road: RunRoad): 'spread' | 'ploughed' | 'nothing' | 'unknown' {
  if (road.rateGPerM2 !== null && road.rateGPerM2 > 0 && road.materialId !== null) return 'spread';
  if (road.action === 'plough') return 'ploughed';
  if (road.action === 'nothing') return 'nothing';
  return 'unknown';
}

/** kg left in the hopper by the log; never below nothing. */
export function leftKg(run: RunView): number {
  return Math.max(0, run.loadedKg - run.spreadKg);
}

/** kg the roads still to do will take at the planned rates. */
export function neededKg(run: RunView): number {
  const open = run.roads.filter((road) => road.outcome === null);
  return open.reduce((sum, road) => sum + ((road.rateGPerM2 ?? 0) * road.areaM2) / 1000, 0);
}

const exposureWords: Readonly<Record<string, string>> = {
  sheltered: 'sheltered',
  shaded: 'shaded, holds frost',
  ridge: 'ridge, exposed',
  shore: 'by the shore',
};

/** "2 lanes, bridge, shaded, holds frost" */
export function roadWords(road: RunRoad): string {
  const words = [
    `${road.lanes} ${road.lanes === 1 ? 'lane' : 'lanes'}`,
    road.isBridge ? 'bridge, freezes first' : '',
    exposureWords[road.exposure] ?? '',
  ];
  return words.filter(Boolean).join(', ');
}
