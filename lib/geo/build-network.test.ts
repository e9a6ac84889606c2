import { describe, expect, it } from 'vitest';
import { buildNetwork } from './build-network';
import { type SourceLine } from './network';
import { distanceM, lineLengthM, type Position } from './position';

/** A grid of about 100 m: letters of a drawing become places by column and row. */
const at = (column: number, row: number): Position => [
  Math.round((11.5 + column * 0.001) * 1e7) / 1e7,
  Math.round((50 - row * 0.001) * 1e7) / 1e7,
];
const line = (sourceId: string, positions: Position[], tags: Record<string, string> = {}): SourceLine => ({
  sourceId,
  positions,
  tags: { highway: 'tertiary', ...tags },
  heightM: null,
});
const keysOf = (lines: SourceLine[]) => buildNetwork(lines).segments.map(({ sourceKey }) => sourceKey);

describe('cutting', () => {
  it('a T of two lines has four nodes and three segments', () => {
    //  a ── b ── c
    //       │
    //       d
    const [a, b, c, d] = [at(0, 0), at(1, 0), at(2, 0), at(1, 1)];
    const { nodes, segments, report } = buildNetwork([line('1', [a, b, c]), line('2', [b, d])]);
    expect(nodes).toHaveLength(4);
    expect(segments.map(({ sourceId }) => sourceId)).toEqual(['1', '1', '2']);
    expect(nodes.map(({ degree }) => degree).sort((one, other) => one - other)).toEqual([1, 1, 1, 3]);
    expect(report.deadEnds).toBe(3);
    expect(report.components).toHaveLength(1);
  });

  it('a crossing with a common vertex joins four arms; without one it joins nothing and is reported', () => {
    //       e                       e
    //  a ── b ── c   and   a ───────┼─────── c
    //       d                       d
    const [a, b, c, d, e] = [at(0, 1), at(1, 1), at(2, 1), at(1, 2), at(1, 0)];
    const joined = buildNetwork([line('1', [a, b, c]), line('2', [e, b, d])]);
    expect(joined.segments).toHaveLength(4);
    expect(joined.report.warnings).toEqual([]);
    const crossed = buildNetwork([line('1', [a, c]), line('2', [e, d])]);
    expect(crossed.segments).toHaveLength(2);
    expect(crossed.report.components).toHaveLength(2);
    expect(crossed.report.warnings).toMatchObject([{ kind: 'crossing-not-joined', sourceIds: ['1', '2'] }]);
  });

  it('a bridge that crosses without a common vertex is no node and no complaint; with one it is joined and reported', () => {
    const [a, b, c, d, e] = [at(0, 1), at(1, 1), at(2, 1), at(1, 2), at(1, 0)];
    const over = buildNetwork([line('1', [a, c], { bridge: 'yes' }), line('2', [e, d])]);
    expect(over.report).toMatchObject({ segments: 2, bridges: 1, warnings: [] });
    const shared = buildNetwork([line('1', [a, b, c], { bridge: 'yes' }), line('2', [e, b, d])]);
    expect(shared.report).toMatchObject({ segments: 4, warnings: [{ kind: 'levels-meet' }] });
  });

  it('a line that touches itself is cut there', () => {
    //       c ── d
    //       │    │
    //  a ── b ── e      drawn a b c d e b
    const [a, b, c, d, e] = [at(0, 1), at(1, 1), at(1, 0), at(2, 0), at(2, 1)];
    const { segments, nodes } = buildNetwork([line('9', [a, b, c, d, e, b])]);
    expect(segments.map(({ positions }) => positions.length)).toEqual([2, 5]);
    expect(nodes).toHaveLength(2);
  });

  it('a closed ring alone is one segment from a node to itself', () => {
    const { segments, nodes } = buildNetwork([line('r', [at(0, 0), at(1, 0), at(1, 1), at(0, 0)])]);
    expect(nodes).toHaveLength(1);
    expect(segments).toMatchObject([{ fromNode: 0, toNode: 0 }]);
  });

  it('vertices that differ by less than 10⁻⁷ degree are one node, at 10⁻⁶ they are two', () => {
    const [a, b, c] = [at(0, 0), at(1, 0), at(2, 0)];
    const nearly: Position = [b[0] + 2e-8, b[1] - 2e-8];
    const apart: Position = [b[0] + 1e-6, b[1]];
    expect(buildNetwork([line('1', [a, b]), line('2', [nearly, c])]).nodes).toHaveLength(3);
    expect(buildNetwork([line('1', [a, b]), line('2', [apart, c])]).nodes).toHaveLength(4);
  });

  it('a dead end 0.7 m from another road is reported and not joined; at 1.5 m it is nothing', () => {
    //  a ─────── c
    //       ┆ 0.7 m
    //       d
    const [a, c, d] = [at(0, 0), at(2, 0), at(1, 3)];
    const below = (gapM: number): Position => [11.501, 50 - gapM / 111_230];
    const close = buildNetwork([line('1', [a, c]), line('2', [below(0.7), d])]).report;
    expect(close.warnings).toMatchObject([{ kind: 'near-miss', sourceIds: ['2', '1'] }]);
    expect(close.warnings[0]?.sentence).toContain('0.7 m');
    expect(close.components).toHaveLength(2);
    expect(buildNetwork([line('1', [a, c]), line('2', [below(1.5), d])]).report.warnings).toEqual([]);
  });
});

