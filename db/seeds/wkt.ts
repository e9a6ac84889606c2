import { type PlanePoint, toLonLat } from '@/lib/skerrow/plane';

const pair = (point: PlanePoint) => toLonLat(point).join(' ');
const path = (line: readonly PlanePoint[]) => line.map(pair).join(', ');

export const pointWkt = (point: PlanePoint) => `SRID=4326;POINT(${pair(point)})`;
export const lineWkt = (line: readonly PlanePoint[]) => `SRID=4326;LINESTRING(${path(line)})`;
export const polygonWkt = (ring: readonly PlanePoint[]) => `SRID=4326;POLYGON((${path(ring)}))`;
