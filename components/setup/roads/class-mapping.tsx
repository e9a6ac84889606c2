'use client';

import { Figure } from '@/components/ui/figure';
import { Select } from '@/components/ui/select';
import { type ClassMapping, type NetworkReportView } from '@/lib/contracts/network';
import { type ClassTarget, serviceClasses } from '@/lib/geo/assumed';
import { classWords } from './words';

export type ClassMappingTableProps = Readonly<{
  report: NetworkReportView;
  mapping: ClassMapping;
  /** Why it cannot be changed, or null. */
  isFixed: boolean;
  isBusy: boolean;
  onChange: (mapping: ClassMapping) => void;
}>;

const options: readonly { value: ClassTarget; label: string }[] = [
  ...serviceClasses.map((value) => ({ value, label: `Class ${value}` })),
  { value: 'leave-out', label: 'Leave out' },
];

/** Road class of the file → service class of the policy. */
export function ClassMappingTable({ report, mapping, isFixed, isBusy, onChange }: ClassMappingTableProps) {
  return (
    <table className="w-full text-left" aria-busy={isBusy}>
      <caption className="sr-only">Service class of each road class</caption>
      <thead>
        <tr className="border-b text-sm text-soft">
          <th scope="col" className="py-1.5 font-semibold">
            In the file
          </th>
          <th scope="col" className="px-3 py-1.5 text-right font-semibold">
            Lines
          </th>
          <th scope="col" className="px-3 py-1.5 text-right font-semibold">
            Length
          </th>
          <th scope="col" className="py-1.5 font-semibold">
            Served as
          </th>
        </tr>
      </thead>
      <tbody>
        {report.classes.map(({ roadClass, target, lines, lengthKm }) => (
          <tr key={roadClass} className="border-b">
            <th scope="row" className="py-1.5 font-semibold first-letter:uppercase">
              {classWords(roadClass)}
            </th>
            <td className="px-3 text-right font-mono">{lines}</td>
            <td className="px-3 text-right">
              <Figure value={lengthKm * 1000} quantity="distance" />
            </td>
            <td className="w-32 py-1">
              <Select
                aria-label={`Service class of ${classWords(roadClass)}`}
                value={target}
                disabled={isFixed || isBusy}
                options={options}
                onChange={(event) => onChange({ ...mapping, [roadClass]: event.target.value as ClassTarget })}
              />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
