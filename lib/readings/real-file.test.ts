import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { guessMapping } from './guess';
import { type Mapping } from './mapping';
import { previewFile } from './preview';

const file = path.resolve(import.meta.dirname, '../../../shared/data/pavement/winter-2009-10.csv');
const isThere = existsSync(file);
const nowMs = Date.UTC(2026, 11, 1);

function mappingFor(bytes: Uint8Array): Mapping {
  const guessed = guessMapping({ bytes, isWhole: true, clock: { kind: 'offset', offsetMin: -300 } });
  if (!guessed.ok) throw new Error(guessed.reason);
  return guessed.mapping;
}

/** A measured winter in Canada; it lies beside the repository, not in it. */
describe.skipIf(!isThere)(
  `a measured winter${isThere ? '' : ' (skipped: the file is not beside this checkout)'}`,
  () => {
    const bytes = isThere ? new Uint8Array(readFileSync(file)) : new Uint8Array();

    it('is guessed: parts of the time, hour 0 at the end of its day, sun in kJ/m² an hour', () => {
      const { time, columns } = mappingFor(bytes);
      expect(time).toMatchObject({ kind: 'parts', hourColumn: 'Hour', minuteColumn: null, hourZero: 'ends-day' });
      expect(columns.map(({ column, quantity, unit, intervalMin }) => [column, quantity, unit, intervalMin])).toEqual([
        ['Temp', 'airTempC', '°C', 60],
        ['Solar', 'solarWPerM2', 'kJ/m²', 60],
        ['Pavement', 'pavementTempC', '°C', 60],
      ]);
    });

    it('gives 3,624 hours without a gap, and the pavement five hours before the air of its row when told to be UTC', () => {
      const guessed = mappingFor(bytes);
      const columns = guessed.columns.map((column) =>
        column.quantity === 'pavementTempC' ? { ...column, clock: { kind: 'offset' as const, offsetMin: 0 } } : column,
      );
      const { rows, badCount } = previewFile({ ...guessed, columns }, { bytes, isWhole: true, nowMs, rowCount: 4000 });
      expect(badCount).toBe(0);
      expect(rows).toHaveLength(3624);
      const readings = rows.flatMap(({ result }) => (result.ok ? result.readings.map(({ reading }) => reading) : []));
      const air = readings.filter(({ values }) => values[0] !== null).map(({ atMs }) => atMs);
      const pavement = readings.filter(({ values }) => values[2] !== null).map(({ atMs }) => atMs);
      expect(air[0]).toBe(Date.UTC(2009, 10, 1, 6));
      expect(pavement[0]).toBe(Date.UTC(2009, 10, 1, 1));
      const hours = (times: readonly number[]) =>
        new Set(times.slice(1).map((each, index) => each - (times[index] ?? 0)));
      expect([...hours(air)]).toEqual([3_600_000]);
      expect([...hours(pavement)]).toEqual([3_600_000]);
      expect(readings.some(({ values }) => values[1] === (-999 * 1000) / 3600)).toBe(false);
    });
  },
);
