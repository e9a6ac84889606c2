'use client';

import { Button } from '@/components/ui/button';
import { useUnits } from '@/components/ui/units';
import { type NetworkReportView } from '@/lib/contracts/network';
import { type Finding, findingsOf, leftOutSentences } from './findings';
import { counted } from './words';

export type FindingsListProps = Readonly<{
  report: NetworkReportView;
  shownKey: string | null;
  onShow: (finding: Finding) => void;
}>;

const MOST_SHOWN = 12;

/** What of the file wants a look, each with its place on the map. */
export function FindingsList({ report, shownKey, onShow }: FindingsListProps) {
  const system = useUnits();
  const groups = findingsOf(report, system);
  const leftOut = leftOutSentences(report, system);
  if (groups.length === 0 && leftOut.length === 0) {
    return <p className="text-soft">Nothing: no duplicates, no gaps, and every road can be reached and left.</p>;
  }
  return (
    <div className="grid gap-5">
      {groups.map(({ title, count, findings }) => (
        <section key={title}>
          <h3 className="border-b pb-1 font-semibold">
            {title} <span className="font-mono font-normal text-soft">{count}</span>
          </h3>
          <ul>
            {findings.slice(0, MOST_SHOWN).map((finding) => (
              <FindingRow key={finding.key} finding={finding} isShown={finding.key === shownKey} onShow={onShow} />
            ))}
          </ul>
          {count > MOST_SHOWN ? (
            <p className="py-1.5 text-sm text-soft">and {counted(count - MOST_SHOWN, 'more', 'more')} like these</p>
          ) : null}
        </section>
      ))}
      {leftOut.length > 0 ? (
        <section>
          <h3 className="border-b pb-1 font-semibold">Left out</h3>
          <ul className="py-1.5 text-soft">
            {leftOut.map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
        </section>
      ) : null}
    </div>
  );
}

type FindingRowProps = Readonly<{ finding: Finding; isShown: boolean; onShow: (finding: Finding) => void }>;

function FindingRow({ finding, isShown, onShow }: FindingRowProps) {
  return (
    <li className="flex items-start justify-between gap-3 border-b py-2">
      <div>
        <p className={isShown ? 'font-semibold' : undefined}>{finding.what}</p>
        {finding.meaning ? <p className="text-sm text-soft">{finding.meaning}</p> : null}
      </div>
      {finding.at ? (
        <Button
          size="small"
          className="shrink-0"
          aria-pressed={isShown}
          aria-label={`Show on map: ${finding.what}`}
          onClick={() => onShow(finding)}
        >
          Show on map
        </Button>
      ) : null}
    </li>
  );
}
