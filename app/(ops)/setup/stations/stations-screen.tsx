'use client';

import { useState } from 'react';
import { type StationNow } from '@/components/setup/stations/listed-station';
import { StationForm } from '@/components/setup/stations/station-form';
import { StationsTable } from '@/components/setup/stations/stations-table';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { EmptyState } from '@/components/ui/empty-state';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { useSubmission } from '@/components/ui/use-submission';
import { BackToSetup } from '../back';
import { saveStationAction } from './actions';

export type StationsScreenProps = Readonly<{
  zone: string;
  stations: readonly StationNow[];
  whyNotChange: string | null;
}>;

export function StationsScreen({ zone, stations, whyNotChange }: StationsScreenProps) {
  const [isAdding, setIsAdding] = useState(false);
  const announce = useAnnounce();
  const inUse = stations.filter(({ isActive }) => isActive).length;
  const done = () => {
    setIsAdding(false);
    announce('Saved.');
  };
  return (
    <>
      <PageHeader
        back={<BackToSetup />}
        title="Stations"
        facts={[`${inUse} in use`, 'Open a station to load its readings.']}
        actions={
          <Button variant="primary" disabledReason={whyNotChange} onClick={() => setIsAdding(true)}>
            Add a station
          </Button>
        }
      />
      <PageBody>
        {stations.length > 0 ? (
          <StationsTable stations={stations} />
        ) : (
          <EmptyState title="No stations yet">
            Add the weather station that stands on your roads; then load a file of its readings, or give it a key with
            which it sends them itself.
          </EmptyState>
        )}
      </PageBody>
      <Sheet isOpen={isAdding} onOpenChange={setIsAdding} title="Add a station">
        <AddStation zone={zone} onDone={done} />
      </Sheet>
    </>
  );
}

function AddStation({ zone, onDone }: Readonly<{ zone: string; onDone: () => void }>) {
  const submission = useSubmission(saveStationAction, onDone);
  return <StationForm station={null} zone={zone} submission={submission} />;
}
