import { describe, expect, it } from 'vitest';
import { type Mapping } from './mapping';
import { openRowReader, type RowReading } from './read-row';
import { columnOf, mappingOf } from './test-mapping';

const nowMs = Date.UTC(2010, 5, 1);

function readerOf(mapping: Mapping, names: readonly string[]) {
  const opened = openRowReader(mapping, names, nowMs);
  if (!opened.ok) throw new Error(`lacking ${opened.lacking.join()}`);
  return opened.reader.read;
}

const timesOf = (row: RowReading) =>
  row.ok ? row.readings.map(({ atMs }) => new Date(atMs).toISOString().slice(0, 16)) : row.reason;
const valuesOf = (row: RowReading) => (row.ok ? row.readings.map(({ values }) => values) : row.reason);

/** One value of one column, in SI. */
function valueOf(cell: string, column: ReturnType<typeof columnOf>, over: Partial<Mapping> = {}) {
  const read = readerOf(mappingOf({ ...over, columns: [column] }), ['time', column.column]);
  const row = read(['2010-01-05T06:00Z', cell]);
  return row.ok ? (row.readings[0]?.values[0] ?? null) : row.reason;
}

describe('units of a file', () => {
  it.each([
    ['23', 'airTempC', '°F', -5],
    ['-52', 'airTempC', '0.1 °C', -5.2],
    ['268.15', 'airTempC', 'K', -5],
    ['36', 'windSpeedMPerS', 'km/h', 10],
    ['10', 'windSpeedMPerS', 'mph', 4.4704],
    ['10', 'windSpeedMPerS', 'kn', 5.144444],
    ['92', 'relativeHumidity', '%', 0.92],
    ['0.1', 'precipitationMm', 'in', 2.54],
    ['12', 'precipitationMm', '0.1 mm', 1.2],
    ['0.5', 'visibilityM', 'mile', 804.672],
  ] as const)('%s as %s in %s is %f', (cell, quantity, unit, expected) => {
    expect(valueOf(cell, columnOf('x', quantity, unit))).toBeCloseTo(expected, 6);
  });

  it('360 kJ/m² gathered in an hour is 100 W/m², in ten minutes 600', () => {
    expect(valueOf('360', columnOf('x', 'solarWPerM2', 'kJ/m²'))).toBeCloseTo(100, 12);
    expect(valueOf('360', columnOf('x', 'solarWPerM2', 'kJ/m²', { intervalMin: 10 }))).toBeCloseTo(600, 12);
  });

  it('a rate becomes the amount of its interval: 1.2 mm/h over 10 min is 0.2 mm', () => {
    expect(valueOf('1.2', columnOf('x', 'precipitationMm', 'mm/h', { intervalMin: 10 }))).toBeCloseTo(0.2, 12);
    expect(valueOf('10', columnOf('x', 'precipitationMm', '0.1 g/m²/s'))).toBeCloseTo(3.6, 12);
  });
});

describe('missing codes', () => {
  it('1001 tenths is no temperature of 100.1 °C, and 101 % no humidity, 65535 no wind, 361 no direction', () => {
    expect(valueOf('1001', columnOf('x', 'pavementTempC', '0.1 °C', { missing: ['1001'] }))).toBeNull();
    expect(valueOf('101', columnOf('x', 'relativeHumidity', '%', { missing: ['101'] }))).toBeNull();
    expect(valueOf('65535', columnOf('x', 'windSpeedMPerS', '0.1 m/s', { missing: ['65535'] }))).toBeNull();
    expect(valueOf('361', columnOf('x', 'windDirectionDeg', '°', { missing: ['361'] }))).toBeNull();
  });

  it.each(['Not Reported', 'not reported', 'NA', '', '  ', '-9999', '-9999.0', 'M', 'NaN'])(
    '“%s” is missing',
    (cell) => {
      expect(valueOf(cell, columnOf('x', 'airTempC', '°C'))).toBeNull();
    },
  );

  it('a row in which all is missing is good and gives no reading', () => {
    const read = readerOf(mappingOf({ columns: [columnOf('x', 'airTempC', '°C')] }), ['time', 'x']);
    expect(read(['2010-01-05T06:00Z', 'NA'])).toEqual({ ok: true, readings: [] });
  });
});

describe('numbers', () => {
  it('decimal comma is read where the file has it and refused with a hint where it has not', () => {
    const column = columnOf('x', 'airTempC', '°C');
    expect(valueOf('-3,5', column, { decimalMark: ',', delimiter: ';' })).toBe(-3.5);
    expect(valueOf('-3,5', column)).toBe('“-3,5” is not a number; the decimal mark of this file is the point.');
    expect(valueOf('3.5', column, { decimalMark: ',', delimiter: ';' })).toBe(
      '“3.5” is not a number; the decimal mark of this file is the comma.',
    );
  });

  it('a true minus sign is a minus', () => {
    expect(valueOf('\u22123.5', columnOf('x', 'airTempC', '°C'))).toBe(-3.5);
  });

  it.each(['0x1F', '1_000', 'abc', '1e400', 'Infinity', '-3.2 °C'])('“%s” is no number', (cell) => {
    expect(valueOf(cell, columnOf('x', 'airTempC', '°C'))).toBe(`“${cell}” is not a number.`);
  });
});

