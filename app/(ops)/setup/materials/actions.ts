'use server';

import { saveMaterial } from '@/db/commands/save-material';
import { SaveMaterialInput } from '@/lib/contracts/materials';
import { action } from '@/lib/server/action';

export const saveMaterialAction = action(
  { action: 'setup.materials', input: SaveMaterialInput, revalidate: ['/setup/materials'] },
  ({ actor, input }) => saveMaterial({ input, by: actor.id, now: new Date() }),
);
