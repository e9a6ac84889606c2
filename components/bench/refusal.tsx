'use client';

import { Figure } from '@/components/ui/figure';
import { Notice } from '@/components/ui/notice';
import { saltName, type Salt } from '@/lib/brine/salts';
import { type Assessment } from './assess-brine';

export type RefusalProps = Readonly<{ refused: Extract<Assessment, { ok: false }>; salt: Salt }>;

function words({ refused, salt }: RefusalProps) {
  switch (refused.reason) {
    case 'below-water':
      return {
        title: 'That reading is lighter than water.',
        todo: (
          <>
            Water reads <Figure value={refused.limitSpecificGravity} quantity="specificGravity" size="inline" /> at that
            temperature. Read the hydrometer again, at the bottom of the meniscus.
          </>
        ),
      };
    case 'above-saturation':
      return {
        title: `That reading is past saturated ${saltName[salt]}.`,
        todo: (
          <>
            The strongest brine that was measured reads{' '}
            <Figure value={refused.limitSpecificGravity} quantity="specificGravity" size="inline" />. Check the salt
            chosen, and whether there is silt in the sample.
          </>
        ),
      };
    case 'reading-too-cold':
    case 'reading-too-warm':
      return {
        title: 'A reading cannot be corrected at that temperature.',
        todo: (
          <>
            The limit is <Figure value={refused.limitC} quantity="temperature" size="inline" />. Bring a sample indoors
            and read it there.
          </>
        ),
      };
    case 'too-strong':
      return {
        title: 'That is more salt than the water can hold.',
        todo: (
          <>
            At 25 °C the limit for {saltName[salt]} is{' '}
            <Figure value={refused.limitMassFraction} quantity="percent" size="inline" />; the rest would lie
            undissolved.
          </>
        ),
      };
  }
}

export function Refusal(props: RefusalProps) {
  return <Notice tone="problem" {...words(props)} />;
}