describe('words', () => {
  it('the state of the road comes as an NTCIP code or as a word', () => {
    const column = columnOf('x', 'surfaceStatus', 'word');
    expect(valueOf('5', column)).toBe('wet');
    expect(valueOf('Trace Moisture', column)).toBe('moist');
    expect(valueOf('2', column)).toBeNull();
    expect(valueOf('sticky', column)).toBe('“sticky” is not a word or code that is known here.');
  });
});

describe('layouts of time', () => {
  const column = columnOf('x', 'airTempC', '°C');
  it.each([
    ['iso', '2010-01-05 06:30', '2010-01-05T06:30'],
    ['iso', '2010-01-05T06:30:15+01:00', '2010-01-05T05:30'],
    ['dd.MM.yyyy HH:mm', '05.01.2010 06:30', '2010-01-05T06:30'],
    ['MM/dd/yyyy hh:mm a', '1/5/2010 12:30 AM', '2010-01-05T00:30'],
    ['MM/dd/yyyy hh:mm a', '01/05/2010 01:30 p.m.', '2010-01-05T13:30'],
    ['yyyy-MM-dd HH:mm', '2010-01-05 24:00', '2010-01-06T00:00'],
    ['epoch-s', '1262673000', '2010-01-05T06:30'],
    ['epoch-ms', '1262673000000', '2010-01-05T06:30'],
    ['dd.MM.yy HH:mm', '05.01.10 06:30', '2010-01-05T06:30'],
  ])('%s reads %s', (pattern, text, expected) => {
    const read = readerOf(mappingOf({ time: { kind: 'one', column: 'time', pattern }, columns: [column] }), [
      'time',
      'x',
    ]);
    expect(timesOf(read([text, '1']))).toEqual([expected]);
  });

  it.each(['30.02.2010 06:30', '05.13.2010 06:30', '05.01.2010 25:00', '05.01.2010 06:60', '', '05/01/2010 06:30'])(
    '“%s” is refused with the column named',
    (text) => {
      const time = { kind: 'one' as const, column: 'Zeit', pattern: 'dd.MM.yyyy HH:mm' };
      const row = readerOf(mappingOf({ time, columns: [column] }), ['Zeit', 'x'])([text, '1']);
      expect(row).toMatchObject({ ok: false, column: 'Zeit' });
    },
  );

  it('0 in an epoch means missing, not 1970', () => {
    const time = { kind: 'one' as const, column: 'time', pattern: 'epoch-s' };
    expect(readerOf(mappingOf({ time, columns: [column] }), ['time', 'x'])(['0', '1']).ok).toBe(false);
  });

  it('date and time stand in columns of their own', () => {
    const time = {
      kind: 'two' as const,
      dateColumn: 'Datum',
      datePattern: 'dd.MM.yyyy',
      timeColumn: 'Zeit',
      timePattern: 'HH:mm',
    };
    const read = readerOf(mappingOf({ time, columns: [column] }), ['Datum', 'Zeit', 'x']);
    expect(timesOf(read(['05.01.2010', '06:30', '1']))).toEqual(['2010-01-05T06:30']);
  });

  const parts = {
    kind: 'parts' as const,
    yearColumn: 'Year',
    monthColumn: 'Month',
    dayColumn: 'Day',
    hourColumn: 'Hour',
    minuteColumn: null,
  };
  const partNames = ['Year', 'Month', 'Day', 'Hour', 'x'];

  it('hour 0 ends its day or begins it, as the mapping says; hour 24 always ends it', () => {
    const ends = readerOf(mappingOf({ time: { ...parts, hourZero: 'ends-day' }, columns: [column] }), partNames);
    const begins = readerOf(mappingOf({ time: { ...parts, hourZero: 'begins-day' }, columns: [column] }), partNames);
    expect(timesOf(ends(['2010', '1', '31', '0', '1']))).toEqual(['2010-02-01T00:00']);
    expect(timesOf(begins(['2010', '1', '31', '0', '1']))).toEqual(['2010-01-31T00:00']);
    expect(timesOf(begins(['2010', '1', '31', '24', '1']))).toEqual(['2010-02-01T00:00']);
  });

  it('a month 13 or an hour 25 is refused', () => {
    const read = readerOf(mappingOf({ time: { ...parts, hourZero: 'begins-day' }, columns: [column] }), partNames);
    expect(timesOf(read(['2010', '13', '1', '0', '1']))).toBe('There is no time 2010-13-1, hour 0.');
    expect(read(['2010', '1', 'x', '0', '1'])).toEqual({
      ok: false,
      column: 'Day',
      reason: '“x” is not a whole number.',
    });
  });
});

