'use server';

import { closeStorm as close } from '@/db/commands/close-storm';
import { openStorm as open } from '@/db/commands/open-storm';
import { publishPlan } from '@/db/commands/publish-plan';
import { workOutPlan } from '@/db/commands/work-out-plan';
import { PublishInput, WorkOutInput } from '@/lib/contracts/plans';
import { CloseStormInput, OpenStormInput } from '@/lib/contracts/storms';
import { action } from '@/lib/server/action';

export const openStorm = action(
  { action: 'storms.open', input: OpenStormInput, revalidate: ['/storm', '/roads', '/cab'] },
  ({ input, actor }) => open({ input, by: actor.id, now: new Date() }),
);

export const closeStorm = action(
  { action: 'storms.open', input: CloseStormInput, revalidate: ['/storm', '/roads', '/cab'] },
  ({ input, actor }) => close({ stormId: input.stormId, by: actor.id, now: new Date() }),
);

export const workOut = action(
  { action: 'plans.work-out', input: WorkOutInput, revalidate: ['/storm', '/roads'] },
  ({ input, actor }) => workOutPlan({ ...input, by: actor.id, now: new Date() }),
);

export const publish = action(
  { action: 'plans.publish', input: PublishInput, revalidate: ['/storm', '/roads', '/cab', '/status'] },
  ({ input, actor }) => publishPlan({ planId: input.planId, by: actor.id, now: new Date() }),
);
