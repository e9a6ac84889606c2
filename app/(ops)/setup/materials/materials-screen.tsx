'use client';

import { useState } from 'react';
import { MaterialForm } from '@/components/setup/materials/material-form';
import { type ListedMaterial } from '@/components/setup/materials/listed-material';
import { MaterialsTable } from '@/components/setup/materials/materials-table';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { EmptyState } from '@/components/ui/empty-state';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { useSubmission } from '@/components/ui/use-submission';
import { BackToSetup } from '../back';
import { saveMaterialAction } from './actions';

export type MaterialsScreenProps = Readonly<{ materials: readonly ListedMaterial[]; currency: string }>;

function EditMaterial({
  material,
  materials,
  currency,
  onDone,
}: MaterialsScreenProps & Readonly<{ material: ListedMaterial | null; onDone: () => void }>) {
  const submission = useSubmission(saveMaterialAction, onDone);
  return <MaterialForm material={material} materials={materials} currency={currency} submission={submission} />;
}

export function MaterialsScreen({ materials, currency }: MaterialsScreenProps) {
  const [chosenId, setChosenId] = useState<number | 'new' | null>(null);
  const announce = useAnnounce();
  const chosen = materials.find((material) => material.id === chosenId) ?? null;
  const done = () => {
    setChosenId(null);
    announce('Saved. Treatments worked out from now on use it.');
  };
  return (
    <>
      <PageHeader
        back={<BackToSetup />}
        title="Materials"
        facts={[`${materials.filter((material) => material.isActive).length} in use`]}
        actions={
          <Button variant="primary" onClick={() => setChosenId('new')}>
            Add a material
          </Button>
        }
      />
      <PageBody>
        {materials.length > 0 ? (
          <MaterialsTable materials={materials} currency={currency} onChange={setChosenId} />
        ) : (
          <EmptyState title="No materials yet">
            Add the salts and brines you keep; treatments can be worked out once there is one.
          </EmptyState>
        )}
        <p className="max-w-prose text-sm text-faint">
          Composition counts anhydrous salt. Where a product label names a lowest temperature or a largest rate, the
          label decides.
        </p>
      </PageBody>
      <Sheet
        isOpen={chosenId !== null}
        onOpenChange={(isOpen) => setChosenId(isOpen ? chosenId : null)}
        title={chosen?.name ?? 'Add a material'}
      >
        {chosenId === null ? null : (
          <EditMaterial key={chosenId} material={chosen} materials={materials} currency={currency} onDone={done} />
        )}
      </Sheet>
    </>
  );
}
