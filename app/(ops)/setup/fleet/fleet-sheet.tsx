'use client';

import { type FleetChoice } from '@/components/setup/fleet/listed-fleet';
import { SpreaderForm } from '@/components/setup/fleet/spreader-form';
import { TruckForm } from '@/components/setup/fleet/truck-form';
import { YardForm } from '@/components/setup/fleet/yard-form';
import { Sheet } from '@/components/ui/dialog';
import { useSubmission } from '@/components/ui/use-submission';
import { saveSpreaderAction, saveTruckAction, saveYardAction } from './actions';
import { type FleetScreenProps } from './fleet-screen';

export type FleetSheetProps = FleetScreenProps &
  Readonly<{ choice: FleetChoice | null; onClose: () => void; onDone: () => void }>;

type EditProps = FleetScreenProps & Readonly<{ choice: FleetChoice; onDone: () => void }>;

function Edit({ choice, yards, trucks, spreaders, onDone }: EditProps) {
  const yard = useSubmission(saveYardAction, onDone);
  const truck = useSubmission(saveTruckAction, onDone);
  const spreader = useSubmission(saveSpreaderAction, onDone);
  if (choice.kind === 'yard') {
    return <YardForm yard={yards.find(({ id }) => id === choice.id) ?? null} submission={yard} />;
  }
  if (choice.kind === 'truck') {
    return <TruckForm truck={trucks.find(({ id }) => id === choice.id) ?? null} yards={yards} submission={truck} />;
  }
  return (
    <SpreaderForm
      spreader={spreaders.find(({ id }) => id === choice.id) ?? null}
      truckId={choice.truckId}
      trucks={trucks}
      submission={spreader}
    />
  );
}

const titleOf = (choice: FleetChoice | null) =>
  choice ? `${choice.id === null ? 'Add a' : 'Change the'} ${choice.kind}` : 'Change';

export function FleetSheet({ choice, onClose, ...edit }: FleetSheetProps) {
  return (
    <Sheet isOpen={choice !== null} onOpenChange={(isOpen) => (isOpen ? undefined : onClose())} title={titleOf(choice)}>
      {choice ? <Edit key={`${choice.kind} ${choice.id}`} choice={choice} {...edit} /> : null}
    </Sheet>
  );
}
