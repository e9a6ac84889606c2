import { describe, expect, it } from 'vitest';
import { forecastIssuedAt, pavementErrorC } from './forecast';
import { readingsBetween, stationCount, weatherAt } from './weather';

const hour = 3_600_000;
const after = (anchorAt: Date, hours: number) => new Date(anchorAt.getTime() + hours * hour);
// The demo may be made at any hour of the day: the scenario must hold for all of them.
const anchors = [0, 5, 9, 14, 19].map((atHour) => new Date(Date.UTC(2026, 11, 8, atHour, 20)));

describe('the weather of Skerrow', () => {
  it('is two weeks of ten-minute readings of six stations: 12,096 of them, in steps of ten minutes', () => {
    const [anchorAt] = anchors;
    if (!anchorAt) return;
    const readings = readingsBetween({ fromAt: after(anchorAt, -14 * 24), untilAt: anchorAt, anchorAt });
    expect(readings.length).toBe(14 * 144 * stationCount);
    expect(readings.at(-1)?.observedAt).toEqual(anchorAt);
  });

  it('is the same again for the same time and anchor', () => {
    for (const anchorAt of anchors) {
      const once = readingsBetween({ fromAt: after(anchorAt, -10), untilAt: after(anchorAt, 20), anchorAt });
      const twice = readingsBetween({ fromAt: after(anchorAt, -10), untilAt: after(anchorAt, 20), anchorAt });
      expect(twice).toEqual(once);
    }
  });

  it('never has a dew point above the air, nor a humidity above 1 or below 0.5', () => {
    for (const anchorAt of anchors.slice(0, 3)) {
      const span = { fromAt: after(anchorAt, -336), untilAt: after(anchorAt, 48), anchorAt };
      const wrong = readingsBetween(span).filter(
        ({ dewPointC, airTempC, relativeHumidity, pavementTempC, windSpeedMPerS, windDirectionDeg }) =>
          dewPointC > airTempC ||
          relativeHumidity > 1 ||
          relativeHumidity <= 0.5 ||
          !Number.isFinite(pavementTempC + windSpeedMPerS + windDirectionDeg),
      );
      expect(wrong).toEqual([]);
    }
  });

  it('falls to −6.6 ± 0.8 °C on the ridge about four hours after the anchor and thaws by ten', () => {
    for (const anchorAt of anchors) {
      const ridge = Array.from({ length: 97 }, (_, step) => weatherAt(0, after(anchorAt, -6 + step / 6), anchorAt));
      const coldest = Math.min(...ridge.map(({ pavementTempC }) => pavementTempC));
      const coldestAtH = -6 + ridge.findIndex(({ pavementTempC }) => pavementTempC === coldest) / 6;
      expect(coldest).toBeGreaterThan(-7.4);
      expect(coldest).toBeLessThan(-5.8);
      expect(coldestAtH).toBeGreaterThan(2);
      expect(coldestAtH).toBeLessThan(6);
      expect(weatherAt(2, after(anchorAt, 10.5), anchorAt).pavementTempC).toBeGreaterThan(0);
    }
  });

  it('begins to snow eight and a half hours before the anchor and turns to freezing drizzle after it', () => {
    for (const anchorAt of anchors) {
      expect(weatherAt(1, after(anchorAt, -2), anchorAt).precipitationType).toBe('snow');
      expect(weatherAt(1, after(anchorAt, 3), anchorAt).precipitationType).toBe('freezing-drizzle');
      expect(weatherAt(1, after(anchorAt, -9.2), anchorAt).precipitationType).not.toBe('snow');
      const totalMm = readingsBetween({ fromAt: after(anchorAt, -9), untilAt: after(anchorAt, 10.5), anchorAt })
        .filter(({ stationIndex }) => stationIndex === 1)
        .reduce((sum, { precipitationMm }) => sum + precipitationMm, 0);
      expect(totalMm).toBeGreaterThan(3);
      expect(totalMm).toBeLessThan(6);
    }
  });

  it('snowed for some fourteen hours six days before, and twice there was frost without a storm', () => {
    for (const anchorAt of anchors) {
      const readings = readingsBetween({
        fromAt: after(anchorAt, -336),
        untilAt: after(anchorAt, -20),
        anchorAt,
      }).filter(({ stationIndex }) => stationIndex === 4);
      const snowH = readings.filter(({ precipitationType }) => precipitationType === 'snow').length / 6;
      expect(snowH).toBeGreaterThan(12);
      expect(snowH).toBeLessThan(16);
      const frostDays = new Set(
        readings
          .filter(({ surfaceStatus }) => surfaceStatus === 'frost')
          .map(({ observedAt }) => observedAt.toISOString().slice(0, 10)),
      );
      expect(frostDays.size).toBeGreaterThanOrEqual(2);
    }
  });

  it('moves smoothly: no pavement changes by more than 0.8 °C in ten minutes', () => {
    for (const anchorAt of anchors) {
      for (let step = -336 * 6; step < 60 * 6; step += 1) {
        const now = weatherAt(0, after(anchorAt, step / 6), anchorAt).pavementTempC;
        const next = weatherAt(0, after(anchorAt, (step + 1) / 6), anchorAt).pavementTempC;
        expect(Math.abs(next - now)).toBeLessThan(0.8);
      }
    }
  });

  it('refuses a seventh station', () => {
    expect(() => weatherAt(6, new Date(0), new Date(0))).toThrow(RangeError);
  });
});

describe('the forecasts for Skerrow', () => {
  it('are 36 hours of six stations, wrong by more the further ahead', () => {
    const [anchorAt] = anchors;
    if (!anchorAt) return;
    const misses = new Map<number, number[]>();
    for (let issue = -40; issue < 0; issue += 1) {
      const issueAt = new Date(Math.floor(anchorAt.getTime() / hour) * hour + issue * hour);
      const hours = forecastIssuedAt(issueAt, anchorAt);
      expect(hours.length).toBe(36 * stationCount);
      for (const { stationIndex, validAt, pavementTempC, dewPointC, airTempC } of hours) {
        const leadH = (validAt.getTime() - issueAt.getTime()) / hour;
        const miss = Math.abs(pavementTempC - weatherAt(stationIndex, validAt, anchorAt).pavementTempC);
        misses.set(leadH, [...(misses.get(leadH) ?? []), miss]);
        expect(dewPointC).toBeLessThanOrEqual(airTempC);
      }
    }
    const meanMiss = (leadH: number) => {
      const list = misses.get(leadH) ?? [];
      return list.reduce((sum, miss) => sum + miss, 0) / list.length;
    };
    expect(meanMiss(2)).toBeLessThan(0.6);
    expect(meanMiss(30)).toBeGreaterThan(meanMiss(3) * 1.5);
    expect(pavementErrorC(36)).toBeCloseTo(2.13, 2);
  });
});
