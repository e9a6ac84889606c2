import { type NetworkWarning } from './network';
import { type Bounds, distanceM, type Position } from './position';

/** Farther from the roads that are there already than this wants a second look. Common practice, no source. */
export const FAR_AWAY_M = 150_000;

function middleOf([westDeg, southDeg, eastDeg, northDeg]: Bounds): Position {
  return [(westDeg + eastDeg) / 2, (southDeg + northDeg) / 2];
}

/**
 * Whether a file's roads lie where the network is: nothing to say within 150 km; if exchanging longitude and latitude
 * brings them there, they were written the wrong way round; otherwise the distance, rounded to 10 km.
 */
export function checkPlace(file: Bounds | null, network: Bounds | null): NetworkWarning[] {
  if (!file || !network) return [];
  const [here, there] = [middleOf(file), middleOf(network)];
  const awayM = distanceM(here, there);
  if (awayM <= FAR_AWAY_M) return [];
  const turned: Position = [here[1], here[0]];
  if (Math.abs(turned[1]) <= 90 && distanceM(turned, there) <= FAR_AWAY_M) {
    const sentence =
      'The coordinates look swapped: with longitude and latitude exchanged they would lie among your roads.';
    return [{ kind: 'swapped-coordinates', sentence, sourceIds: [], at: here }];
  }
  const sentence = `These roads lie about ${Math.round(awayM / 10_000) * 10} km from the roads already here.`;
  return [{ kind: 'far-away', sentence, sourceIds: [], at: null }];
}