describe('clocks', () => {
  const column = columnOf('x', 'airTempC', '°C');
  const local = (zone: string) =>
    readerOf(
      mappingOf({
        clock: { kind: 'zone', zone },
        time: { kind: 'one', column: 'time', pattern: 'iso' },
        columns: [column],
      }),
      ['time', 'x'],
    );
  const at = (read: ReturnType<typeof local>, text: string) => timesOf(read([text, '1']));

  it('a zone is read in winter and in summer time', () => {
    const read = local('America/Toronto');
    expect(at(read, '2010-01-05 06:30')).toEqual(['2010-01-05T11:30']);
    expect(at(read, '2009-07-05 06:30')).toEqual(['2009-07-05T10:30']);
  });

  it('an hour that the clocks skip in spring is refused with a sentence', () => {
    expect(at(local('Europe/Oslo'), '2010-03-28 02:30')).toBe(
      'The clocks in Europe/Oslo went forward over 2010-03-28 02:30, so there was no such time.',
    );
  });

  it('an hour that comes twice in autumn is told by the order of the rows', () => {
    const read = local('America/Toronto');
    const times = ['00:30', '01:00', '01:30', '01:00', '01:30', '02:00'].map((time) => at(read, `2009-11-01 ${time}`));
    expect(times.flat()).toEqual([
      '2009-11-01T04:30',
      '2009-11-01T05:00',
      '2009-11-01T05:30',
      '2009-11-01T06:00',
      '2009-11-01T06:30',
      '2009-11-01T07:00',
    ]);
  });

  it('and in a file that has the newest row first', () => {
    const read = local('America/Toronto');
    const times = ['03:00', '02:00', '01:30', '01:00', '01:30', '01:00', '00:30'].map((time) =>
      at(read, `2009-11-01 ${time}`),
    );
    expect(times.flat().map((text) => String(text).slice(11))).toEqual([
      '08:00',
      '07:00',
      '06:30',
      '06:00',
      '05:30',
      '05:00',
      '04:30',
    ]);
  });

  it('with no row near to tell, the first pass is taken and the guess is marked', () => {
    const row = local('America/Toronto')(['2009-11-01 01:30', '1']);
    expect(row).toMatchObject({ ok: true, readings: [{ atMs: Date.UTC(2009, 10, 1, 5, 30), isTimeGuessed: true }] });
  });

  it('a column in another zone speaks of another instant than its row', () => {
    const mapping = mappingOf({
      clock: { kind: 'offset', offsetMin: -300 },
      columns: [column, columnOf('p', 'pavementTempC', '°C', { clock: { kind: 'offset', offsetMin: 0 } })],
    });
    const row = readerOf(mapping, ['time', 'x', 'p'])(['2009-11-01 01:00', '8.4', '9.3']);
    expect(timesOf(row)).toEqual(['2009-11-01T06:00', '2009-11-01T01:00']);
    expect(valuesOf(row)).toEqual([
      [8.4, null],
      [null, 9.3],
    ]);
  });

  it('a sum whose time is the start of its hour is stored at the end', () => {
    const mapping = mappingOf({ columns: [columnOf('p', 'precipitationMm', 'mm', { timeIs: 'start' })] });
    expect(timesOf(readerOf(mapping, ['time', 'p'])(['2010-01-05T06:00Z', '1']))).toEqual(['2010-01-05T07:00']);
  });

  it('times before 1950 and more than a year ahead are misread dates', () => {
    expect(at(local('UTC'), '1905-01-05 06:30')).toBe(
      '1905-01-05 06:30 UTC is before 1950: check how dates are laid out.',
    );
    expect(at(local('UTC'), '2012-01-05 06:30')).toContain('more than a year ahead');
  });
});

describe('rows', () => {
  const mapping = mappingOf({ columns: [columnOf('x', 'airTempC', '°C')] });
  it('columns that the file has not are named', () => {
    expect(openRowReader(mapping, ['Zeit', 'y'], nowMs)).toEqual({ ok: false, lacking: ['time', 'x'] });
  });
  it('a short row and repeated heads are refused in their own words', () => {
    const read = readerOf(mapping, ['time', 'x']);
    expect(read(['2010-01-05T06:00Z'])).toEqual({
      ok: false,
      column: 'x',
      reason: 'The row has 1 columns; 2 are needed.',
    });
    expect(read(['time', 'x'])).toEqual({ ok: false, column: 'time', reason: 'The heads are repeated on this line.' });
  });
});