describe('direction', () => {
  it('a one-way against its line is turned round, and its lanes with it', () => {
    const [a, b] = [at(0, 0), at(1, 0)];
    const { segments, nodes } = buildNetwork([line('1', [a, b], { oneway: '-1', lanes: '2' })]);
    expect(segments[0]).toMatchObject({ isOneWay: true, positions: [b, a], lanesForward: 2, lanesBackward: 0 });
    expect(nodes[segments[0]?.fromNode ?? 9]?.position).toEqual(b);
  });

  it('a one-way street into nowhere is a trap, and says where', () => {
    //  a ══ b → c
    const [a, b, c] = [at(0, 0), at(1, 0), at(2, 0)];
    const { traps } = buildNetwork([line('1', [a, b]), line('2', [b, c], { oneway: 'yes' })]).report;
    expect(traps).toMatchObject([{ kind: 'no-way-out', nodes: 1, segments: 1 }]);
    expect(distanceM(traps[0]?.at ?? a, [(b[0] + c[0]) / 2, b[1]])).toBeLessThan(1);
  });

  it('a one-way ring with a two-way street into it is no trap', () => {
    const [a, b, c, d] = [at(0, 0), at(1, 0), at(2, 0), at(1, 1)];
    const ring = line('2', [b, c, d, b], { junction: 'roundabout' });
    expect(buildNetwork([line('1', [a, b]), ring]).report.traps).toEqual([]);
  });
});

