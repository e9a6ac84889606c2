'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { type RunRoad } from '@/lib/contracts/runs';
import { highestRateGPerM2, rateToleranceFraction } from '@/lib/ledger/limits';
import { MaterialChoice, type CabMaterialChoice } from './material-choice';
import { Stepper } from './stepper';

export type RateSheetProps = Readonly<{
  road: RunRoad;
  materials: readonly CabMaterialChoice[];
  maxRateGPerM2: number;
  isCorrection: boolean;
  onClose: () => void;
  onSave: (done: { materialId: number; materialName: string; rateGPerM2: number }) => void;
}>;

/** Another rate or material than the plan's, by thumb. */
export function RateSheet({ road, materials, maxRateGPerM2, isCorrection, onClose, onSave }: RateSheetProps) {
  const planned = materials.find((material) => material.id === road.materialId) ?? materials[0];
  const [materialId, setMaterialId] = useState(planned?.id ?? 0);
  const [rateGPerM2, setRate] = useState(Math.round(road.loggedRateGPerM2 ?? road.rateGPerM2 ?? 20));
  const material = materials.find((candidate) => candidate.id === materialId);
  if (!material) return null;
  const isLiquid = material.form === 'liquid';
  const mLPerGram = isLiquid ? 1000 / material.densityKgPerM3 : 1;
  return (
    <Sheet
      isOpen
      onOpenChange={(isOpen) => (isOpen ? undefined : onClose())}
      side="bottom"
      title={isCorrection ? `Correct ${road.name}` : road.name}
      description={
        isCorrection ? 'The first entry stays in the log; this one stands beside it.' : 'What was really spread.'
      }
    >
      <div className="mx-auto grid max-w-2xl gap-6">
        <MaterialChoice materials={materials} value={materialId} onChange={setMaterialId} />
        <Stepper
          label="Rate"
          value={isLiquid ? rateGPerM2 * mLPerGram : rateGPerM2}
          quantity={isLiquid ? 'liquidRate' : 'rate'}
          steps={[1, 5]}
          min={0}
          max={highestRateGPerM2}
          onChange={(value) => setRate(value / mLPerGram)}
        />
        <RateWords rateGPerM2={rateGPerM2} planned={road.rateGPerM2} max={maxRateGPerM2} />
        <Button
          variant="primary"
          size="cab-tall"
          onClick={() => onSave({ materialId, materialName: material.name, rateGPerM2 })}
        >
          {isCorrection ? 'Save the correction' : 'Done at this rate'}
        </Button>
      </div>
    </Sheet>
  );
}

function RateWords({
  rateGPerM2,
  planned,
  max,
}: Readonly<{ rateGPerM2: number; planned: number | null; max: number }>) {
  if (max > 0 && rateGPerM2 > max)
    return <p className="text-lg">This is over what the spreader is set up for. It is logged as you say.</p>;
  if (planned && Math.abs(rateGPerM2 - planned) > planned * rateToleranceFraction) {
    const percent = Math.round(((rateGPerM2 - planned) / planned) * 100);
    return (
      <p className="text-lg">
        {Math.abs(percent)} % {percent > 0 ? 'over' : 'under'} the plan.
      </p>
    );
  }
  return null;
}
