import { styleCode } from '@/components/map/road-style';
import { UNKNOWN_STEP } from '@/lib/contracts/packed-steps';
import { NO_END } from '@/lib/contracts/storm-state';
import { DRY_MM } from '@/lib/road/partition';
import { endOf, indexAt, timeAt } from '@/lib/time/step-axis';
import { type RoadNetwork } from './decode-roads';
import { valueAt, type Storm } from './decode-storm';
import { bandOf, marginBands, type MarginBand } from './margin-band';
import { nextPassAt } from './next-pass';
import { type RoadNow } from './road-now';

const msPerMin = 60_000;
/** A road whose stations are silent is not known from this long before now on. */
const silentMs = 2 * 3_600_000;
const missing = '2';

export interface BandsAt {
  /** for the map, a style a road */
  readonly styles: Uint8Array;
  readonly counts: Readonly<Record<MarginBand, number>>;
}

const codes = Object.fromEntries(marginBands.map((band) => [band, styleCode(band)])) as Record<MarginBand, number>;

function holdMinAt(storm: Storm, row: number, step: number): number | null {
  const steps = storm.rows.holdSteps[row * storm.axis.count + step] ?? UNKNOWN_STEP;
  if (steps === UNKNOWN_STEP) return null;
  return steps === NO_END ? Infinity : steps * storm.axis.stepMin;
}

function bandAt(storm: Storm, row: number, step: number): MarginBand {
  const isSilent = storm.view.statuses[row] === missing && timeAt(storm.axis, step) > storm.view.nowAt - silentMs;
  if (isSilent) return 'unknown';
  const waterMm = valueAt(storm, 'waterMm', { row, step });
  return bandOf(valueAt(storm, 'marginC', { row, step }), waterMm !== null && waterMm < DRY_MM);
}

function passMinAt(storm: Storm, row: number, at: number): number | null {
  const { passes, arrivalMin, nowAt } = storm.view;
  const lastAt = storm.lastByRow.get(row)?.at ?? null;
  const comesAt = nextPassAt({ passes, arrivalMin: arrivalMin[row] ?? null, lastAt, nowAt }, at);
  return comesAt === null ? null : (comesAt - at) / msPerMin;
}

function roadAt(network: RoadNetwork, index: number, seen: { storm: Storm; step: number; at: number } | null): RoadNow {
  const segment = network.segments[index];
  const { id = -1, name = '', serviceClass = '' } = segment ?? {};
  const row = seen?.storm.rowById.get(id);
  const bare = { id, index, name, serviceClass };
  if (!seen || row === undefined) {
    return {
      ...bare,
      band: 'unknown',
      pavementTempC: null,
      freezeMarginC: null,
      holdMin: null,
      nextPassMin: null,
      slackMin: null,
      truckNumber: null,
    };
  }
  const { storm, step, at } = seen;
  const band = bandAt(storm, row, step);
  const holdMin = band === 'unknown' ? null : holdMinAt(storm, row, step);
  const nextPassMin = passMinAt(storm, row, at);
  return {
    ...bare,
    band,
    pavementTempC: valueAt(storm, 'pavementC', { row, step }),
    freezeMarginC: band === 'unknown' ? null : valueAt(storm, 'marginC', { row, step }),
    holdMin,
    nextPassMin,
    slackMin: holdMin === null || nextPassMin === null || holdMin === Infinity ? null : holdMin - nextPassMin,
    truckNumber: storm.view.truckOf[row] ?? null,
  };
}

/** The bands of all roads at a time, for the map: no more work than a drag of the cursor leaves time for. */
export function bandsAt(network: RoadNetwork, storm: Storm | null, at: number): BandsAt {
  const styles = new Uint8Array(network.segments.length);
  const counts = Object.fromEntries(marginBands.map((band) => [band, 0])) as Record<MarginBand, number>;
  const step = storm ? indexAt(storm.axis, at) : 0;
  network.segments.forEach(({ id }, index) => {
    const row = storm?.rowById.get(id);
    const band = storm && row !== undefined ? bandAt(storm, row, step) : 'unknown';
    styles[index] = codes[band];
    counts[band] += 1;
  });
  return { styles, counts };
}

/** All roads at a time of a storm, in the order of the map; without a storm nothing is known of any. */
export function roadsAt(network: RoadNetwork, storm: Storm | null, at: number): RoadNow[] {
  const seen = storm ? { storm, at, step: indexAt(storm.axis, at) } : null;
  return network.segments.map((_, index) => roadAt(network, index, seen));
}

/** Minutes from a time to the end of what is forecast. */
export function longestMinAt(storm: Storm | null, at: number): number {
  return storm ? Math.max(0, (endOf(storm.axis) - at) / msPerMin) : 0;
}

const never = Number.MAX_SAFE_INTEGER;

/** A road of which nothing is known stands before those that hold: it is not to be treated as clear. */
const holdKey = (road: RoadNow) => Math.min(never, road.holdMin ?? never - 1);
const slackKey = (road: RoadNow) => Math.min(never, road.slackMin ?? (road.nextPassMin === null ? -never : never));

/** What refreezes first stands first; of those alike the more important road, then the one with less slack. */
export function byUrgency(a: RoadNow, b: RoadNow): number {
  return (
    holdKey(a) - holdKey(b) ||
    // Classes are single letters: comparing them by their language would take most of the time of a sort.
    a.serviceClass.charCodeAt(0) - b.serviceClass.charCodeAt(0) ||
    slackKey(a) - slackKey(b) ||
    (a.freezeMarginC ?? never) - (b.freezeMarginC ?? never) ||
    a.index - b.index
  );
}
