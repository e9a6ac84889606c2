'use client';

import { useState } from 'react';
import {
  type FleetChoice,
  type ListedSpreader,
  type ListedTruck,
  type ListedYard,
} from '@/components/setup/fleet/listed-fleet';
import { TrucksTable } from '@/components/setup/fleet/trucks-table';
import { YardsTable } from '@/components/setup/fleet/yards-table';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { BackToSetup } from '../back';
import { FleetSheet } from './fleet-sheet';

export type FleetScreenProps = Readonly<{
  yards: readonly ListedYard[];
  trucks: readonly ListedTruck[];
  spreaders: readonly ListedSpreader[];
}>;

export function FleetScreen({ yards, trucks, spreaders }: FleetScreenProps) {
  const [choice, setChoice] = useState<FleetChoice | null>(null);
  const announce = useAnnounce();
  const done = () => {
    setChoice(null);
    announce('Saved.');
  };
  const noYard = yards.some((yard) => yard.isActive) ? null : 'A truck needs a yard: add one first.';
  return (
    <>
      <PageHeader
        back={<BackToSetup />}
        title="Yards and trucks"
        facts={[
          `${yards.filter((yard) => yard.isActive).length} yards`,
          `${trucks.filter((truck) => truck.isActive).length} trucks in use`,
        ]}
        actions={
          <>
            <Button onClick={() => setChoice({ kind: 'yard', id: null })}>Add a yard</Button>
            <Button variant="primary" disabledReason={noYard} onClick={() => setChoice({ kind: 'truck', id: null })}>
              Add a truck
            </Button>
          </>
        }
      />
      <PageBody>
        <Section title="Trucks and spreaders">
          {trucks.length > 0 ? (
            <TrucksTable trucks={trucks} spreaders={spreaders} onChoose={setChoice} />
          ) : (
            <EmptyState title="No trucks yet">
              Add a truck, then the spreader on it: plans keep to what it can put down.
            </EmptyState>
          )}
        </Section>
        <Section title="Yards">
          {yards.length > 0 ? (
            <YardsTable yards={yards} onChoose={setChoice} />
          ) : (
            <EmptyState title="No yards yet">Add the yard that trucks load at and return to.</EmptyState>
          )}
        </Section>
      </PageBody>
      <FleetSheet
        choice={choice}
        yards={yards}
        trucks={trucks}
        spreaders={spreaders}
        onClose={() => setChoice(null)}
        onDone={done}
      />
    </>
  );
}
