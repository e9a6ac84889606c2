'use server';

import { saveSpreader } from '@/db/commands/save-spreader';
import { saveTruck } from '@/db/commands/save-truck';
import { saveYard } from '@/db/commands/save-yard';
import { SaveSpreaderInput, SaveTruckInput, SaveYardInput } from '@/lib/contracts/fleet';
import { action } from '@/lib/server/action';

const revalidate = ['/setup/fleet'];

export const saveYardAction = action({ action: 'setup.fleet', input: SaveYardInput, revalidate }, ({ actor, input }) =>
  saveYard({ input, by: actor.id, now: new Date() }),
);

export const saveTruckAction = action(
  { action: 'setup.fleet', input: SaveTruckInput, revalidate },
  ({ actor, input }) => saveTruck({ input, by: actor.id, now: new Date() }),
);

export const saveSpreaderAction = action(
  { action: 'setup.fleet', input: SaveSpreaderInput, revalidate },
  ({ actor, input }) => saveSpreader({ input, by: actor.id, now: new Date() }),
);
