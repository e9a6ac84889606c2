'use server';

import { retireRoute as retire, saveRoute as save } from '@/db/commands/save-route';
import { RetireRouteInput, SaveRouteInput } from '@/lib/contracts/routes';
import { action } from '@/lib/server/action';

export const saveRoute = action(
  { action: 'routes.edit', input: SaveRouteInput, revalidate: ['/routes', '/cab'] },
  ({ input, actor }) => save({ input, by: actor.id }),
);

export const retireRoute = action(
  { action: 'routes.edit', input: RetireRouteInput, revalidate: ['/routes', '/cab'] },
  ({ input, actor }) => retire({ id: input.id, by: actor.id }),
);
