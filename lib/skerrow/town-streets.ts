import { simplify, smoothThrough } from './curves';
import { degrees, type Draft, nodeAt, type Nodes } from './drafts';
import { type Land } from './land';
import { distanceM, distanceToLineM, type PlanePoint } from './plane';
import { type Random } from './random';
import { closes } from './street-names';
import { type Street, type Town } from './towns';

const keyOf = (town: Town, node: number) => `${town.name}:${node}`;

/** One draft for each stretch of a street between two of the town's nodes. */
function stretches(town: Town, street: Street): Draft[] {
  const places = street.nodes.map((node) => town.nodes[node]).filter((at) => at !== undefined);
  const line = smoothThrough(places, 75);
  let start = 0;
  return street.nodes.slice(1).map((node, index): Draft => {
    const end = line.findIndex((point, at) => at > start && point === places[index + 1]);
    const part = simplify(line.slice(start, end + 1), 2.5);
    start = end;
    const isAgainst = street.oneWay === 'against';
    const previous = keyOf(town, street.nodes[index] ?? node);
    const next = keyOf(town, node);
    return {
      from: isAgainst ? next : previous,
      to: isAgainst ? previous : next,
      line: isAgainst ? part.reverse() : part,
      road: street.name,
      name: street.name,
      serviceClass: street.serviceClass,
      lanes: street.lanes,
      speedKmPerH: street.serviceClass === 'A' ? 60 : street.serviceClass === 'D' ? 30 : 50,
      route: street.route,
      isBridge: false,
      isOneWay: street.oneWay !== undefined,
      isStreet: true,
    };
  });
}

function isConnected(drafts: readonly Draft[], nodeCount: number): boolean {
  const neighbours = new Map<string, string[]>();
  for (const { from, to } of drafts) {
    neighbours.set(from, [...(neighbours.get(from) ?? []), to]);
    neighbours.set(to, [...(neighbours.get(to) ?? []), from]);
  }
  const start = drafts[0]?.from ?? '';
  const reached = new Set([start]);
  const open = [start];
  for (let key = open.pop(); key !== undefined; key = open.pop()) {
    for (const next of neighbours.get(key) ?? []) {
      if (!reached.has(next)) {
        reached.add(next);
        open.push(next);
      }
    }
  }
  return reached.size === nodeCount;
}

/** Takes out some side-street stretches, so that blocks differ, and never cuts the town in two. */
function thinned(town: Town, drafts: readonly Draft[], random: Random): Draft[] {
  const mainNames = new Set(town.streets.filter((street) => street.isMain).map((street) => street.name));
  let kept = [...drafts];
  for (const draft of drafts) {
    const degree = degrees(kept);
    const canSpare = (degree.get(draft.from) ?? 0) > 2 && (degree.get(draft.to) ?? 0) > 2;
    if (mainNames.has(draft.road) || random() > 0.2 || !canSpare) continue;
    const without = kept.filter((other) => other !== draft);
    if (isConnected(without, town.nodes.length)) kept = without;
  }
  return kept;
}

export function layTown(town: Town, nodes: Nodes, random: Random): Draft[] {
  town.nodes.forEach((at, node) => nodes.set(keyOf(town, node), at));
  return thinned(
    town,
    town.streets.flatMap((street) => stretches(town, street)),
    random,
  );
}

/** Short dead ends outward from a town's edge, where there is room for them. */
export function layCloses(town: Town, state: { nodes: Nodes; drafts: Draft[] }, land: Land, random: Random): void {
  const middle = {
    xM: town.nodes.reduce((sum, at) => sum + at.xM, 0) / town.nodes.length,
    yM: town.nodes.reduce((sum, at) => sum + at.yM, 0) / town.nodes.length,
  };
  const names = closes[town.name];
  let made = 0;
  town.nodes.forEach((_, node) => {
    const name = names[made];
    const from = keyOf(town, node);
    const at = nodeAt(state.nodes, from);
    if (!name || random() > 0.62) return;
    const line = closeLine(at, middle, random);
    const end = line.at(-1);
    const isFree = line.slice(1).every((point) => hasRoom(point, from, state.drafts, land));
    if (!end || !isFree) return;
    const to = `${town.name}:close ${made}`;
    state.nodes.set(to, end);
    made += 1;
    const like = state.drafts.find((draft) => draft.isStreet && (draft.from === from || draft.to === from));
    state.drafts.push({
      from,
      to,
      line,
      road: name,
      name,
      serviceClass: 'D',
      lanes: 1,
      speedKmPerH: 30,
      route: like?.route ?? 'Brannoch town',
      isBridge: false,
      isOneWay: false,
      isStreet: true,
    });
  });
}

function closeLine(at: PlanePoint, middle: PlanePoint, random: Random): PlanePoint[] {
  const bearing = Math.atan2(at.yM - middle.yM, at.xM - middle.xM) + 0.7 * (random() - 0.5);
  const reachM = 190 + 130 * random();
  const turn = 0.7 * (random() - 0.5);
  const step = (share: number) => ({
    xM: at.xM + Math.cos(bearing + turn * share) * reachM * share,
    yM: at.yM + Math.sin(bearing + turn * share) * reachM * share,
  });
  return [at, step(0.45), step(0.75), step(1)];
}

function hasRoom(point: PlanePoint, from: string, drafts: readonly Draft[], land: Land): boolean {
  if (!land.isLand(point) || distanceToLineM(point, land.coast) < 120) return false;
  return drafts.every((draft) => {
    const touches = draft.from === from || draft.to === from;
    const start = draft.line[0];
    if (start && distanceM(start, point) > 6000) return true;
    return distanceToLineM(point, draft.line) > (touches ? 62 : 125);
  });
}
