import { describe, expect, it } from 'vitest';
import * as convert from './convert';
import { MINUS, THIN_SPACE, formatDuration, formatNumber, formatQuantity } from './format';
import { parseQuantity } from './parse';
import { displayUnits, fromDisplay, toDisplay, type Quantity, type UnitSystem } from './quantity';

const quantities = Object.keys(displayUnits) as Quantity[];
const systems: readonly UnitSystem[] = ['metric', 'us'];

describe('conversions', () => {
  it('puts 100 lb/lane-mile at 7.7059 g/m² on the 12-ft lane and 9.3955 on a 3-m lane', () => {
    expect(convert.lbPerLaneMileToGPerM2(100)).toBeCloseTo(7.70584, 4);
    expect(convert.lbPerLaneMileToGPerM2(100, 3)).toBeCloseTo((7.70584 * 3.6576) / 3, 4);
  });

  it('makes each pair of opposite conversions undo each other', () => {
    const pairs: readonly [(x: number) => number, (x: number) => number][] = [
      [convert.gPerM2ToLbPerLaneMile, convert.lbPerLaneMileToGPerM2],
      [convert.mLPerM2ToGalPerLaneMile, convert.galPerLaneMileToMLPerM2],
      [convert.lbPerLaneMileToKgPerLaneKm, convert.kgPerLaneKmToLbPerLaneMile],
      [convert.galPerShortTonToLPerTonne, convert.lPerTonneToGalPerShortTon],
      [convert.kgToLb, convert.lbToKg],
      [convert.kgToShortTon, convert.shortTonToKg],
      [convert.litresToUsGal, convert.usGalToLitres],
      [convert.cToF, convert.fToC],
      [convert.cDifferenceToF, convert.fDifferenceToC],
      [convert.kmToMile, convert.mileToKm],
      [convert.mToFt, convert.ftToM],
      [convert.mmToInch, convert.inchToMm],
      [convert.mPerSToKmPerH, convert.kmPerHToMPerS],
      [convert.mPerSToMph, convert.mphToMPerS],
      [convert.kmPerHToMph, convert.mphToKmPerH],
      [convert.kgPerM3ToLbPerUsGal, convert.lbPerUsGalToKgPerM3],
      [convert.kgPerM3ToLbPerCuFt, convert.lbPerCuFtToKgPerM3],
    ];
    for (const [there, back] of pairs) for (const x of [-40, 0, 0.37, 1234.5]) expect(back(there(x))).toBeCloseTo(x, 9);
  });

  it('agrees between the conversion functions and the units on the glass', () => {
    expect(toDisplay(20, 'rate', 'us')).toBeCloseTo(convert.gPerM2ToLbPerLaneMile(20), 9);
    expect(toDisplay(20, 'liquidRate', 'us')).toBeCloseTo(convert.mLPerM2ToGalPerLaneMile(20), 9);
    expect(toDisplay(-7, 'temperature', 'us')).toBeCloseTo(convert.cToF(-7), 9);
    expect(toDisplay(33.382, 'prewetDose', 'us')).toBeCloseTo(8, 3);
    expect(toDisplay(1000, 'density', 'us')).toBeCloseTo(convert.kgPerM3ToLbPerUsGal(1000), 9);
    expect(convert.knotsToMPerS(1)).toBeCloseTo(0.514444, 6);
  });

  it('comes back from the glass for every quantity in both systems', () => {
    for (const quantity of quantities)
      for (const system of systems) {
        expect(fromDisplay(toDisplay(-3.25, quantity, system), quantity, system)).toBeCloseTo(-3.25, 9);
      }
  });
});

