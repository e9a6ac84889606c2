import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { packSteps, UNKNOWN_STEP } from '@/lib/contracts/packed-steps';
import { NO_END, type StormStateView } from '@/lib/contracts/storm-state';
import { type RoadNetwork } from './decode-roads';
import { decodeStorm, stripOf } from './decode-storm';
import { bandOf, bandRange, holdInFigures } from './margin-band';
import { nextPassAt } from './next-pass';
import { RefreezeList } from './refreeze-list';
import { bandsAt, byUrgency, longestMinAt, roadsAt } from './roads-at';

afterEach(cleanup);

const startAt = Date.UTC(2026, 11, 1, 2);
const minMs = 60_000;
const count = 4;
const row = (...values: number[]) => values;
const packed = (...rows: number[][]) => packSteps(Int16Array.from(rows.flat()), count);

/*
 * Four roads, four steps of 10 min from 02:00, now 02:10.
 *   1 Ridge   icing now, truck 4 comes at 02:35
 *   2 Bridge  holds 20 min from 02:10, truck 2 at 02:25
 *   3 Shore   dry and cold
 *   4 Lane    its stations are silent
 */
const view: StormStateView = {
  stormId: 7,
  number: 7,
  name: 'Snow',
  isClosed: false,
  dataVersion: 'x',
  nowAt: startAt + 10 * minMs,
  axis: { startAt, stepMin: 10, count },
  segmentIds: [1, 2, 3, 4],
  marginC: packed(
    row(50, -60, -80, -90),
    row(160, 120, 60, -10),
    row(-600, -600, -600, -600),
    row(300, 300, 300, UNKNOWN_STEP),
  ),
  pavementC: packed(
    row(-700, -710, -720, -730),
    row(-640, -640, -650, -650),
    row(-600, -600, -600, -600),
    row(-300, -300, -300, UNKNOWN_STEP),
  ),
  waterMm: packed(row(200, 200, 200, 200), row(180, 180, 180, 180), row(0, 0, 0, 0), row(100, 100, 100, 100)),
  massFraction: packed(row(900, 800, 700, 600), row(1200, 1100, 1000, 900), row(0, 0, 0, 0), row(900, 900, 900, 900)),
  holdSteps: packed(
    row(1, 0, 0, 0),
    row(3, 2, 1, 0),
    row(NO_END, NO_END, NO_END, NO_END),
    row(NO_END, NO_END, NO_END, UNKNOWN_STEP),
  ),
  statuses: '0002',
  stationOf: [0, 0, 0, 0],
  arrivalMin: [15, 5, null, 30],
  truckOf: [4, 2, null, 6],
  stations: [
    {
      id: 1,
      name: 'Ridge',
      status: 'current',
      newestAt: startAt + 10 * minMs,
      tempC: packed(row(-500, -510, -520, -530)),
      errorC: packed(row(0, 0, 20, 40)),
      precipitationMm: packed(row(0, 100, 200, 0)),
      precipitationTypes: [0, 3, 6, 0],
    },
  ],
  forecastIssuedAt: startAt,
  passes: [{ number: 4, startsAt: startAt + 20 * minMs }],
  materials: [],
  plan: null,
  plans: [],
  planned: null,
  last: [],
  treatedThisPass: 0,
  trucksOut: [],
};

const network: RoadNetwork = {
  version: '1',
  attribution: '',
  baseFeatures: [],
  facts: [],
  indexById: new Map(),
  segments: ['Ridge', 'Bridge', 'Shore', 'Lane'].map((name, index) => ({
    id: index + 1,
    name,
    serviceClass: 'A',
    lanes: 2,
    path: [],
  })),
};

const now = startAt + 10 * minMs;
const roadsNow = () => roadsAt(network, decodeStorm(view), now);

describe('roads at a time', () => {
  it('put what refreezes first first, and what is not known before what is clear', () => {
    expect(
      roadsNow()
        .toSorted(byUrgency)
        .map((road) => road.name),
    ).toEqual(['Ridge', 'Bridge', 'Lane', 'Shore']);
  });

  it('slack is hold minus the time to the next pass', () => {
    const [ridge, bridge, shore] = roadsNow();
    expect(ridge).toMatchObject({ band: 'frozen', holdMin: 0, nextPassMin: 25, slackMin: -25, truckNumber: 4 });
    expect(bridge).toMatchObject({ band: 'closing', holdMin: 20, nextPassMin: 15, slackMin: 5, pavementTempC: -6.4 });
    expect(shore).toMatchObject({ band: 'safe', holdMin: Infinity, nextPassMin: null, slackMin: null });
  });

  it('a road whose stations are silent is not known, and is never shown as clear', () => {
    const lane = roadsNow()[3];
    expect(lane).toMatchObject({ band: 'unknown', freezeMarginC: null, holdMin: null, slackMin: null });
    expect(bandsAt(network, decodeStorm(view), now).counts).toMatchObject({
      frozen: 1,
      closing: 1,
      safe: 1,
      unknown: 1,
    });
  });

  it('follow the cursor', () => {
    const later = roadsAt(network, decodeStorm(view), startAt + 30 * minMs);
    expect(later[1]).toMatchObject({ band: 'frozen', holdMin: 0 });
    expect(longestMinAt(decodeStorm(view), startAt + 30 * minMs)).toBe(0);
  });

  it('are all unknown without a storm', () => {
    expect(bandsAt(network, null, now).counts.unknown).toBe(4);
    expect(roadsAt(network, null, now).map((road) => road.band)).toEqual(Array(4).fill('unknown'));
  });
});

