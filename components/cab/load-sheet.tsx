'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { Segmented } from '@/components/ui/segmented';
import { highestLoadKg } from '@/lib/ledger/limits';
import { MaterialChoice, type CabMaterialChoice } from './material-choice';
import { Stepper } from './stepper';

export type LoadSheetProps = Readonly<{
  yards: readonly { id: number; name: string }[];
  materials: readonly CabMaterialChoice[];
  hopperKg: number;
  leftKg: number;
  onClose: () => void;
  onSave: (load: { yardId: number; materialId: number; massKg: number }) => void;
}>;

export function LoadSheet({ yards, materials, hopperKg, leftKg, onClose, onSave }: LoadSheetProps) {
  const [yardId, setYardId] = useState(yards[0]?.id ?? 0);
  const [materialId, setMaterialId] = useState(materials[0]?.id ?? 0);
  const [massKg, setMass] = useState(Math.max(100, Math.round((hopperKg - leftKg) / 100) * 100));
  return (
    <Sheet
      isOpen
      onOpenChange={(isOpen) => (isOpen ? undefined : onClose())}
      side="bottom"
      title="Load"
      description="Keep clear of the auger and the loader; weigh rather than guess where there is a scale."
    >
      <div className="mx-auto grid max-w-2xl gap-6">
        <Segmented
          label="Yard"
          size="cab"
          options={yards.map((yard) => ({ value: String(yard.id), label: yard.name }))}
          value={String(yardId)}
          onChange={(value) => setYardId(Number(value))}
        />
        <MaterialChoice materials={materials} value={materialId} onChange={setMaterialId} />
        <Stepper
          label="Load"
          value={massKg}
          quantity="largeMass"
          digits={1}
          steps={[100, 1000]}
          min={100}
          max={highestLoadKg}
          onChange={setMass}
        />
        {massKg + leftKg > hopperKg * 1.02 ? (
          <p className="text-lg">
            With what is left by the log this is more than the hopper holds. Check the axle weight.
          </p>
        ) : null}
        <Button
          variant="primary"
          size="cab-tall"
          disabledReason={yardId && materialId ? null : 'There is no yard or material to load from.'}
          onClick={() => onSave({ yardId, materialId, massKg })}
        >
          Loaded
        </Button>
      </div>
    </Sheet>
  );
}