describe('formatting', () => {
  it('uses a true minus and thin-space thousands', () => {
    expect(formatNumber(-1234567.89, 1)).toBe(`${MINUS}1${THIN_SPACE}234${THIN_SPACE}567.9`);
    expect(formatNumber(999, 0)).toBe('999');
    expect(formatNumber(0.1234, 4)).toBe('0.1234');
  });

  it('gives no sign to what rounds to zero', () => {
    expect(formatNumber(-0.04, 1)).toBe('0.0');
    expect(formatNumber(0.04, 1, true)).toBe('0.0');
    expect(formatDuration(-0.4)).toBe('0:00');
  });

  it('shows a difference with its sign and without the offset of the scale', () => {
    expect(formatQuantity(2, 'temperatureDifference', 'us', { signed: true })).toEqual({ value: '+3.6', unit: '°F' });
    expect(formatQuantity(2, 'temperature', 'us')).toEqual({ value: '35.6', unit: '°F' });
  });

  it('shows rates, lanes and strengths in both systems', () => {
    expect(formatQuantity(20, 'rate', 'us')).toEqual({ value: '260', unit: 'lb/lane-mile' });
    expect(formatQuantity(20, 'rate', 'metric', { digits: 0 })).toEqual({ value: '20', unit: 'g/m²' });
    expect(formatQuantity(400_000, 'laneDistance', 'metric')).toEqual({ value: '400.0', unit: 'lane-km' });
    expect(formatQuantity(0.233, 'percent', 'us')).toEqual({ value: '23.3', unit: '%' });
  });

  it('writes minutes as hours and minutes, with a sign where there is one', () => {
    expect(formatDuration(35)).toBe('0:35');
    expect(formatDuration(-25)).toBe(`${MINUS}0:25`);
    expect(formatDuration(59.6)).toBe('1:00');
    expect(formatDuration(90, true)).toBe('+1:30');
    expect(formatDuration(Infinity)).toBe('∞');
  });

  it('refuses NaN as a slip of the caller', () => {
    expect(() => formatQuantity(Number.NaN, 'rate', 'metric')).toThrow(RangeError);
    expect(() => formatDuration(Number.NaN)).toThrow(RangeError);
  });
});

describe('typed numbers', () => {
  it('reads decimal comma and point, both minus signs, and the unit behind', () => {
    for (const text of ['-7,5', '-7.5', `${MINUS}7.5`, ' -7.5 °C ', '-7.50']) {
      expect(parseQuantity(text, 'temperature', 'metric'), text).toEqual({ ok: true, value: -7.5 });
    }
    expect(parseQuantity('23.3 %', 'percent', 'metric')).toEqual({ ok: true, value: 0.233 });
  });

  it('reads thousands where only one reading is possible', () => {
    expect(parseQuantity('1 234,5', 'mass', 'metric')).toEqual({ ok: true, value: 1234.5 });
    expect(parseQuantity('1,234.5', 'mass', 'metric')).toEqual({ ok: true, value: 1234.5 });
    expect(parseQuantity('1.234,5', 'mass', 'metric')).toEqual({ ok: true, value: 1234.5 });
    expect(parseQuantity('1,234,567', 'mass', 'metric')).toEqual({ ok: true, value: 1234567 });
    expect(parseQuantity('0,125', 'mass', 'metric')).toEqual({ ok: true, value: 0.125 });
  });

  it('refuses what could be read two ways, what is no number, and nothing', () => {
    expect(parseQuantity('1,234', 'mass', 'us')).toEqual({ ok: false, reason: 'ambiguous-separator' });
    for (const text of ['abc', '1.2.3', '--4', '.', '1e5', '12 lb']) {
      expect(parseQuantity(text, 'mass', 'metric'), text).toEqual({ ok: false, reason: 'not-a-number' });
    }
    expect(parseQuantity('  ', 'mass', 'metric')).toEqual({ ok: false, reason: 'empty' });
  });

  it('reads back everything it shows, for every quantity in both systems', () => {
    for (const quantity of quantities)
      for (const system of systems) {
        const { value, unit } = formatQuantity(1234.5678, quantity, system, { digits: 9 });
        const parsed = parseQuantity(`${value} ${unit}`, quantity, system);
        expect(parsed.ok && Math.abs(parsed.value - 1234.5678) < 1e-4, `${quantity} ${system} ${value}`).toBe(true);
      }
  });
});
