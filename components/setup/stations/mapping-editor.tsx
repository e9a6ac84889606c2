'use client';

import { Field } from '@/components/ui/field';
import { type ColumnMapping, type Mapping, timeColumnsOf } from '@/lib/readings/mapping';
import { ClockField } from './clock-field';
import { columnGrid, ColumnRow } from './column-row';
import { TableFields, tableInWords } from './table-fields';
import { TimeFields } from './time-fields';
import { ZoneNames } from './zone-names';

export type MappingEditorProps = Readonly<{
  mapping: Mapping;
  columnNames: readonly string[];
  /** of a column, a few cells as they stand in the file */
  samplesOf: (index: number) => readonly string[];
  stationZone: string;
  faults: Readonly<Record<string, string>>;
  onChange: (mapping: Mapping) => void;
}>;

const heads = ['Column', 'Measures', 'Unit', 'Its time is told by', 'Also missing'];

/** How a file is to be read, said by a person: its make, its times, and each column. */
export function MappingEditor({ mapping, columnNames, samplesOf, stationZone, faults, onChange }: MappingEditorProps) {
  const change = (part: Partial<Mapping>) => onChange({ ...mapping, ...part });
  const taken = timeColumnsOf(mapping.time);
  const setColumn = (name: string, column: ColumnMapping | null) => {
    const others = mapping.columns.filter((each) => each.column !== name);
    const columns = column ? [...others, column] : others;
    change({ columns: columns.sort((a, b) => columnNames.indexOf(a.column) - columnNames.indexOf(b.column)) });
  };
  return (
    <div className="grid gap-5">
      <ZoneNames id="zone-names" />
      <details className="rounded-md border px-4 py-2.5" open={Boolean(faults.delimiter)}>
        <summary className="font-semibold">
          {tableInWords(mapping)}
          <span className="font-normal text-soft">, change</span>
        </summary>
        <TableFields mapping={mapping} error={faults.delimiter} onChange={change} />
      </details>
      <TimeFields
        time={mapping.time}
        columnNames={columnNames}
        error={faults.time}
        onChange={(time) => change({ time })}
      >
        <Field label="Told by the clock of" error={faults.clock}>
          <ClockField
            label="Clock of the file"
            value={mapping.clock}
            stationZone={stationZone}
            onChange={(clock) => change({ clock: clock ?? mapping.clock })}
          />
        </Field>
      </TimeFields>
      <div>
        <div aria-hidden className={`${columnGrid} hidden border-b pb-1.5 text-sm font-semibold text-soft lg:grid`}>
          {heads.map((head) => (
            <span key={head}>{head}</span>
          ))}
        </div>
        <ul aria-label="Columns of the file" className="border-t lg:border-t-0">
          {columnNames.map((name, index) =>
            taken.includes(name) ? null : (
              <ColumnRow
                key={name}
                name={name}
                samples={samplesOf(index)}
                column={mapping.columns.find(({ column }) => column === name) ?? null}
                stationZone={stationZone}
                error={faults[name]}
                onChange={(column) => setColumn(name, column)}
              />
            ),
          )}
        </ul>
        {faults.columns ? <p className="pt-2 text-sm font-semibold text-frozen">{faults.columns}</p> : null}
      </div>
    </div>
  );
}
