import { describe, expect, it } from 'vitest';
import { decodePolyline } from './encoded-polyline';

describe('an encoded polyline', () => {
  it('gives back three points of a line across the equator’s side of the world', () => {
    expect(decodePolyline('_p~iF~ps|U_ulLnnqC_mqNvxq`@')).toEqual([
      [38.5, -120.2],
      [40.7, -120.95],
      [43.252, -126.453],
    ]);
  });

  it('is no point for no text', () => {
    expect(decodePolyline('')).toEqual([]);
  });

  it('refuses a text cut within a number', () => {
    expect(() => decodePolyline('_p~iF~ps|U_ulLnnqC_mqNvxq')).toThrow(RangeError);
  });
});