describe('the next pass', () => {
  const given = {
    passes: [{ startsAt: 0 }, { startsAt: 100 * minMs }],
    arrivalMin: 10,
    lastAt: null,
    nowAt: 5 * minMs,
  };

  it('is when its truck reaches the road', () => {
    expect(nextPassAt(given, 5 * minMs)).toBe(10 * minMs);
  });

  it('is due now when the pass under way is late, and the following one when it is done', () => {
    expect(nextPassAt({ ...given, nowAt: 30 * minMs }, 30 * minMs)).toBe(30 * minMs);
    expect(nextPassAt({ ...given, nowAt: 30 * minMs, lastAt: 9 * minMs }, 30 * minMs)).toBe(110 * minMs);
  });

  it('is none after the last, nor for a road on no route', () => {
    expect(nextPassAt(given, 200 * minMs)).toBeNull();
    expect(nextPassAt({ ...given, arrivalMin: null }, 0)).toBeNull();
  });
});

describe('bands of the freeze margin', () => {
  it('change at 0, 1, 2 and 4 °C', () => {
    expect([-0.01, 0, 0.99, 1, 2, 3.99, 4].map((margin) => bandOf(margin, false))).toEqual([
      'frozen',
      'urgent',
      'urgent',
      'closing',
      'hold',
      'hold',
      'safe',
    ]);
    expect(bandOf(-8, true)).toBe('safe');
    expect(bandOf(null, true)).toBe('unknown');
  });

  it('are named in the reader’s units', () => {
    expect(bandRange('closing', 'metric')).toBe('1 to 2 °C');
    expect(bandRange('closing', 'us')).toBe('1.8 to 3.6 °F');
  });

  it('a hold beyond the forecast says so', () => {
    expect(holdInFigures(35, 600)).toBe('0:35');
    expect(holdInFigures(Infinity, 610)).toBe('>10 h');
    expect(holdInFigures(Infinity, 20)).toBe('>0:20');
    expect(holdInFigures(Infinity, 0)).toBe('\u2013');
    expect(holdInFigures(null, 600)).toBe('\u2013');
  });
});

describe('the strip of a station', () => {
  it('is measured up to its newest reading, and gathers precipitation by the hour and its main type', () => {
    const strip = stripOf(decodeStorm(view), 0);
    expect(strip.measured.map((point) => point.tempC)).toEqual([-5, -5.1]);
    expect(strip.forecast.map((point) => point.errorC)).toEqual([0.2, 0.4]);
    expect(strip.precipitation).toHaveLength(1);
    expect(strip.precipitation[0]).toMatchObject({ mm: expect.closeTo(0.3, 6), type: 'freezing-drizzle' });
  });
});

describe('the list', () => {
  it('says hold, next pass and slack in words as well, and tells which road was chosen', () => {
    const onSelect = vi.fn();
    const roads = roadsNow().toSorted(byUrgency);
    render(<RefreezeList roads={roads} selectedId={2} longestMin={600} onSelect={onSelect} />);
    const ridge = screen.getByRole('button', { name: /Ridge/ });
    expect(ridge.textContent).toMatch(/holds 0:00.*next pass in 0:25.*slack \u22120:25.*icing, class A, \u22127\.1/);
    expect(screen.getByRole('button', { name: /Bridge/ }).getAttribute('aria-pressed')).toBe('true');
    fireEvent.click(ridge);
    expect(onSelect).toHaveBeenCalledExactlyOnceWith(1);
  });

  it('begins with forty roads, with the chosen one wherever it stands, and shows all when asked', () => {
    const first = roadsNow()[0];
    if (!first) throw new Error('no road');
    const many = Array.from({ length: 60 }, (_, index) => ({ ...first, id: index, name: `Road ${index}` }));
    render(<RefreezeList roads={many} selectedId={55} longestMin={600} onSelect={vi.fn()} />);
    expect(screen.getAllByRole('listitem')).toHaveLength(41);
    expect(screen.getByRole('button', { name: /Road 55/ })).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Show all 60 roads' }));
    expect(screen.getAllByRole('listitem')).toHaveLength(60);
  });
});
