import { describe, expect, it } from 'vitest';
import { checkPlace } from './place-check';
import { type Bounds } from './position';

const home: Bounds = [11.4, 49.9, 11.6, 50.1];

describe('where a file lies', () => {
  it('near the network, or with no network yet, there is nothing to say', () => {
    expect(checkPlace([11.9, 50.2, 12, 50.3], home)).toEqual([]);
    expect(checkPlace([0, 40, 11.5, 50], home)).toEqual([]);
    expect(checkPlace(home, null)).toEqual([]);
    expect(checkPlace(null, home)).toEqual([]);
  });

  it('latitude written first is recognised by where it would belong', () => {
    expect(checkPlace([50, 11.5, 50.1, 11.6], home)).toMatchObject([{ kind: 'swapped-coordinates' }]);
  });

  it('another country is named with its distance', () => {
    const [warning] = checkPlace([11.4, 54.9, 11.6, 55.1], home);
    expect(warning).toMatchObject({ kind: 'far-away', at: null });
    // 4.8 degrees of latitude from box to box
    expect(warning?.sentence).toContain('about 530 km');
  });
});
