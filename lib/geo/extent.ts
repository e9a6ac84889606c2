import { along, bbox, length, lineString, multiLineString } from '@turf/turf';
import { type Bounds, type Position } from './position';

const coordinates = (line: readonly Position[]) => line.map(([lonDeg, latDeg]) => [lonDeg, latDeg]);

/** The smallest box around all the lines, or null when there is no vertex. */
export function boundsOf(lines: Iterable<readonly Position[]>): Bounds | null {
  const filled = [...lines].filter((line) => line.length > 0);
  if (filled.length === 0) return null;
  const [west, south, east, north] = bbox(multiLineString(filled.map(coordinates)));
  return [west, south, east, north];
}

/** The place halfway along a line, by length on the sphere; the first vertex of a line without length, null without vertices. */
export function middleOf(line: readonly Position[]): Position | null {
  const [first] = line;
  if (!first) return null;
  if (line.length < 2) return first;
  const whole = lineString(coordinates(line));
  const [lonDeg, latDeg] = along(whole, length(whole) / 2).geometry.coordinates;
  return lonDeg === undefined || latDeg === undefined ? first : [lonDeg, latDeg];
}
