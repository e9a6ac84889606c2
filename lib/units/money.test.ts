import { describe, expect, it } from 'vitest';
import { centsPerTonne, formatMoney, pricePerMass } from './money';

describe('money', () => {
  it('1 894 012 cents are € 18 940.12, or € 18 940 without cents', () => {
    expect(formatMoney(1_894_012, 'EUR')).toBe('€\u00A018\u202F940.12');
    expect(formatMoney(1_894_012, 'EUR', 0)).toBe('€\u00A018\u202F940');
  });

  it('an amount owed has a true minus', () => {
    expect(formatMoney(-50, 'USD')).toBe('\u2212$\u00A00.50');
  });

  it('a broken cent is a slip of the caller', () => {
    expect(() => formatMoney(0.5, 'EUR')).toThrow(RangeError);
  });

  it('60 per tonne is 54.43 per short ton, and comes back', () => {
    expect(pricePerMass(6000, 'us')).toBeCloseTo(54.431, 3);
    expect(centsPerTonne(pricePerMass(6000, 'us'), 'us')).toBe(6000);
    expect(centsPerTonne(95.5, 'metric')).toBe(9550);
  });
});
