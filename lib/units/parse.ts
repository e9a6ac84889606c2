import { displayUnits, fromDisplay, type Quantity, type UnitSystem } from './quantity';

export type ParsedQuantity =
  | { readonly ok: true; readonly value: number }
  | { readonly ok: false; readonly reason: 'empty' | 'not-a-number' | 'ambiguous-separator' };

const spaces = /[\s\u00A0\u2009\u202F']/g;

/** Plain digits with a point, or null when two readings are possible. */
function withPoint(digits: string): string | null {
  const lastComma = digits.lastIndexOf(',');
  const lastPoint = digits.lastIndexOf('.');
  if (lastComma < 0) return digits;
  if (lastPoint >= 0) {
    const [decimal, group] = lastComma > lastPoint ? [',', '.'] : ['.', ','];
    return digits.replaceAll(group, '').replace(decimal, '.');
  }
  const groups = digits.replace(/^[+-]/, '').split(',');
  if (groups.length > 2)
    return groups.slice(1).every((part) => part.length === 3) ? digits.replaceAll(',', '') : digits;
  const [whole = '', tail = ''] = groups;
  const couldBeThousands = tail.length === 3 && /^[1-9]\d{0,2}$/.test(whole);
  return couldBeThousands ? null : digits.replace(',', '.');
}

/**
 * A typed number in the person's units → SI. Decimal point and decimal comma both count, as do spaces between
 * thousands, either minus sign, and the unit's own label behind the number. `parseQuantity('23', 'temperature', 'us')` is −5 °C.
 *
 * `1,234` is refused as ambiguous: it is one and a bit to some and over a thousand to others, and a rate must not be guessed.
 */
export function parseQuantity(text: string, quantity: Quantity, system: UnitSystem): ParsedQuantity {
  const { unit } = displayUnits[quantity][system];
  const bare = text.trim();
  if (bare === '') return { ok: false, reason: 'empty' };
  const withoutUnit = unit !== '' && bare.endsWith(unit) ? bare.slice(0, -unit.length) : bare;
  const digits = withPoint(withoutUnit.replace(spaces, '').replace(/^\u2212/, '-'));
  if (digits === null) return { ok: false, reason: 'ambiguous-separator' };
  if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(digits)) return { ok: false, reason: 'not-a-number' };
  return { ok: true, value: fromDisplay(Number(digits), quantity, system) };
}
