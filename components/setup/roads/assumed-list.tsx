import { type NetworkReportView } from '@/lib/contracts/network';
import { assumedAttributes } from '@/lib/geo/network';
import { formatNumber } from '@/lib/units/format';
import { assumedFrom, attributeWords } from './words';

export type AssumedListProps = Readonly<{ report: NetworkReportView }>;

/** What the file does not say, and what stands in for it. */
export function AssumedList({ report }: AssumedListProps) {
  const filled = assumedAttributes.filter((name) => report.assumedCounts[name] > 0);
  if (filled.length === 0) return <p className="text-soft">Nothing: the file says everything about every road.</p>;
  return (
    <table className="w-full text-left">
      <caption className="sr-only">Values that were filled in</caption>
      <thead>
        <tr className="border-b text-sm text-soft">
          <th scope="col" className="py-1.5 font-semibold">
            Value
          </th>
          <th scope="col" className="px-3 py-1.5 text-right font-semibold whitespace-nowrap">
            of {formatNumber(report.segments, 0)} roads
          </th>
          <th scope="col" className="py-1.5 font-semibold">
            Taken
          </th>
        </tr>
      </thead>
      <tbody>
        {filled.map((name) => (
          <tr key={name} className="border-b align-top">
            <th scope="row" className="py-1.5 font-semibold first-letter:uppercase">
              {attributeWords[name]}
            </th>
            <td className="px-3 py-1.5 text-right font-mono">{formatNumber(report.assumedCounts[name], 0)}</td>
            <td className="py-1.5 text-soft">{assumedFrom[name]}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
