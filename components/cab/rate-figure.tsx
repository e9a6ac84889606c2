'use client';

import { Figure } from '@/components/ui/figure';

export type RateFigureProps = Readonly<{ rateGPerM2: number; rateMlPerM2?: number | null; size?: 'normal' | 'cab' }>;

/** A rate as its material is spread: liquids by volume, all else by mass. Whole numbers, as a spreader is set. */
export function RateFigure({ rateGPerM2, rateMlPerM2, size = 'normal' }: RateFigureProps) {
  return rateMlPerM2 === null || rateMlPerM2 === undefined ? (
    <Figure value={rateGPerM2} quantity="rate" digits={0} size={size} />
  ) : (
    <Figure value={rateMlPerM2} quantity="liquidRate" digits={0} size={size} />
  );
}
