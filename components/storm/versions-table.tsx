'use client';

import { Button } from '@/components/ui/button';
import { Table, type Column } from '@/components/ui/table';
import { Tag } from '@/components/ui/tag';
import { formatDayTime } from '@/lib/time/format';
import { type PlanVersion } from './storm-content';

export type VersionsTableProps = Readonly<{
  plans: readonly PlanVersion[];
  zone: string;
  chosenId: number | null;
  onChoose: (planId: number) => void;
}>;

/** Every version ever worked out, newest first: who, when, and whether drivers were told. */
export function VersionsTable({ plans, zone, chosenId, onChoose }: VersionsTableProps) {
  const columns: Column<PlanVersion>[] = [
    { key: 'version', head: 'Version', isRowHead: true, cell: (plan) => plan.version },
    { key: 'pass', head: 'Pass', isNumber: true, cell: (plan) => plan.passNumber },
    {
      key: 'worked',
      head: 'Worked out',
      cell: (plan) => `${formatDayTime(plan.workedOutAt, zone)}, ${plan.workedOutByName}`,
    },
    {
      key: 'state',
      head: 'State',
      cell: (plan) =>
        plan.publishedAt === null ? (
          <Tag tone="urgent">draft</Tag>
        ) : (
          <Tag tone="closing">
            published {formatDayTime(plan.publishedAt, zone)}
            {plan.publishedByName ? `, ${plan.publishedByName}` : ''}
          </Tag>
        ),
    },
    { key: 'policy', head: 'Policy', isNumber: true, cell: (plan) => plan.policyVersion },
    {
      key: 'show',
      head: <span className="sr-only">Show</span>,
      className: 'text-right',
      cell: (plan) => (
        <Button
          size="small"
          variant="quiet"
          aria-pressed={plan.id === chosenId}
          aria-label={`Show version ${plan.version}`}
          onClick={() => onChoose(plan.id)}
        >
          {plan.id === chosenId ? 'Shown' : 'Show'}
        </Button>
      ),
    },
  ];
  return <Table caption="Versions of the plan" columns={columns} rows={plans} rowKey={(plan) => plan.id} />;
}
