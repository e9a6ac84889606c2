import { describe, expect, it } from 'vitest';
import { guessMapping } from './guess';
import { faultsOfMapping, type Mapping } from './mapping';
import { previewFile } from './preview';

const nowMs = Date.UTC(2026, 11, 1);
const clock = { kind: 'zone', zone: 'Europe/Oslo' } as const;
const utf8 = (text: string) => new TextEncoder().encode(text);

function guess(bytes: Uint8Array): { mapping: Mapping; columnNames: string[]; doubts: string[] } {
  const guessed = guessMapping({ bytes, isWhole: true, clock });
  if (!guessed.ok) throw new Error(guessed.reason);
  return { ...guessed, doubts: guessed.doubts.map(({ sentence }) => sentence) };
}

const measured = ({ columns }: Mapping) => columns.map(({ column, quantity, unit }) => `${column} ${quantity} ${unit}`);
const lines = (count: number, row: (index: number) => string) =>
  Array.from({ length: count }, (_, index) => row(index)).join('\n');

describe('guessing how a file is made', () => {
  it('a plain English file', () => {
    const { mapping } = guess(
      utf8(
        `Time,Air Temp (°F),Road Surface Temp (°F),Wind Speed (mph),RH (%)\n${lines(20, (i) => `2026-11-01 00:${10 + i},30.2,29.1,5,88`)}`,
      ),
    );
    expect(mapping).toMatchObject({ delimiter: ',', decimalMark: '.', encoding: 'utf-8', hasHeader: true, clock });
    expect(mapping.time).toEqual({ kind: 'one', column: 'Time', pattern: 'iso' });
    expect(measured(mapping)).toEqual([
      'Air Temp (°F) airTempC °F',
      'Road Surface Temp (°F) pavementTempC °F',
      'Wind Speed (mph) windSpeedMPerS mph',
      'RH (%) relativeHumidity %',
    ]);
    expect(faultsOfMapping(mapping)).toEqual({});
  });

  it('a German file in Windows-1252 with semicolons, decimal commas, date and time apart', () => {
    const text = `Datum;Uhrzeit;Lufttemperatur °C;Fahrbahntemperatur °C;Taupunkt;Windböe km/h\r\n${lines(20, (i) => `0${1 + Math.floor(i / 10)}.11.2026;${10 + (i % 10)}:00;-1,5;-2,25;-3,0;22`)}\r\n`;
    const bytes = Uint8Array.from(text, (letter) => letter.charCodeAt(0));
    const { mapping } = guess(bytes);
    expect(mapping).toMatchObject({ encoding: 'windows-1252', delimiter: ';', decimalMark: ',' });
    expect(mapping.time).toEqual({
      kind: 'two',
      dateColumn: 'Datum',
      datePattern: 'dd.MM.yyyy',
      timeColumn: 'Uhrzeit',
      timePattern: 'HH:mm',
    });
    expect(measured(mapping)).toEqual([
      'Lufttemperatur °C airTempC °C',
      'Fahrbahntemperatur °C pavementTempC °C',
      'Taupunkt dewPointC °C',
      'Windböe km/h windGustMPerS km/h',
    ]);
    const { rows, badCount } = previewFile(mapping, { bytes, isWhole: true, nowMs, rowCount: 1 });
    expect(badCount).toBe(0);
    expect(rows[0]?.result).toMatchObject({
      ok: true,
      readings: [{ reading: { values: [-1.5, -2.25, -3, 22 / 3.6] } }],
    });
  });

  it('one bad time of six does not make a wind column the clock', () => {
    const times = ['00:00', '00:10', '00:20', '00:30', '25:40', '00:50'];
    const rows = times.map((time, i) => `14.01.2026;${time};-1,${i};-2,4;91;${11 + i}`);
    const { mapping } = guess(utf8(`Date;Time;Air temp (°C);Pavement (°C);RH (%);Wind (km/h)\n${rows.join('\n')}\n`));
    expect(mapping.time).toMatchObject({ kind: 'two', dateColumn: 'Date', timeColumn: 'Time', timePattern: 'HH:mm' });
    expect(measured(mapping)).toContain('Wind (km/h) windSpeedMPerS km/h');
  });

  it('bare numbers beside a date are a clock only under a head that says so', () => {
    const table = (head: string) => `Date;${head};Air temp (°C)\n${lines(12, (i) => `14.01.2026;${i};-1.5`)}`;
    expect(guess(utf8(table('Hour'))).mapping.time).toMatchObject({ timeColumn: 'Hour' });
    const guessed = guessMapping({ bytes: utf8(table('Wind')), isWhole: true, clock });
    const time = guessed.ok && guessed.mapping.time.kind === 'two' ? guessed.mapping.time.timeColumn : null;
    expect(time).not.toBe('Wind');
  });

  it('tenths with their error codes, behind a byte order mark, tabs and lines that are no table', () => {
    const { mapping } = guess(
      utf8(
        `\uFEFFExport of station 4\n\nobserved\tessAirTemperature\tessSurfaceTemperature\n${lines(30, (i) => `2026-11-01T00:${10 + i}:00Z\t${-85 + i}\t${i === 3 ? 1001 : -90 + i}`)}`,
      ),
    );
    expect(mapping).toMatchObject({ delimiter: '\t', skipLines: 2 });
    expect(measured(mapping)).toEqual([
      'essAirTemperature airTempC 0.1 °C',
      'essSurfaceTemperature pavementTempC 0.1 °C',
    ]);
    expect(mapping.columns[1]?.missing).toEqual(['1001']);
  });

  it('day and month are told apart by the order of the rows', () => {
    const file = (row: (i: number) => string) => guess(utf8(`time,air\n${lines(12, row)}`)).mapping.time;
    expect(file((i) => `0${1 + Math.floor(i / 4)}/02/2026 ${10 + (i % 4) * 3}:00,1`)).toMatchObject({
      pattern: 'dd/MM/yyyy HH:mm',
    });
    expect(file((i) => `02/0${1 + Math.floor(i / 4)}/2026 ${10 + (i % 4) * 3}:00,1`)).toMatchObject({
      pattern: 'MM/dd/yyyy HH:mm',
    });
  });

  it('says when they cannot be told apart', () => {
    expect(guess(utf8(`time,air\n${lines(5, (i) => `02/02/2026 1${i}:00,1`)}`)).doubts.join()).toContain(
      'cannot be told apart',
    );
  });

  it('a file without heads has numbered columns and says that nothing names them', () => {
    const { mapping, columnNames, doubts } = guess(utf8(lines(10, (i) => `2026-11-01 0${i}:00,1.5,2.5`)));
    expect(columnNames).toEqual(['column 1', 'column 2', 'column 3']);
    expect(mapping.hasHeader).toBe(false);
    expect(doubts.join()).toContain('say it for each column');
  });

  it.each([
    ['nothing', new Uint8Array(), 'The file is empty.'],
    ['a workbook', Uint8Array.of(0x50, 0x4b, 3, 4, 20), 'The file is a workbook or an archive, not text.'],
    ['bytes', Uint8Array.of(65, 0, 1, 2), 'The file is not text: it holds bytes that no table has.'],
    [
      'prose',
      utf8('Dear colleague\nhere are the readings\n'),
      'The file has no columns: no line is parted by commas, semicolons, tabs or bars.',
    ],
    ['heads alone', utf8('time,air\n'), 'The file has heads and no rows.'],
  ])('%s is refused with a sentence', (_, bytes, reason) => {
    expect(guessMapping({ bytes, isWhole: true, clock })).toMatchObject({ ok: false, reason });
  });

  it('a mapping is faulted in sentences', () => {
    const { mapping } = guess(utf8(`time,air,pavement\n${lines(5, (i) => `2026-11-01 1${i}:00,1,2`)}`));
    const [air, pavement] = mapping.columns;
    if (!air || !pavement) throw new Error('two columns are measured');
    expect(faultsOfMapping({ ...mapping, clock: { kind: 'zone', zone: 'Mars/Base' } }).clock).toContain('no time zone');
    expect(
      faultsOfMapping({ ...mapping, time: { kind: 'one', column: 'time', pattern: 'dd.MM HH:mm' } }).time,
    ).toContain('no year');
    expect(faultsOfMapping({ ...mapping, columns: [air, { ...pavement, quantity: 'airTempC' }] }).pavement).toContain(
      'second station',
    );
    expect(faultsOfMapping({ ...mapping, columns: [{ ...air, unit: 'mph' }] }).air).toBe(
      'Air temperature cannot come in mph.',
    );
  });
});
