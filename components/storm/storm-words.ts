import { type MaterialForm } from '@/lib/treatment/materials';
import { type PromiseKind } from '@/lib/treatment/promise';

const two = (number: number) => String(number).padStart(2, '0');

export const stormTitle = (storm: { number: number; name: string }) => `Storm ${two(storm.number)}, ${storm.name}`;

export const actionWords = {
  nothing: 'nothing',
  plough: 'plough only',
  'anti-ice': 'anti-ice',
  'pre-wet': 'pre-wetted salt',
  solid: 'solid',
  abrasives: 'abrasives',
  undecided: 'undecided',
} as const;

/** What a class was promised, for whoever reads it for the first time. */
export const promiseWords: Readonly<Record<PromiseKind, { name: string; means: string }>> = {
  bare: { name: 'bare', means: 'no ice on a thin film; snow kept loose for the plough' },
  passable: { name: 'passable', means: 'at most a fifth of a thin film as ice; snow kept loose' },
  low: { name: 'low', means: 'at most half of a thin film as ice; snow weakened for the plough' },
};

/** What is left to try when a product is refused, by why. */
export const alternatives = {
  'below-eutectic': 'Take a salt that works colder, plough, or spread abrasives.',
  'below-practical-limit': 'Plough, spread abrasives, or take a salt that works colder.',
  'over-policy-limit': 'Another material, a shorter cycle, or abrasives.',
  'over-spreader-limit': 'Another material, another truck, or a shorter cycle.',
  'not-in-time': 'Plough first, or give it more time.',
  'brine-too-weak': 'A stronger brine, or a solid.',
  'liquid-before-rain': 'Wait for the rain to pass, or a solid.',
  'liquid-in-freezing-rain': 'Pre-wetted or dry solid.',
  'liquid-on-bonded': 'Pre-wetted or dry solid, and time.',
  'dry-cold-blowing': 'Leave the road dry; plough drifts.',
  'melts-nothing': '',
  'not-needed': '',
} as const;

export const isLiquid = (form: MaterialForm | null) => form === 'liquid';
