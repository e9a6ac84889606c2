import { type NetworkWarning } from './network';
import { middleOf } from './extent';

import { type AttributedLine, type SplitLines } from './split-lines';

const MOST_IDS = 50;

interface Group {
  lines: AttributedLine[];
}

function collect(
  lines: readonly AttributedLine[],
  keysOf: (line: AttributedLine) => readonly string[],
): Map<string, Group> {
  const groups = new Map<string, Group>();
  for (const line of lines) {
    for (const key of keysOf(line)) {
      const group = groups.get(key);
      if (group) group.lines.push(line);
      else groups.set(key, { lines: [line] });
    }
  }
  return groups;
}

function warn(kind: NetworkWarning['kind'], { lines }: Group, sentence: string): NetworkWarning {
  const [first] = lines;
  return {
    kind,
    sentence,
    sourceIds: lines.slice(0, MOST_IDS).map(({ sourceId }) => sourceId),
    at: first ? middleOf(first.positions) : null,
  };
}

const counted = ({ lines }: Group): string => (lines.length === 1 ? '1 line' : `${lines.length} lines`);

/** Warnings about what the tags say or fail to say, one a kind and value, with the lines they concern. */
export function tagWarnings(
  lines: readonly AttributedLine[],
  isKnownRoadClass: (roadClass: string) => boolean,
): NetworkWarning[] {
  const unreadable = collect(lines, ({ road }) => road.remarks.map(({ tag, text }) => `${tag}=${text}`));
  const unknown = collect(lines, ({ road }) => (isKnownRoadClass(road.roadClass.value) ? [] : [road.roadClass.value]));
  const closed = collect(lines, ({ road }) => (road.isClosed ? ['closed'] : []));
  const ramps = collect(lines, ({ road }) =>
    road.direction.isAssumed && road.roadClass.value.endsWith('_link') ? ['ramp'] : [],
  );
  return [
    ...[...unreadable].map(([text, group]) =>
      warn(
        'unreadable-tag',
        group,
        `“${text}” on ${counted(group)} cannot be read; the value of the class is assumed.`,
      ),
    ),
    ...[...unknown].map(([roadClass, group]) =>
      warn('unknown-class', group, `The class “${roadClass}” on ${counted(group)} is not known; check where it goes.`),
    ),
    ...[...closed.values()].map((group) =>
      warn(
        'closed-road',
        group,
        `${counted(group)} tagged as private or closed to motor traffic; imported all the same.`,
      ),
    ),
    ...[...ramps.values()].map((group) =>
      warn('ramp-direction', group, `${counted(group)} are ramps without a one-way tag; taken as one-way as drawn.`),
    ),
  ];
}

/** A vertex in the middle of two lines on different levels joins a bridge with what it crosses: seldom meant. */
export function levelWarnings({ pieces, places }: SplitLines): NetworkWarning[] {
  const seen = new Map<number, { sourceId: string; level: number; line: AttributedLine }[]>();
  for (const { line, vertices } of pieces) {
    for (const vertex of [vertices[0] ?? 0, vertices.at(-1) ?? 0]) {
      const entry = { sourceId: line.sourceId, level: line.road.level, line };
      const here = seen.get(vertex);
      if (here) here.push(entry);
      else seen.set(vertex, [entry]);
    }
  }
  return [...seen].flatMap(([vertex, passing]): NetworkWarning[] => {
    // a line that goes on through the node is there twice
    const through = passing.filter(
      ({ line }, at) => passing.findIndex((other, place) => place > at && other.line === line) > at,
    );
    const [first] = through;
    const other = through.find(({ level }) => level !== first?.level);
    if (!first || !other) return [];
    const sourceIds = [first.sourceId, other.sourceId];
    return [
      {
        kind: 'levels-meet',
        sentence: `Lines ${sourceIds.join(' and ')} share a vertex although one passes over the other; they are joined as drawn.`,
        sourceIds,
        at: places[vertex] ?? null,
      },
    ];
  });
}
