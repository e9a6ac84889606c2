'use client';

import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Bars, BarsKey, type BarGroup } from '@/components/ledger/bars';
import { LedgerFigures } from '@/components/ledger/ledger-figures';
import { NeedsALook } from '@/components/ledger/needs-a-look';
import { RoadsTable } from '@/components/ledger/roads-table';
import { RunsTable } from '@/components/ledger/runs-table';
import { EmptyState } from '@/components/ui/empty-state';
import { Field } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { Select } from '@/components/ui/select';
import { DownloadLink } from '@/components/ui/link-button';
import { ledgerQuery } from '@/lib/client/queries/ledger';
import { type LedgerView } from '@/lib/contracts/ledger';
import { formatDayTime } from '@/lib/time/format';

export type LedgerScreenProps = Readonly<{
  zone: string;
  chosenId: number | null;
  storms: readonly { id: number; number: number; name: string }[];
}>;

const two = (number: number) => String(number).padStart(2, '0');

export function LedgerScreen({ zone, chosenId, storms }: LedgerScreenProps) {
  if (chosenId === null)
    return (
      <>
        <PageHeader title="Ledger" />
        <PageBody>
          <EmptyState title="No storm has been opened yet.">
            The ledger fills as drivers log what they spread. Open a storm in Storm, then publish a plan.
          </EmptyState>
        </PageBody>
      </>
    );
  return <StormLedger key={chosenId} zone={zone} stormId={chosenId} storms={storms} />;
}

function StormLedger({ zone, stormId, storms }: Omit<LedgerScreenProps, 'chosenId'> & { stormId: number }) {
  const router = useRouter();
  const { data: ledger, error } = useQuery(ledgerQuery(stormId));
  const [runId, setRunId] = useState<string | null>(null);
  if (!ledger)
    return error ? (
      <div className="p-8">
        <Notice
          tone="problem"
          title="The ledger could not be read."
          kept="Nothing was changed."
          todo="Reload the page to try again."
        />
      </div>
    ) : null;
  const run = ledger.runs.find((candidate) => candidate.runId === runId);
  const roads = run ? ledger.roads.filter((road) => road.runId === run.runId) : ledger.roads;
  return (
    <>
      <PageHeader
        title={`Storm ${two(ledger.stormNumber)}: what went down`}
        facts={[
          `${formatDayTime(new Date(ledger.fromAt), zone)} to ${formatDayTime(new Date(ledger.untilAt), zone)}, ${ledger.isClosed ? 'closed' : 'still open'}`,
        ]}
        actions={
          <>
            <Field label="Storm" isLabelHidden className="w-72">
              <Select
                value={String(stormId)}
                onChange={(event) => router.push(`/ledger?storm=${event.target.value}`)}
                options={storms.map((storm) => ({
                  value: String(storm.id),
                  label: `Storm ${two(storm.number)}, ${storm.name}`,
                }))}
              />
            </Field>
            <DownloadLink variant="primary" href={`/api/storms/${stormId}/ledger.csv`}>
              Download CSV
            </DownloadLink>
          </>
        }
      />
      <PageBody>
        <LedgerFigures ledger={ledger} />
        {ledger.runs.length === 0 ? (
          <EmptyState title="No truck has been out in this storm.">
            Runs appear here as drivers take them in the cab.
          </EmptyState>
        ) : (
          <>
            <div className="grid items-start gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1fr)_18rem]">
              <Section title="By run">
                <RunsTable runs={ledger.runs} zone={zone} chosenRunId={runId} onChoose={setRunId} />
              </Section>
              <NeedsALook notes={ledger.notes} />
            </div>
            <Section title="Recommended beside spread, by route" actions={<BarsKey />} className="max-w-4xl">
              <Bars groups={groupsByRoute(ledger)} />
            </Section>
            <Section title={run ? `Roads of ${run.routeName ?? 'this run'}, truck ${run.truckNumber}` : 'Roads'}>
              <RoadsTable roads={roads} zone={zone} caption="Roads as logged" />
            </Section>
          </>
        )}
        <p className="max-w-prose text-sm text-soft">
          Logged by drivers, not measured: the rate set on the spreader times the area of the road. Chloride is counted
          by species from what was logged.
        </p>
      </PageBody>
    </>
  );
}

function groupsByRoute(ledger: LedgerView): BarGroup[] {
  const groups = new Map<string, BarGroup>();
  for (const run of ledger.runs) {
    const name = run.routeName ?? 'Own lists';
    const before = groups.get(name)?.account ?? { recommendedKg: 0, spreadKg: 0 };
    groups.set(name, {
      name,
      account: {
        recommendedKg: before.recommendedKg + run.account.recommendedKg,
        spreadKg: before.spreadKg + run.account.spreadKg,
      },
    });
  }
  return [...groups.values()].sort((a, b) => b.account.recommendedKg - a.account.recommendedKg);
}
