/**
 * A stream of numbers in [0, 1) that is the same for the same seed: mulberry32, a 32-bit
 * generator in the public domain (T. Ettinger, 2017). Good enough to draw a map, not for secrets.
 */
export type Random = () => number;

export function createRandom(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

/** A number in [0, 1) that depends on nothing but the seed and two whole numbers. */
export function hashUnit(seed: number, i: number, j = 0): number {
  let mixed = Math.imul(seed ^ 0x9e3779b9, 0x85ebca6b) ^ Math.imul(i | 0, 0xc2b2ae35) ^ Math.imul(j | 0, 0x27d4eb2f);
  mixed = Math.imul(mixed ^ (mixed >>> 15), 0x2c1b3c6d);
  mixed = Math.imul(mixed ^ (mixed >>> 12), 0x297a2d39);
  return ((mixed ^ (mixed >>> 15)) >>> 0) / 4294967296;
}

const ease = (t: number) => t * t * t * (t * (t * 6 - 15) + 10);

/** Smooth noise in [−1, 1] along a line: random values at whole numbers, eased between. */
export function lineNoise(seed: number, t: number): number {
  const left = Math.floor(t);
  const share = ease(t - left);
  return 2 * (hashUnit(seed, left) * (1 - share) + hashUnit(seed, left + 1) * share) - 1;
}

/** Smooth noise in [−1, 1] over the plane: random values at whole-numbered corners, eased between. */
export function planeNoise(seed: number, x: number, y: number): number {
  const i = Math.floor(x);
  const j = Math.floor(y);
  const across = ease(x - i);
  const up = ease(y - j);
  const low = hashUnit(seed, i, j) * (1 - across) + hashUnit(seed, i + 1, j) * across;
  const high = hashUnit(seed, i, j + 1) * (1 - across) + hashUnit(seed, i + 1, j + 1) * across;
  return 2 * (low * (1 - up) + high * up) - 1;
}
