import { type ColumnMapping, type Mapping, usualMissing } from './mapping';
import { type ReadingQuantity } from './quantities';
import { type FileUnitName } from './units';

/** A column of a mapping for tests and benches, with everything usual but what is named. */
export function columnOf(
  column: string,
  quantity: ReadingQuantity,
  unit: FileUnitName,
  over: Partial<ColumnMapping> = {},
): ColumnMapping {
  return { column, quantity, unit, clock: null, missing: [], intervalMin: 60, timeIs: 'end', ...over };
}

/** A mapping for tests and benches: UTF-8, commas, points, heads, ISO times of UTC in `time`. */
export function mappingOf(over: Partial<Mapping>): Mapping {
  return {
    version: 1,
    encoding: 'utf-8',
    delimiter: ',',
    quote: '"',
    decimalMark: '.',
    hasHeader: true,
    skipLines: 0,
    clock: { kind: 'offset', offsetMin: 0 },
    time: { kind: 'one', column: 'time', pattern: 'iso' },
    missing: usualMissing,
    columns: [],
    ...over,
  };
}
