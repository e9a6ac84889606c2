'use client';

import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { type Quantity } from '@/lib/units/format';

export type StepperProps = Readonly<{
  label: string;
  /** SI */
  value: number;
  quantity: Quantity;
  digits?: number;
  /** SI; small and large step */
  steps: readonly [number, number];
  min: number;
  max: number;
  onChange: (value: number) => void;
}>;

/** A number set by thumb, with nothing to type. */
export function Stepper({ label, value, quantity, digits = 0, steps, min, max, onChange }: StepperProps) {
  const by = (step: number) => onChange(Math.min(max, Math.max(min, value + step)));
  const button = (step: number, word: string) => (
    <Button size="cab" className="min-w-20 flex-1" onClick={() => by(step)} aria-label={`${label}: ${word}`}>
      {word}
    </Button>
  );
  return (
    <div role="group" aria-label={label} className="grid gap-3">
      <p aria-live="polite" className="text-center text-5xl font-bold text-lamp">
        <Figure value={value} quantity={quantity} digits={digits} size="inline" />
      </p>
      <div className="flex flex-wrap gap-2">
        {button(-steps[1], 'Much less')}
        {button(-steps[0], 'Less')}
        {button(steps[0], 'More')}
        {button(steps[1], 'Much more')}
      </div>
    </div>
  );
}
