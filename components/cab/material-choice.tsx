'use client';

import { Segmented } from '@/components/ui/segmented';

export interface CabMaterialChoice {
  id: number;
  name: string;
  form: 'solid' | 'prewet' | 'liquid' | 'abrasive';
  densityKgPerM3: number;
}

export type MaterialChoiceProps = Readonly<{
  materials: readonly CabMaterialChoice[];
  value: number;
  onChange: (materialId: number) => void;
}>;

export function MaterialChoice({ materials, value, onChange }: MaterialChoiceProps) {
  return (
    <Segmented
      label="Material"
      size="cab"
      options={materials.map((choice) => ({ value: String(choice.id), label: choice.name }))}
      value={String(value)}
      onChange={(chosen) => onChange(Number(chosen))}
    />
  );
}
