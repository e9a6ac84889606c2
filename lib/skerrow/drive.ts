import { distanceM, type PlanePoint } from './plane';
import { type SkerrowTruck } from './people';
import { type Random } from './random';
import { type RoadSegment } from './roads';
import { type Departure } from './storms';

/** What the published plan asks for on one road. */
export interface Ask {
  materialName: string | null;
  rateGPerM2: number | null;
  isPloughed: boolean;
}

export interface DrivenEntry {
  id: string;
  segmentKey: string;
  outcome: 'spread' | 'ploughed' | 'skipped';
  materialName: string | null;
  rateGPerM2: number | null;
  isPloughed: boolean;
  rateSource: 'as-shown' | 'typed' | 'controller';
  note: string;
  spreadAt: Date;
  recordedAt: Date;
}

export interface DrivenLoad {
  id: string;
  materialName: string;
  massKg: number;
  loadedAt: Date;
}

export interface DrivenRun {
  id: string;
  startedAt: Date;
  /** null while the truck is still out */
  finishedAt: Date | null;
  entries: DrivenEntry[];
  loads: DrivenLoad[];
}

export interface Drive {
  roads: readonly RoadSegment[];
  asks: ReadonlyMap<string, Ask>;
  truck: SkerrowTruck;
  departure: Departure;
  leavesAt: Date;
  /** the demo's now: nothing later has happened */
  untilAt: Date;
}

const minMs = 60_000;

/** An id in the form of a random UUID, drawn from the seed. */
export function uuidFrom(random: Random): string {
  const hex = Array.from({ length: 32 }, () => Math.floor(random() * 16).toString(16));
  hex[12] = '4';
  hex[16] = (8 + Math.floor(random() * 4)).toString(16);
  const text = hex.join('');
  return [text.slice(0, 8), text.slice(8, 12), text.slice(12, 16), text.slice(16, 20), text.slice(20)].join('-');
}

/** Minutes to do a road: a wide two-lane road takes a second go on some of its length. */
const workMin = (road: RoadSegment) =>
  ((road.lengthM / 1000) * (road.lanes > 1 ? 1.3 : 1) * 60) / (road.speedKmPerH < 55 ? 23 : 34);

const ends = (road: RoadSegment): [PlanePoint, PlanePoint] => {
  const first = road.line[0] ?? { xM: 0, yM: 0 };
  return [first, road.line.at(-1) ?? first];
};

/** Minutes from the end of one road to the nearer end of the next, by roads half as long again as the crow flies. */
function betweenMin(previous: RoadSegment | undefined, next: RoadSegment): number {
  if (!previous) return 6;
  const gapM = Math.min(...ends(previous).flatMap((from) => ends(next).map((to) => distanceM(from, to))));
  return (gapM * 1.5 * 60) / 40_000 + 0.15;
}

const massKg = (road: RoadSegment, ask: Ask | undefined, factor: number) =>
  ((ask?.rateGPerM2 ?? 0) * factor * road.lengthM * road.widthM) / 1000;

/** Rates are set in whole and half grams: most drivers take what is shown, some round or trust the controller. */
function setRate(rateGPerM2: number, factor: number, random: Random) {
  const habit = random();
  if (factor !== 1) {
    return {
      rateGPerM2: Math.round(rateGPerM2 * factor * (0.985 + 0.03 * random()) * 10) / 10,
      rateSource: 'controller' as const,
    };
  }
  if (habit < 0.72) return { rateGPerM2, rateSource: 'as-shown' as const };
  if (habit < 0.86) {
    return { rateGPerM2: Math.max(1, Math.round(rateGPerM2 * (0.93 + 0.14 * random()))), rateSource: 'typed' as const };
  }
  return { rateGPerM2: Math.round(rateGPerM2 * (0.97 + 0.06 * random()) * 10) / 10, rateSource: 'controller' as const };
}

function entryFor(road: RoadSegment, drive: Drive, at: { spreadAt: Date; random: Random }): DrivenEntry {
  const { spreadAt, random } = at;
  const ask = drive.asks.get(road.key);
  const noSignal = road.exposure === 'ridge' || road.name.startsWith('Moss');
  const recordedAt = new Date(spreadAt.getTime() + (noSignal ? (8 + 16 * random()) * minMs : 4000 + 9000 * random()));
  const common = { id: uuidFrom(random), segmentKey: road.key, spreadAt, recordedAt, note: '' };
  const nothing = {
    ...common,
    materialName: null,
    rateGPerM2: null,
    isPloughed: false,
    rateSource: 'as-shown' as const,
  };
  const { skipped } = drive.departure;
  if (skipped && road.name.startsWith(skipped.road)) return { ...nothing, outcome: 'skipped', note: skipped.note };
  if (!ask?.materialName || !ask.rateGPerM2) {
    if (ask?.isPloughed) return { ...nothing, outcome: 'ploughed', isPloughed: true };
    return random() < 0.88
      ? { ...nothing, outcome: 'ploughed', isPloughed: true, note: 'Nothing asked for, blade down once' }
      : { ...nothing, outcome: 'skipped', note: 'Nothing asked for, wet and clear' };
  }
  const set = setRate(ask.rateGPerM2, drive.departure.rateFactor ?? 1, random);
  return { ...common, outcome: 'spread', materialName: ask.materialName, isPloughed: ask.isPloughed, ...set };
}

