import { describe, expect, it } from 'vitest';
import { stepAxis } from '../time/step-axis';
import { carry, carryParts, siteOffsetC, type Site } from './carry';
import { readingStatus, stationSeries, type Station, type StationReading } from './station-series';

const hourMs = 3_600_000;
const nowAt = Date.UTC(2026, 11, 1, 3);
const axis = stepAxis({ fromAt: nowAt - 2 * hourMs, untilAt: nowAt + 6 * hourMs, stepMin: 10 });
const nowIndex = 12;

function reading(at: number, pavementTempC: number | null, more: Partial<StationReading> = {}): StationReading {
  return {
    at,
    pavementTempC,
    precipitationMm: 0,
    precipitationType: 'none',
    waterMm: null,
    windSpeedMPerS: null,
    isFlagged: false,
    ...more,
  };
}

/** Measured −2 °C until now; the forecast says −3 °C throughout, with 0.6 mm of snow in each hour. */
function station(id: number, change: Partial<Station> = {}): Station {
  return {
    id,
    latDeg: 60,
    lonDeg: 0.01 * id,
    heightM: 0,
    readings: Array.from({ length: 13 }, (_, index) => reading(nowAt - (12 - index) * 600_000, -2)),
    forecast: Array.from({ length: 9 }, (_, index) => ({
      validAt: nowAt + (index - 2) * hourMs,
      pavementTempC: -3,
      pavementErrorC: 1,
      precipitationMm: 0.6,
      precipitationType: 'snow',
      windSpeedMPerS: 5,
    })),
    ...change,
  };
}

const site: Site = { latDeg: 60, lonDeg: 0.01, heightM: 0, exposure: 'open', isBridge: false };

describe('a station on the steps', () => {
  it('is measured until now, then the forecast drawn to the last reading over six hours', () => {
    const { tempsC, errorC, status } = stationSeries(station(1), axis, nowAt);
    expect(status).toBe('current');
    expect(tempsC[nowIndex]).toBe(-2);
    expect(tempsC[nowIndex + 18]).toBeCloseTo(-2.5, 9);
    expect(tempsC[nowIndex + 36]).toBeCloseTo(-3, 9);
    expect([errorC[nowIndex], errorC[nowIndex + 6]]).toEqual([0, 1]);
  });

  it('shares an hour of forecast snow among its steps, and measured amounts stand before it', () => {
    const { precipitationMm, precipitationTypes } = stationSeries(station(1), axis, nowAt);
    expect(precipitationMm[nowIndex]).toBe(0);
    expect(precipitationMm[nowIndex + 1]).toBeCloseTo(0.1, 9);
    expect(precipitationTypes[nowIndex + 1]).toBe('snow');
    const hourly = station(1, {
      readings: [reading(nowAt - hourMs, -2), reading(nowAt, -2, { precipitationMm: 1.2, precipitationType: 'rain' })],
    });
    expect(stationSeries(hourly, axis, nowAt).precipitationMm[nowIndex - 2]).toBeCloseTo(0.2, 9);
  });

  it('31 min old is stale, 121 min old is missing and no longer draws the forecast', () => {
    expect(readingStatus(nowAt - 30 * 60_000, nowAt).status).toBe('current');
    expect(readingStatus(nowAt - 31 * 60_000, nowAt).status).toBe('stale');
    expect(readingStatus(nowAt - 121 * 60_000, nowAt).status).toBe('missing');
    expect(readingStatus(null, nowAt)).toEqual({ status: 'missing', ageMin: null });
    const silent = station(1, { readings: [reading(nowAt - 121 * 60_000, -9)] });
    const series = stationSeries(silent, axis, nowAt);
    expect(series.tempsC[nowIndex]).toBeCloseTo(-3, 9);
    expect(series.status).toBe('missing');
  });

  it('a flagged reading and one from after now drive nothing', () => {
    const readings = [
      ...station(1).readings.slice(0, -1),
      reading(nowAt, 40, { isFlagged: true }),
      reading(nowAt + 1, 30),
    ];
    const series = stationSeries(station(1, { readings }), axis, nowAt);
    expect(series.tempsC[nowIndex]).toBeLessThan(-1.9);
    expect(series.isNewestFlagged).toBe(true);
  });

  it('without readings and forecast a temperature is unknown, never 0', () => {
    expect(stationSeries(station(1, { readings: [], forecast: [] }), axis, nowAt).tempsC[nowIndex]).toBeNaN();
  });
});

describe('carrying to a road', () => {
  const stations = [1, 2, 5, 9].map((id) => station(id));
  const series = (list: readonly Station[]) => ({
    series: list.map((one) => stationSeries(one, axis, nowAt)),
    count: axis.count,
  });

  it('uses the three nearest stations, the nearest most, weights adding up to 1', () => {
    const parts = carryParts(site, stations);
    expect(parts.map(({ stationIndex }) => stationIndex)).toEqual([0, 1, 2]);
    expect(parts.reduce((sum, { weight }) => sum + weight, 0)).toBeCloseTo(1, 12);
    expect(parts[0]?.weight).toBeGreaterThan(0.8);
  });

  it('a road beyond the reach of every station is unknown, never that station’s temperature', () => {
    const far = { ...site, latDeg: 60.9 };
    expect(carryParts(far, stations)).toEqual([]);
    const { tempsC, status } = carry(far, carryParts(far, stations), series(stations));
    expect(tempsC.every((tempC) => Number.isNaN(tempC))).toBe(true);
    expect(status).toBe('missing');
  });

  it('alike stations give their own temperature, 100 m higher is 0.65 °C colder, a bridge a degree', () => {
    const at = (change: Partial<Site>) => {
      const here = { ...site, ...change };
      return carry(here, carryParts(here, stations), series(stations)).tempsC[nowIndex];
    };
    expect(at({})).toBeCloseTo(-2, 9);
    expect(at({ heightM: 100 })).toBeCloseTo(-2.65, 9);
    expect(at({ isBridge: true })).toBeCloseTo(-3, 9);
    expect(at({ exposure: 'ridge' })).toBeLessThan(at({ exposure: 'shore' }) ?? -Infinity);
    expect(siteOffsetC(site)).toBe(0);
  });

  it('a silent neighbour is left out where it knows nothing, and the best-informed station speaks for the age', () => {
    const half = [station(1, { readings: [], forecast: [] }), station(2)];
    const carried = carry(site, carryParts(site, half), series(half));
    expect(carried.tempsC[nowIndex]).toBeCloseTo(-2, 9);
    expect(carried).toMatchObject({ source: 'measured', status: 'current', ageMin: 0, stationIds: [1, 2] });
  });

  it('with forecasts alone the source says so; without anything it is missing', () => {
    const forecastOnly = [station(1, { readings: [] })];
    expect(carry(site, carryParts(site, forecastOnly), series(forecastOnly))).toMatchObject({ source: 'forecast' });
    expect(carry(site, [], series([]))).toMatchObject({ status: 'missing', source: 'forecast', stationIds: [] });
  });

  it('no snow falls in a tunnel', () => {
    const tunnel = { ...site, isTunnel: true };
    const { precipitationMm } = carry(tunnel, carryParts(tunnel, stations), series(stations));
    expect(precipitationMm.every((mm) => mm === 0)).toBe(true);
  });
});
