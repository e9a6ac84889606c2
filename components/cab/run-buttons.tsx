'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { type RunRoad } from '@/lib/contracts/runs';
import { askedOf } from './progress';

export type RunButtonsProps = Readonly<{
  road: RunRoad | null;
  isFinished: boolean;
  onDone: (road: RunRoad) => void;
  onRate: (road: RunRoad) => void;
  onSkip: (road: RunRoad) => void;
  onLoad: () => void;
  onFinish: () => void;
}>;

const doneWords = {
  spread: 'Done, as shown',
  ploughed: 'Done, ploughed',
  nothing: 'Passed, nothing spread',
  unknown: '',
} as const;

export function RunButtons({ road, isFinished, onDone, onRate, onSkip, onLoad, onFinish }: RunButtonsProps) {
  const [isSure, setIsSure] = useState(false);
  if (isFinished) return null;
  const asked = road ? askedOf(road) : 'unknown';
  return (
    <div className="grid gap-4">
      {road ? (
        <div className="grid gap-4 sm:grid-cols-[3fr_2fr]">
          {asked === 'unknown' ? null : (
            <Button variant="primary" size="cab-tall" onClick={() => onDone(road)}>
              {doneWords[asked]}
            </Button>
          )}
          <Button size="cab-tall" variant={asked === 'unknown' ? 'primary' : 'outline'} onClick={() => onRate(road)}>
            {asked === 'unknown' ? 'Done, at a rate I set' : 'Different rate'}
          </Button>
        </div>
      ) : null}
      <div className="grid gap-4 sm:grid-cols-3">
        {road ? (
          <Button size="cab" onClick={() => onSkip(road)}>
            Skip this road
          </Button>
        ) : null}
        <Button size="cab" onClick={onLoad}>
          Load
        </Button>
        <Button
          size="cab"
          variant={isSure || !road ? 'primary' : 'outline'}
          onClick={() => (isSure || !road ? onFinish() : setIsSure(true))}
        >
          {isSure && road ? 'Yes, end with roads left' : 'End the run'}
        </Button>
      </div>
      <p className="text-base text-soft">
        Stop before you touch the tablet. Rates are advice: what you see on the road and local policy decide.
      </p>
    </div>
  );
}
