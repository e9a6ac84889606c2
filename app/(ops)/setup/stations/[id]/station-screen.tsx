'use client';

import { type Route } from 'next';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { type ListedKey, type ListedStation, type ListedUpload } from '@/components/setup/stations/listed-station';
import { StationForm } from '@/components/setup/stations/station-form';
import { UploadsTable } from '@/components/setup/stations/uploads-table';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { EmptyState } from '@/components/ui/empty-state';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { useSubmission } from '@/components/ui/use-submission';
import { saveStationAction } from '../actions';
import { LoadReadings, type Remembered } from './load-readings';
import { StationKeys } from './station-keys';

export type StationScreenProps = Readonly<{
  zone: string;
  station: ListedStation;
  remembered: Remembered | null;
  keys: readonly ListedKey[];
  uploads: readonly ListedUpload[];
  whyNotChange: string | null;
}>;

export function StationScreen({ zone, station, remembered, keys, uploads, whyNotChange }: StationScreenProps) {
  const [isChanging, setIsChanging] = useState(false);
  const router = useRouter();
  const announce = useAnnounce();
  const changed = () => {
    setIsChanging(false);
    announce('Saved.');
    router.refresh();
  };
  return (
    <>
      <PageHeader
        back={
          <Link href={'/setup/stations' as Route} className="link">
            Stations
          </Link>
        }
        title={station.name}
        facts={[station.isActive ? `Its files are in ${station.zone} time unless said otherwise` : 'Out of use']}
        actions={
          <Button disabledReason={whyNotChange} onClick={() => setIsChanging(true)}>
            Change the station
          </Button>
        }
      />
      <PageBody>
        <Section title="Load readings">
          <LoadReadings station={station} remembered={remembered} zone={zone} onLoaded={() => router.refresh()} />
        </Section>
        <Section title="Files read">
          {uploads.length > 0 ? (
            <UploadsTable uploads={uploads} zone={zone} />
          ) : (
            <EmptyState title="No file has been read yet" className="py-2">
              Load one above. What you say about it is remembered for the next, and for the station’s own script.
            </EmptyState>
          )}
        </Section>
        {whyNotChange === null ? <StationKeys stationId={station.id} keys={keys} zone={zone} /> : null}
      </PageBody>
      <Sheet isOpen={isChanging} onOpenChange={setIsChanging} title="Change the station">
        <ChangeStation station={station} zone={zone} onDone={changed} />
      </Sheet>
    </>
  );
}

function ChangeStation(props: Readonly<{ station: ListedStation; zone: string; onDone: () => void }>) {
  const submission = useSubmission(saveStationAction, props.onDone);
  return <StationForm station={props.station} zone={props.zone} submission={submission} />;
}
