'use client';

import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { ProblemNotice } from '@/components/ui/notice';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { type ProblemView } from '@/lib/problem';

interface Choice {
  id: number;
  name: string;
}

export type LoadDialogProps = Readonly<{
  runs: readonly { id: string; label: string }[];
  yards: readonly Choice[];
  materials: readonly Choice[];
  problem: ProblemView | null;
  isSending: boolean;
  onClose: () => void;
  onSave: (load: { runId: string; yardId: number; materialId: number; massKg: number | null }) => void;
}>;

const choices = (rows: readonly Choice[]) => rows.map((row) => ({ value: String(row.id), label: row.name }));

export function LoadDialog({ runs, yards, materials, problem, isSending, onClose, onSave }: LoadDialogProps) {
  const [massKg, setMassKg] = useState<number | null>(null);
  const save = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    onSave({
      runId: String(form.get('runId')),
      yardId: Number(form.get('yardId')),
      materialId: Number(form.get('materialId')),
      massKg,
    });
  };
  return (
    <Dialog
      isOpen
      onOpenChange={onClose}
      title="Record a load"
      description="What a truck that is out on a run took on here."
    >
      <form onSubmit={save} className="grid gap-4" noValidate>
        <ProblemNotice problem={problem} />
        <Field label="Truck" error={problem?.fields.runId}>
          <Select name="runId" options={runs.map((run) => ({ value: run.id, label: run.label }))} />
        </Field>
        <Field label="Yard" error={problem?.fields.yardId}>
          <Select name="yardId" options={choices(yards)} />
        </Field>
        <Field label="Material" error={problem?.fields.materialId}>
          <Select name="materialId" options={choices(materials)} />
        </Field>
        <Field label="Mass" hint="From the scale where there is one." error={problem?.fields.massKg}>
          <NumberInput quantity="largeMass" onValue={setMassKg} autoFocus />
        </Field>
        <div className="flex justify-end gap-2">
          <Button onClick={onClose}>Cancel</Button>
          <Button variant="primary" type="submit" isBusy={isSending} busyLabel="Recording">
            Record
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
