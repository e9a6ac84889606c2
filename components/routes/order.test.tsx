import { describe, expect, it } from 'vitest';
import { moveTo } from './order';

describe('order of roads', () => {
  it('moves one and keeps the rest in order', () => {
    expect(moveTo(['a', 'b', 'c', 'd'], 0, 2)).toEqual(['b', 'c', 'a', 'd']);
    expect(moveTo(['a', 'b', 'c', 'd'], 3, 1)).toEqual(['a', 'd', 'b', 'c']);
  });

  it('stays as it is past either end', () => {
    expect(moveTo(['a', 'b'], 0, -1)).toEqual(['a', 'b']);
    expect(moveTo(['a', 'b'], 1, 2)).toEqual(['a', 'b']);
  });
});
