'use client';

import { Button } from '@/components/ui/button';
import { Table, type Column } from '@/components/ui/table';
import { Tag } from '@/components/ui/tag';
import { formatDayTime, spanInWords } from '@/lib/time/format';
import { workOutRefusal, type PassView, type StormContent } from './storm-content';

export type PassesTableProps = Readonly<{
  content: StormContent;
  nowAt: number;
  /** why nobody here may, or null */
  refusal: string | null;
  /** the pass being worked out */
  busyPass: number | null;
  onWorkOut: (passNumber: number) => void;
}>;

function PassState({ pass, content, nowAt }: Readonly<{ pass: PassView; content: StormContent; nowAt: number }>) {
  const versions = content.plans.filter((plan) => plan.passNumber === pass.number);
  const published = versions.find((plan) => plan.publishedAt !== null);
  const draft = versions.find((plan) => plan.version > (published?.version ?? 0));
  if (published) {
    return (
      <Tag tone="closing">
        version {published.version} published{draft ? `, ${draft.version} is a draft` : ''}
      </Tag>
    );
  }
  if (draft) return <Tag tone="urgent">version {draft.version} is a draft</Tag>;
  return <Tag>{pass.untilAt <= nowAt ? 'went by without a plan' : 'not worked out'}</Tag>;
}

/** The passes of a storm: when trucks leave, what has been decided, and the button that works it out. */
export function PassesTable({ content, nowAt, refusal, busyPass, onWorkOut }: PassesTableProps) {
  const columns: Column<PassView>[] = [
    { key: 'pass', head: 'Pass', isRowHead: true, cell: (pass) => pass.number },
    {
      key: 'leaves',
      head: 'Trucks leave',
      className: 'whitespace-nowrap',
      cell: (pass) => formatDayTime(pass.startsAt, content.zone),
    },
    {
      key: 'holds',
      head: 'Has to hold for',
      className: 'whitespace-nowrap',
      cell: (pass) => spanInWords((pass.untilAt - pass.startsAt) / 60_000),
    },
    { key: 'state', head: 'Plan', cell: (pass) => <PassState pass={pass} content={content} nowAt={nowAt} /> },
    {
      key: 'do',
      head: <span className="sr-only">Work out</span>,
      className: 'text-right',
      cell: (pass) => (
        <Button
          size="small"
          disabledReason={refusal ?? workOutRefusal(pass, content, nowAt)}
          isBusy={busyPass === pass.number}
          busyLabel="Working out"
          aria-label={`Work out pass ${pass.number}`}
          onClick={() => onWorkOut(pass.number)}
        >
          {content.plans.some((plan) => plan.passNumber === pass.number) ? 'Work out again' : 'Work out'}
        </Button>
      ),
    },
  ];
  return <Table caption="Passes" columns={columns} rows={content.passes} rowKey={(pass) => pass.number} />;
}
