'use server';

import { adoptPolicy } from '@/db/commands/adopt-policy';
import { AdoptPolicyInput } from '@/lib/contracts/policy';
import { action } from '@/lib/server/action';

export const adoptPolicyAction = action(
  { action: 'setup.policy', input: AdoptPolicyInput, revalidate: ['/setup/policy'] },
  ({ actor, input }) => adoptPolicy({ input, by: actor.id, now: new Date() }),
);