/** The material most of the list is asked to get: what the hopper is filled with. */
function hopperMaterial({ roads, asks }: Drive): string | null {
  const counts = new Map<string, number>();
  for (const road of roads) {
    const name = asks.get(road.key)?.materialName;
    if (name) counts.set(name, (counts.get(name) ?? 0) + 1);
  }
  return [...counts].reduce<[string | null, number]>((a, b) => (b[1] > a[1] ? b : a), [null, 0])[0];
}

function takeLoad(drive: Drive, neededKg: number, at: { loadedAt: Date; random: Random }): DrivenLoad | null {
  const materialName = hopperMaterial(drive);
  const wantedKg = Math.min(drive.truck.hopperKg, Math.ceil((neededKg * 1.07 + 150) / 100) * 100);
  return materialName && neededKg > 0
    ? { id: uuidFrom(at.random), materialName, massKg: wantedKg, loadedAt: at.loadedAt }
    : null;
}

/**
 * One truck's run over its list of roads, as far as it has come by `untilAt`: loads, roads in order,
 * back to the yard when the hopper runs out. Pure: the same stream of random numbers gives the same run.
 */
export function driveRoute(drive: Drive, random: Random): DrivenRun {
  const factor = drive.departure.rateFactor ?? 1;
  const startedMs =
    drive.leavesAt.getTime() + (drive.departure.lateMin ?? 0) * minMs + Math.floor(random() * 7) * minMs;
  const run: DrivenRun = {
    id: uuidFrom(random),
    startedAt: new Date(startedMs),
    finishedAt: null,
    entries: [],
    loads: [],
  };
  const listed = drive.roads.slice(0, drive.roads.length - (drive.departure.unloggedAtEnd ?? 0));
  let leftKg = 0;
  let nowMs = startedMs + 3 * minMs;
  listed.forEach((road, index) => {
    const neededKg = listed
      .slice(index)
      .reduce((sum, later) => sum + massKg(later, drive.asks.get(later.key), factor), 0);
    if (leftKg < massKg(road, drive.asks.get(road.key), factor)) {
      nowMs += (index === 0 ? 5 : 17 + 6 * random()) * minMs;
      const load = takeLoad(drive, neededKg - leftKg, { loadedAt: new Date(nowMs), random });
      if (load) {
        run.loads.push(load);
        leftKg = Math.min(drive.truck.hopperKg, leftKg + load.massKg);
      }
    }
    nowMs += (betweenMin(listed[index - 1], road) + workMin(road)) * (0.95 + 0.15 * random()) * minMs;
    leftKg -= massKg(road, drive.asks.get(road.key), factor);
    run.entries.push(entryFor(road, drive, { spreadAt: new Date(Math.round(nowMs / 1000) * 1000), random }));
  });
  nowMs += (9 + 5 * random()) * minMs;
  const known = asOf({ ...run, finishedAt: new Date(Math.round(nowMs / 1000) * 1000) }, drive.untilAt);
  return drive.departure.isLoadingNow ? atTheLoader(known, drive, random) : known;
}

const leftForSecondLoad = 7;

/** The same run, had it turned back before now to load for the roads that are left: seven or more. */
function atTheLoader(run: DrivenRun, drive: Drive, random: Random): DrivenRun {
  const turnedMs = drive.untilAt.getTime() - 15 * minMs;
  const before = run.entries.filter(({ spreadAt }) => spreadAt.getTime() <= turnedMs);
  const entries = before.slice(0, drive.roads.length - leftForSecondLoad);
  const done = new Set(entries.map(({ segmentKey }) => segmentKey));
  const left = drive.roads.filter(({ key }) => !done.has(key));
  const neededKg = left.reduce((sum, road) => sum + massKg(road, drive.asks.get(road.key), 1), 0);
  const load = takeLoad(drive, neededKg, { loadedAt: new Date(drive.untilAt.getTime() - 3 * minMs), random });
  const loads = run.loads.filter(({ loadedAt }) => loadedAt.getTime() <= turnedMs);
  return { ...run, finishedAt: null, entries, loads: load ? [...loads, load] : loads };
}

/** Only what has happened, and has reached the office, by then. */
function asOf(run: DrivenRun, untilAt: Date): DrivenRun {
  return {
    ...run,
    finishedAt: run.finishedAt && run.finishedAt <= untilAt ? run.finishedAt : null,
    entries: run.entries.filter(({ recordedAt }) => recordedAt <= untilAt),
    loads: run.loads.filter(({ loadedAt }) => loadedAt <= untilAt),
  };
}
