import { type NetworkWarning } from './network';
import { type Bounds, distanceM, type Position } from './position';

/** Farther from the roads that are there already than this wants a second look. Common practice, no source. */
export const FAR_AWAY_M = 150_000;

const middleOf = ([westDeg, southDeg, eastDeg, northDeg]: Bounds): Position => [
  (westDeg + eastDeg) / 2,
  (southDeg + northDeg) / 2,
];

const turned = ([westDeg, southDeg, eastDeg, northDeg]: Bounds): Bounds => [southDeg, westDeg, northDeg, eastDeg];

/** The gap between two boxes in metres; 0 where they overlap. Good to some per cent, which is enough here. */
function gapM(one: Bounds, other: Bounds): number {
  const eastDeg = Math.max(one[0] - other[2], other[0] - one[2], 0);
  const northDeg = Math.max(one[1] - other[3], other[1] - one[3], 0);
  const latDeg = (middleOf(one)[1] + middleOf(other)[1]) / 2;
  return distanceM([0, latDeg - northDeg / 2], [eastDeg, latDeg + northDeg / 2]);
}

/**
 * Whether a file's roads lie where the network is: nothing to say within 150 km; if exchanging longitude and latitude
 * brings them there, they were written the wrong way round; otherwise the distance, rounded to 10 km.
 */
export function checkPlace(file: Bounds | null, network: Bounds | null): NetworkWarning[] {
  if (!file || !network) return [];
  const awayM = gapM(file, network);
  if (awayM <= FAR_AWAY_M) return [];
  const isLatitude = Math.max(Math.abs(file[0]), Math.abs(file[2])) <= 90;
  if (isLatitude && gapM(turned(file), network) <= FAR_AWAY_M) {
    const sentence =
      'The coordinates look swapped: with longitude and latitude exchanged they would lie among your roads.';
    return [{ kind: 'swapped-coordinates', sentence, sourceIds: [], at: middleOf(file) }];
  }
  const sentence = `These roads lie about ${Math.round(awayM / 10_000) * 10} km from the roads already here.`;
  return [{ kind: 'far-away', sentence, sourceIds: [], at: null }];
}
