import { eutecticOf } from '../lib/brine/liquidus';
import { published, type FreezingTable } from '../tests/truth/brine/published';
import { densityErrors, freezingErrors, spreadOf } from '../tests/truth/brine/score';

/**
 * `npm run truth`: the model beside published tables, row by row computed now. Errors are model minus table, absolute.
 * A Markdown table, so that it can go into the README as it is.
 */
const tableNames: Readonly<Record<FreezingTable['table'], string>> = {
  crc: 'CRC Handbook, 102nd ed.',
  lange: 'Lange’s Handbook, 15th ed.',
  melinder: 'Melinder 2010',
};

function printTable(head: readonly string[], rows: readonly (readonly string[])[]): void {
  const widths = head.map((text, column) => Math.max(text.length, ...rows.map((row) => row[column]?.length ?? 0)));
  const line = (cells: readonly string[]) =>
    `| ${cells.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join(' | ')} |`;
  console.log(line(head));
  console.log(`| ${widths.map((width) => '-'.repeat(width)).join(' | ')} |`);
  for (const row of rows) console.log(line(row));
  console.log('');
}

function freezingRow(table: FreezingTable): readonly string[] {
  const errors = freezingErrors(table);
  const degrees = spreadOf(errors.map(({ errorC }) => errorC));
  const rates = spreadOf(errors.flatMap(({ rateError }) => (rateError === null ? [] : [rateError])));
  const coldest = Math.min(...errors.map(({ tableC }) => tableC));
  return [
    table.salt,
    tableNames[table.table],
    table.solid,
    String(degrees.count),
    `${coldest.toFixed(1)} °C`,
    `${degrees.largest.toFixed(2)} °C`,
    `${degrees.mean.toFixed(2)} °C`,
    rates.count === 0 ? '' : `${(100 * rates.largest).toFixed(1)} %`,
    rates.count === 0 ? '' : `${(100 * rates.mean).toFixed(1)} %`,
  ];
}

console.log('Freezing points (rates: salt per water at the table’s temperature, rows colder than −0.95 °C)\n');
printTable(
  ['salt', 'table', 'solid', 'rows', 'down to', 'largest', 'mean', 'rate, largest', 'rate, mean'],
  published.freezing.map(freezingRow),
);

console.log('Density, kg/m³\n');
printTable(
  ['salt', 'table', 'at', 'rows', 'largest', 'mean'],
  published.density.map((table) => {
    const { count, largest, mean } = spreadOf(densityErrors(table).map(({ errorKgPerM3 }) => errorKgPerM3));
    return [
      table.salt,
      tableNames[table.table],
      `${table.tempC} °C`,
      String(count),
      largest.toFixed(1),
      mean.toFixed(1),
    ];
  }),
);

console.log('Eutectics\n');
printTable(
  ['salt', 'computed', 'published', 'source'],
  published.eutectic.map(({ salt, massFractionPercent, tempC, source }) => {
    const { tempC: computedC, massFraction } = eutecticOf(salt);
    const here = `${(100 * massFraction).toFixed(2)} %, ${computedC.toFixed(2)} °C`;
    return [salt, here, `${massFractionPercent} %, ${tempC} °C`, source];
  }),
);