describe('duplicates and nothing-lines', () => {
  const [a, b, c, d] = [at(0, 0), at(1, 0), at(2, 0), at(3, 0)];

  it('a line drawn twice, or again backwards, is kept once without being cut to pieces', () => {
    const { segments, report } = buildNetwork([line('1', [a, b, c]), line('2', [a, b, c]), line('3', [c, b, a])]);
    expect(segments).toHaveLength(1);
    expect(report.duplicates).toMatchObject([
      { droppedId: '2', keptId: '1', extent: 'whole', isReversed: false, differsIn: [] },
      { droppedId: '3', keptId: '1', extent: 'whole', isReversed: true },
    ]);
    expect(report.duplicates[0]?.lengthM).toBeCloseTo(lineLengthM([a, b, c]), 6);
  });

  it('says in what a dropped copy differed', () => {
    const lines = [
      line('1', [a, b], { lanes: '2', name: 'Hill Road' }),
      line('2', [a, b], { lanes: '3', oneway: 'yes' }),
    ];
    expect(buildNetwork(lines).report.duplicates[0]?.differsIn).toEqual(['lanes', 'direction']);
  });

  it('of two lines that share a stretch the shared stretch is kept once', () => {
    //  1: a ─ b ─ c        2: b ─ c ─ d
    const { segments, report } = buildNetwork([line('1', [a, b, c]), line('2', [b, c, d])]);
    expect(report.lengthKm).toBeCloseTo(lineLengthM([a, b, c, d]) / 1000, 9);
    expect(segments.map(({ positions }) => positions.length)).toEqual([3, 2]);
    expect(report.duplicates).toMatchObject([{ extent: 'part', droppedId: '2' }]);
  });

  it('two one-ways on one line in opposite directions are a road with two carriageways: both stay, with a warning', () => {
    const lines = [line('1', [a, b], { oneway: 'yes' }), line('2', [b, a], { oneway: 'yes' })];
    const { report } = buildNetwork(lines);
    expect(report).toMatchObject({ segments: 2, duplicates: [], traps: [], warnings: [{ kind: 'opposed-one-ways' }] });
  });

  it('a line whose places are all one is dropped and named, and a repeated vertex is no node', () => {
    const { report } = buildNetwork([line('0', [a, a]), line('00', [b]), line('1', [a, b, b, c])]);
    expect(report.zeroLength.map(({ sourceId }) => sourceId)).toEqual(['0', '00']);
    expect(report).toMatchObject({ linesRead: 3, linesUsed: 1, segments: 1 });
  });
});

describe('keys', () => {
  const [a, b, c, d] = [at(0, 0), at(1, 0), at(2, 0), at(1, 1)];

  it('are the same however often and in which direction the line is drawn', () => {
    expect(keysOf([line('1', [c, b, a])])).toEqual(keysOf([line('1', [a, b, c])]));
  });

  it('stay with a segment when another part of its line is cut by a new road', () => {
    //  a ─ b ─ c ─ e, then a new road at c: the part a…c must not be mistaken for another
    const before = keysOf([line('1', [a, b, c]), line('2', [b, d])]);
    const after = keysOf([line('1', [a, b, c]), line('2', [b, d]), line('3', [c, at(2, 2)])]);
    expect(after.slice(0, 3)).toEqual(before);
  });

  it('are never used twice, not even for lines without ids', () => {
    const keys = keysOf([line('', [a, b], { oneway: 'yes' }), line('', [b, a], { oneway: 'yes' }), line('', [b, c])]);
    expect(new Set(keys).size).toBe(3);
  });
});

describe('classes, names and what is assumed', () => {
  const [a, b, c, d] = [at(0, 0), at(1, 0), at(2, 0), at(1, 1)];

  it('every filled-in value is named on its segment and counted in the report', () => {
    const tags = { name: 'Quay', lanes: '2', width: '6', surface: 'asphalt', maxspeed: '50', oneway: 'no' };
    const { segments, report } = buildNetwork([line('1', [a, b], tags), line('2', [b, c])]);
    expect(segments[0]?.assumed).toEqual(['exposure']);
    expect(segments[1]?.assumed).toEqual(['name', 'lanes', 'widthM', 'speedKmPerH', 'surface', 'exposure']);
    expect(report.assumedCounts).toMatchObject({ lanes: 1, exposure: 2, roadClass: 0 });
  });

  it('a class may be sent elsewhere or left out, and what is left out is in the report with its length', () => {
    const lines = [
      line('1', [a, b]),
      line('2', [b, c], { highway: 'footway' }),
      line('3', [b, d], { highway: 'track' }),
    ];
    const { segments, report } = buildNetwork(lines, { mapping: { track: 'D', tertiary: 'A' } });
    expect(segments.map(({ serviceClass }) => serviceClass)).toEqual(['A', 'D']);
    expect(report.classes.find(({ roadClass }) => roadClass === 'footway')).toMatchObject({
      target: 'leave-out',
      lines: 1,
      segments: 0,
      lengthKm: expect.closeTo(lineLengthM([b, c]) / 1000, 6) as number,
    });
  });

  it('a road without a name is called after its neighbour, or by its class', () => {
    const lines = [line('1', [a, b], { name: 'Quay' }), line('2', [b, c]), line('3', [at(5, 5), at(6, 5)])];
    expect(buildNetwork(lines).segments.map(({ name }) => name)).toEqual([
      'Quay',
      'Unnamed, off Quay',
      'Unnamed tertiary road',
    ]);
  });

  it('tags that cannot be read, unknown classes and closed roads are one warning each, with their lines', () => {
    const lines = [
      line('1', [a, b], { maxspeed: 'fast' }),
      line('2', [b, c], { maxspeed: 'fast', access: 'private' }),
      line('3', [b, d], { highway: 'hovertrack' }),
    ];
    expect(buildNetwork(lines).report.warnings).toMatchObject([
      { kind: 'unreadable-tag', sourceIds: ['1', '2'] },
      { kind: 'unknown-class', sourceIds: ['3'] },
      { kind: 'closed-road', sourceIds: ['2'] },
    ]);
  });
});

