'use client';

import { Figure } from '@/components/ui/figure';
import { Table, type Column } from '@/components/ui/table';
import { eutecticOf, massFractionAt } from '@/lib/brine/liquidus';
import { saltName, type Salt } from '@/lib/brine/salts';

const salts: readonly Salt[] = ['NaCl', 'CaCl2', 'MgCl2'];
const temperaturesC = [-1, -2, -3, -5, -7, -10, -15, -20, -25, -30, -35, -40, -45, -50];

const columns: readonly Column<number>[] = [
  {
    key: 'temp',
    head: 'Unfrozen down to',
    isRowHead: true,
    cell: (tempC) => <Figure value={tempC} quantity="temperature" digits={0} />,
  },
  ...salts.map((salt) => ({
    key: salt,
    head: saltName[salt],
    isNumber: true,
    cell: (tempC: number) => {
      const result = massFractionAt(salt, tempC);
      return <Figure value={result.ok ? result.massFraction : null} quantity="percent" none="no brine" />;
    },
  })),
];

/** The chart's twin in figures. */
export function CurvesTable() {
  return (
    <details>
      <summary className="link w-fit text-sm text-soft">The curves as a table</summary>
      <div className="pt-3">
        <Table
          caption="Least strength that stays unfrozen, by mass, from the model"
          columns={columns}
          rows={temperaturesC}
          rowKey={(tempC) => tempC}
        />
        <ul className="pt-3 text-sm text-soft">
          {salts.map((salt) => {
            const { tempC, massFraction } = eutecticOf(salt);
            return (
              <li key={salt}>
                Eutectic of {saltName[salt]}: <Figure value={massFraction} quantity="percent" size="inline" />,{' '}
                <Figure value={tempC} quantity="temperature" size="inline" />. Below it no brine is liquid.
              </li>
            );
          })}
        </ul>
      </div>
    </details>
  );
}
