import { describe, expect, it } from 'vitest';
import { activeItem } from './nav-items';

const items = [
  { href: '/roads', label: 'Roads' },
  { href: '/setup', label: 'Set-up' },
  { href: '/setup/roads', label: 'Network' },
];

describe('the active item', () => {
  it('is the longest that the address belongs to', () => {
    expect(activeItem(items, '/setup/roads/12')?.label).toBe('Network');
    expect(activeItem(items, '/setup/people')?.label).toBe('Set-up');
  });

  it('is none for a place that only begins with the same letters', () => {
    expect(activeItem(items, '/roadside')).toBeNull();
  });
});
