import { displayUnits, toDisplay, type Quantity, type UnitSystem } from './quantity';

export { type Quantity, type UnitSystem } from './quantity';
export { parseQuantity, type ParsedQuantity } from './parse';

/** U+2212: as wide as a digit, so that signed columns line up. */
export const MINUS = '\u2212';
/** U+202F, the thin space that does not break a line: between groups of three digits. */
export const THIN_SPACE = '\u202F';

export interface FormatOptions {
  /** Decimals; the quantity's own default when absent. */
  readonly digits?: number;
  /** Show `+` before what is above zero: for differences. */
  readonly signed?: boolean;
}

function requireNumber(value: number): void {
  if (Number.isNaN(value)) throw new RangeError('A figure to be shown must be a number, not NaN');
}

function signOf(isNegative: boolean, isZero: boolean, signed: boolean): string {
  if (isZero) return '';
  if (isNegative) return MINUS;
  return signed ? '+' : '';
}

/**
 * A plain number as text: true minus, thin-space thousands, fixed decimals. What rounds to zero has no sign.
 * `formatNumber(-1234.56, 1)` is `−1 234.6`. Infinity is `∞`; NaN is a slip of the caller and throws RangeError.
 */
export function formatNumber(value: number, digits: number, signed = false): string {
  requireNumber(value);
  if (!Number.isFinite(value)) return `${signOf(value < 0, false, signed)}∞`;
  const fixed = Math.abs(value).toFixed(digits);
  const [whole = '0', fraction] = fixed.split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
  const sign = signOf(value < 0, Number(fixed) === 0, signed);
  return `${sign}${grouped}${fraction === undefined ? '' : `.${fraction}`}`;
}

/**
 * An SI value as it stands on the glass, number and unit apart so that the unit can be set lighter.
 * Units in are those named at `Quantity`. `formatQuantity(-5, 'temperature', 'us')` is `{ value: '23.0', unit: '°F' }`.
 */
export function formatQuantity(
  value: number,
  quantity: Quantity,
  system: UnitSystem,
  options: FormatOptions = {},
): { value: string; unit: string } {
  const { unit, digits } = displayUnits[quantity][system];
  const text = formatNumber(toDisplay(value, quantity, system), options.digits ?? digits, options.signed);
  return { value: text, unit };
}

/**
 * Minutes as hours and minutes: 35 is `0:35`, −25 is `−0:25`, 1500 is `25:00`. Rounded to the nearest minute;
 * `signed` puts `+` before what is above zero. Infinity is `∞`; NaN throws RangeError.
 */
export function formatDuration(minutes: number, signed = false): string {
  requireNumber(minutes);
  if (!Number.isFinite(minutes)) return `${signOf(minutes < 0, false, signed)}∞`;
  const whole = Math.round(Math.abs(minutes));
  const sign = signOf(minutes < 0, whole === 0, signed);
  return `${sign}${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, '0')}`;
}
