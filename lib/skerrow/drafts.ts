import { type PlanePoint } from './plane';
import { type Exposure, type RouteName, type ServiceClass, type Surface } from './road-words';

/** A road piece between two nodes before it has its final attributes. */
export interface Draft {
  from: string;
  to: string;
  line: PlanePoint[];
  road: string;
  name: string;
  serviceClass: ServiceClass;
  lanes: 1 | 2 | 3;
  speedKmPerH: number;
  route: RouteName;
  isBridge: boolean;
  isOneWay: boolean;
  isStreet: boolean;
  surface?: Surface;
  exposure?: Exposure;
}

export type Nodes = Map<string, PlanePoint>;

export function nodeAt(nodes: Nodes, key: string): PlanePoint {
  const at = nodes.get(key);
  if (!at) throw new RangeError(`no node ${key}`);
  return at;
}

export function degrees(drafts: readonly Draft[]): Map<string, number> {
  const count = new Map<string, number>();
  for (const { from, to } of drafts) {
    count.set(from, (count.get(from) ?? 0) + 1);
    count.set(to, (count.get(to) ?? 0) + 1);
  }
  return count;
}
