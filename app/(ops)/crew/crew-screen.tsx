'use client';

import { useQuery } from '@tanstack/react-query';
import { CrewTable } from '@/components/crew/crew-table';
import { DriverList } from '@/components/crew/driver-list';
import { EmptyState } from '@/components/ui/empty-state';
import { Notice } from '@/components/ui/notice';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { useNow } from '@/components/ui/use-now';
import { crewQuery } from '@/lib/client/queries/crew';
import { formatDayTime } from '@/lib/time/format';

export type CrewScreenProps = Readonly<{ zone: string }>;

export function CrewScreen({ zone }: CrewScreenProps) {
  const { data, isError } = useQuery(crewQuery);
  const now = useNow();
  if (!data) return null;
  const out = data.trucks.filter((truck) => truck.runId !== null);
  return (
    <>
      <PageHeader
        title="Crew"
        facts={[`${out.length} of ${data.trucks.length} trucks out`]}
        clock={now === null ? undefined : formatDayTime(now, zone)}
      />
      <PageBody>
        {isError ? (
          <Notice
            tone="caution"
            title="The server could not be reached."
            kept="What is shown is from before."
            todo="It is asked again by itself."
          />
        ) : null}
        <Section title="Trucks">
          {data.trucks.length === 0 ? (
            <EmptyState title="No truck is in use.">An administrator adds trucks in Set-up, Fleet.</EmptyState>
          ) : (
            <CrewTable trucks={data.trucks} zone={zone} now={now} />
          )}
        </Section>
        <Section
          title="Drivers"
          lead="Time out is counted from the start of the run; hours of service follow local rules."
        >
          <DriverList drivers={data.drivers} now={now} />
        </Section>
      </PageBody>
    </>
  );
}