describe('any network', () => {
  const random = (seed: number) => {
    let state = seed;
    return (limit: number) => {
      state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
      return Math.floor((state / 2 ** 32) * limit);
    };
  };
  const tangle = (seed: number, count: number, span: number) => {
    const next = random(seed);
    return Array.from({ length: count }, (_, id) =>
      line(
        String(id),
        Array.from({ length: 1 + next(6) }, () => at(next(span), next(span))),
        next(3) === 0 ? { oneway: next(2) === 0 ? 'yes' : '-1' } : {},
      ),
    );
  };

  it.each([1, 2, 3, 4, 5, 6, 7, 8])(
    'keeps every metre: segments = lines − what is reported as dropped (seed %i)',
    (seed) => {
      const lines = tangle(seed, 60, 8);
      const { nodes, segments, report } = buildNetwork(lines);
      const drawnM = lines.reduce((total, { positions }) => total + lineLengthM(positions), 0);
      const droppedM = report.duplicates.reduce((total, { lengthM }) => total + lengthM, 0);
      expect(report.lengthKm * 1000 + droppedM).toBeCloseTo(drawnM, 3);
      expect(report.components.reduce((total, part) => total + part.segments, 0)).toBe(segments.length);
      expect(nodes.reduce((total, { degree }) => total + degree, 0)).toBe(segments.length * 2);
      for (const { fromNode, toNode, positions, lengthM } of segments) {
        expect(nodes[fromNode]?.position).toEqual(positions[0]);
        expect(nodes[toNode]?.position).toEqual(positions.at(-1));
        expect(lengthM).toBeGreaterThan(0);
      }
    },
  );

  it('no place stands inside one segment and at the end of another (seeds 1 to 8)', () => {
    for (let seed = 1; seed <= 8; seed += 1) {
      const { nodes, segments } = buildNetwork(tangle(seed, 60, 8));
      const ends = new Set(nodes.map(({ position }) => position.join()));
      const inner = segments.flatMap(({ positions }) => positions.slice(1, -1).map((place) => place.join()));
      expect(inner.filter((place) => ends.has(place))).toEqual([]);
      expect(new Set(inner).size).toBe(inner.length);
    }
  });

  it('builds 6,000 lines of 12 vertices in under two seconds of one core', () => {
    const next = random(99);
    const lines = Array.from({ length: 6000 }, (_, id) => {
      const [column, row] = [next(400), next(400)];
      return line(
        String(id),
        Array.from({ length: 12 }, (_, step) => at(column + step, row + (id % 2) * step)),
      );
    });
    // the processor's time, and the best of three: the machine may be busy with other things
    const takenMs = [1, 2, 3].map(() => {
      const started = process.cpuUsage();
      buildNetwork(lines);
      return process.cpuUsage(started).user / 1000;
    });
    expect(Math.min(...takenMs)).toBeLessThan(2000);
    const { segments } = buildNetwork(lines);
    expect(segments.length).toBeGreaterThan(6000);
  });
});
