import { KG_PER_SHORT_TON } from './convert';
import { THIN_SPACE } from './format';
import { type UnitSystem } from './quantity';

const unitsPerTonne: Readonly<Record<UnitSystem, number>> = { metric: 1, us: 1000 / KG_PER_SHORT_TON };

/** What a price is given per: `t` or `ton` (the short ton of 2000 lb). */
export const priceMass: Readonly<Record<UnitSystem, string>> = { metric: 't', us: 'ton' };

/**
 * Integer cents as an amount, with thin-space thousands: `formatMoney(1894012, 'EUR')` is `€ 18 940.12`,
 * with `digits` 0 `€ 18 940`. A negative amount has a true minus before the sign. Any ISO 4217 code; one without a
 * sign of its own shows the code. NaN and broken cents throw RangeError.
 */
export function formatMoney(costCents: number, currency: string, digits: 0 | 2 = 2): string {
  if (!Number.isInteger(costCents)) throw new RangeError(`Money is whole cents, not ${costCents}`);
  const parts = new Intl.NumberFormat('en', { style: 'currency', currency, currencyDisplay: 'narrowSymbol' });
  const sign = parts.formatToParts(0).find((part) => part.type === 'currency')?.value ?? currency;
  const [whole = '0', fraction] = (Math.abs(costCents) / 100).toFixed(digits).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
  return `${costCents < 0 ? '\u2212' : ''}${sign}\u00A0${grouped}${fraction === undefined ? '' : `.${fraction}`}`;
}

/** Cents per tonne → the price in whole currency units per tonne or short ton, unrounded. 6000 is 60, or 54.43 per ton. */
export function pricePerMass(costCentsPerTonne: number, system: UnitSystem): number {
  return costCentsPerTonne / 100 / unitsPerTonne[system];
}

/** A typed price per tonne or short ton → whole cents per tonne; the inverse of `pricePerMass` to half a cent. */
export function centsPerTonne(price: number, system: UnitSystem): number {
  return Math.round(price * unitsPerTonne[system] * 100);
}
