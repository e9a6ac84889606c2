'use server';

import { issueStationKey, revokeStationKey } from '@/db/commands/issue-station-key';
import { saveReadingMapping } from '@/db/commands/save-reading-mapping';
import { saveStation } from '@/db/commands/save-station';
import {
  IssueStationKeyInput,
  RevokeStationKeyInput,
  SaveMappingInput,
  SaveStationInput,
} from '@/lib/contracts/readings';
import { action } from '@/lib/server/action';

const revalidate = ['/setup/stations'];

export const saveStationAction = action(
  { action: 'setup.stations', input: SaveStationInput, revalidate },
  ({ actor, input }) => saveStation({ input, by: actor.id, now: new Date() }),
);

export const saveMappingAction = action({ action: 'readings.import', input: SaveMappingInput }, ({ actor, input }) =>
  saveReadingMapping({ input, by: actor.id, now: new Date() }),
);

export const issueKeyAction = action({ action: 'setup.stations', input: IssueStationKeyInput }, ({ actor, input }) =>
  issueStationKey({ input, by: actor.id, now: new Date() }),
);

export const revokeKeyAction = action({ action: 'setup.stations', input: RevokeStationKeyInput }, ({ actor, input }) =>
  revokeStationKey({ input, by: actor.id, now: new Date() }),
);
