import { simplify, smoothThrough, waver } from './curves';
import { type Draft, nodeAt, type Nodes } from './drafts';
import { type Land } from './land';
import { crossing, cut, distanceM, kmPoint, legsOf, lineLengthM, type PlanePoint, pointAlong } from './plane';
import { lineNoise } from './random';
import { junctionsKm, type RuralRoad, ruralRoads, townNames } from './rural-roads';

interface Span {
  fromM: number;
  untilM: number;
}
interface Bridge extends Span {
  name: string;
}

/** Where a road crosses rivers, and salt water if it may, with a little of the bank on each side. */
function bridgesOf(line: readonly PlanePoint[], road: RuralRoad, land: Land): Bridge[] {
  const bridges: Bridge[] = [];
  for (const river of land.rivers) {
    let walkedM = 0;
    for (const leg of legsOf(line)) {
      const legM = distanceM(...leg);
      const hit = legsOf(river.line)
        .map((riverLeg) => crossing(leg, riverLeg))
        .find((found) => found);
      if (hit) {
        const atM = walkedM + hit.alongFirst * legM;
        bridges.push({ fromM: atM - 42, untilM: atM + 42, name: `${river.name} bridge, ${road.name}` });
      }
      walkedM += legM;
    }
  }
  if (road.seaBridge) bridges.push(...seaSpans(line, land).map((span) => ({ ...span, name: road.seaBridge ?? '' })));
  return bridges.sort((a, b) => a.fromM - b.fromM);
}

function seaSpans(line: readonly PlanePoint[], land: Land): Span[] {
  let span: Span | undefined;
  for (let atM = 0; atM < lineLengthM(line); atM += 8) {
    if (land.isLand(pointAlong(line, atM))) continue;
    span = { fromM: span?.fromM ?? atM - 18, untilM: atM + 26 };
  }
  return span ? [span] : [];
}

function dryParts(lengthM: number, bridges: readonly Bridge[], pieces: number): Span[] {
  const parts: Span[] = [];
  let fromM = 0;
  for (const bridge of bridges) {
    parts.push({ fromM, untilM: bridge.fromM });
    fromM = bridge.untilM;
  }
  parts.push({ fromM, untilM: lengthM });
  while (parts.length < pieces) {
    const longest = parts.reduce((a, b) => (b.untilM - b.fromM > a.untilM - a.fromM ? b : a));
    const middleM = (longest.fromM + longest.untilM) / 2;
    const { untilM } = longest;
    longest.untilM = middleM;
    parts.splice(parts.indexOf(longest) + 1, 0, { fromM: middleM, untilM });
  }
  return parts;
}

const fullName = (road: RuralRoad, part: number) => {
  const qualifier = road.pieces[part] ?? `part ${part + 1}`;
  return qualifier === '' ? road.name : `${road.name}, ${qualifier}`;
};

function namedSpans(line: readonly PlanePoint[], road: RuralRoad, land: Land) {
  const bridges = bridgesOf(line, road, land);
  const parts = dryParts(lineLengthM(line), bridges, road.pieces.length);
  return [
    ...bridges.map((bridge) => ({ ...bridge, isBridge: true })),
    ...parts.map((part, index) => ({ ...part, name: fullName(road, index), isBridge: false })),
  ].sort((a, b) => a.fromM - b.fromM);
}

/** The nearest node of a town to the road's first place outside it. */
function gate(nodes: Nodes, town: string, towards: PlanePoint): string {
  let best = '';
  let bestM = Infinity;
  for (const [key, at] of nodes) {
    const awayM = distanceM(at, towards);
    if (key.startsWith(`${town}:`) && awayM < bestM) {
      best = key;
      bestM = awayM;
    }
  }
  return best;
}

const isTown = (place: string) => townNames.some((name) => name === place);

function endsOf(road: RuralRoad, nodes: Nodes): { from: string; to: string } {
  const via = road.viaKm.map(([eastKm, northKm]) => kmPoint(eastKm, northKm));
  const first = via[0] ?? nodeAt(nodes, road.to);
  const last = via.at(-1) ?? nodeAt(nodes, road.from);
  return {
    from: isTown(road.from) ? gate(nodes, road.from, first) : road.from,
    to: isTown(road.to) ? gate(nodes, road.to, last) : road.to,
  };
}

function lineOf(road: RuralRoad, ends: readonly [PlanePoint, PlanePoint], seed: number): PlanePoint[] {
  const drawn = [ends[0], ...road.viaKm.map(([eastKm, northKm]) => kmPoint(eastKm, northKm)), ends[1]];
  const reachM = road.serviceClass === 'A' ? 34 : 52;
  const offsetM = (alongM: number) =>
    reachM * (lineNoise(seed, alongM / 520) + 0.45 * lineNoise(seed + 1, alongM / 230));
  return simplify(waver(smoothThrough(drawn, 70), offsetM), 4);
}

/** Lays one road: its bridges and named pieces, with a node at every change. Adds nodes to `nodes`. */
function layRoad(road: RuralRoad, nodes: Nodes, setting: { land: Land; seed: number }): Draft[] {
  const ends = endsOf(road, nodes);
  const line = lineOf(road, [nodeAt(nodes, ends.from), nodeAt(nodes, ends.to)], setting.seed);
  const spans = namedSpans(line, road, setting.land);
  let from = ends.from;
  return spans.map((span, index) => {
    const isLast = index === spans.length - 1;
    const to = isLast ? ends.to : `${road.name} ${road.from} ${index}`;
    const part = cut(line, span.fromM, span.untilM);
    const end = part.at(-1);
    if (!isLast && end) nodes.set(to, end);
    const draft: Draft = {
      from,
      to,
      line: [nodeAt(nodes, from), ...part.slice(1, -1), nodeAt(nodes, to)],
      road: road.name,
      name: span.name,
      serviceClass: road.serviceClass,
      lanes: span.isBridge && road.lanes === 3 ? 2 : road.lanes,
      speedKmPerH: road.speedKmPerH,
      route: road.route,
      isBridge: span.isBridge,
      isOneWay: false,
      isStreet: false,
      ...(road.surface && !span.isBridge ? { surface: road.surface } : {}),
      ...(road.exposure && !span.isBridge ? { exposure: road.exposure } : {}),
    };
    from = to;
    return draft;
  });
}

/** All roads outside the towns; `nodes` must already hold the towns' nodes. */
export function layRuralRoads(nodes: Nodes, land: Land, seed: number): Draft[] {
  for (const [key, [eastKm, northKm]] of Object.entries(junctionsKm)) nodes.set(key, kmPoint(eastKm, northKm));
  return ruralRoads.flatMap((road, index) => layRoad(road, nodes, { land, seed: seed + 300 + 2 * index }));
}
