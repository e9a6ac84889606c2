import { describe, expect, it } from 'vitest';
import { fromLocalField, toLocalField } from './zoned-time';

describe('a time typed on the agency’s clock', () => {
  it('04:10 in Oslo is 03:10 UTC, and comes back as typed', () => {
    expect(fromLocalField('2026-12-01T04:10', 'Europe/Oslo')).toBe(Date.UTC(2026, 11, 1, 3, 10));
    expect(toLocalField(Date.UTC(2026, 11, 1, 3, 10), 'Europe/Oslo')).toBe('2026-12-01T04:10');
    expect(fromLocalField('2026-12-01T23:40', 'America/St_Johns')).toBe(Date.UTC(2026, 11, 2, 3, 10));
  });

  it('on the day the clocks go back 01:30 is before the change and 03:30 after it', () => {
    expect(fromLocalField('2026-10-25T01:30', 'Europe/Oslo')).toBe(Date.UTC(2026, 9, 24, 23, 30));
    expect(fromLocalField('2026-10-25T02:30', 'Europe/Oslo')).toBe(Date.UTC(2026, 9, 25, 0, 30));
    expect(fromLocalField('2026-10-25T03:30', 'Europe/Oslo')).toBe(Date.UTC(2026, 9, 25, 2, 30));
  });

  it('nothing typed is no time', () => {
    expect(fromLocalField('', 'UTC')).toBeNull();
  });
});
