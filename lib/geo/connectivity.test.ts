import { describe, expect, it } from 'vitest';
import { type Arc, findParts, findReach, findRounds } from './connectivity';

const two = (from: number, to: number): Arc => ({ from, to, isOneWay: false });
const one = (from: number, to: number): Arc => ({ from, to, isOneWay: true });

describe('connection', () => {
  it('counts parts whatever the direction', () => {
    expect([...findParts(5, [one(1, 0), one(1, 2), two(3, 4)])]).toEqual([0, 0, 0, 1, 1]);
    expect([...findParts(2, [])]).toEqual([0, 1]);
  });

  it('a one-way ring is one round, a one-way chain is as many as it has nodes', () => {
    expect(new Set(findRounds(3, [one(0, 1), one(1, 2), one(2, 0)])).size).toBe(1);
    expect(new Set(findRounds(3, [one(0, 1), one(1, 2)])).size).toBe(3);
  });

  it('tells the street one cannot leave from the street one cannot enter and the road that passes by', () => {
    //   0 ══ 1 → 2 → 3        2, 3: no way out
    //   ║    ↑                4: no way in
    //   5    4 → 6            6: past the core, never to it
    const reach = findReach(7, [two(0, 1), two(0, 5), one(1, 2), one(2, 3), one(4, 1), one(4, 6)]);
    expect(reach).toEqual(['core', 'core', 'no-way-out', 'no-way-out', 'no-way-in', 'core', 'through-only']);
  });

  it('agrees with walking every pair on 40 random graphs of 12 nodes', () => {
    let state = 7;
    const next = (limit: number) => {
      state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
      return Math.floor((state / 2 ** 32) * limit);
    };
    for (let graph = 0; graph < 40; graph += 1) {
      const arcs = Array.from({ length: 16 }, () => ({ from: next(12), to: next(12), isOneWay: next(2) === 0 }));
      const canReach = Array.from({ length: 12 }, (_, row) =>
        Array.from({ length: 12 }, (_, column) => row === column),
      );
      for (const { from, to, isOneWay } of arcs) {
        canReach[from]?.splice(to, 1, true);
        if (!isOneWay) canReach[to]?.splice(from, 1, true);
      }
      for (let via = 0; via < 12; via += 1)
        for (let from = 0; from < 12; from += 1)
          for (let to = 0; to < 12; to += 1)
            if (canReach[from]?.[via] && canReach[via]?.[to]) canReach[from]?.splice(to, 1, true);
      const rounds = findRounds(12, arcs);
      for (let from = 0; from < 12; from += 1)
        for (let to = 0; to < 12; to += 1)
          expect(rounds[from] === rounds[to]).toBe(canReach[from]?.[to] === true && canReach[to]?.[from] === true);
    }
  });
});
