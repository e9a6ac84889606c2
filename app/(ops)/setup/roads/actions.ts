'use server';

import { applyNetworkImport } from '@/db/commands/apply-network-import';
import { changeSegment } from '@/db/commands/change-segment';
import { discardNetworkImport, remapNetworkImport } from '@/db/commands/preview-network-import';
import { undoNetworkImport } from '@/db/commands/undo-network-import';
import {
  ApplyNetworkImportInput,
  ChangeSegmentInput,
  NetworkImportIdInput,
  RemapNetworkImportInput,
} from '@/lib/contracts/network';
import { action } from '@/lib/server/action';

const revalidate = ['/setup/roads', '/roads'];

export const remapNetworkImportAction = action({ action: 'setup.roads', input: RemapNetworkImportInput }, ({ input }) =>
  remapNetworkImport(input),
);

export const applyNetworkImportAction = action(
  { action: 'setup.roads', input: ApplyNetworkImportInput, revalidate },
  ({ actor, input }) => applyNetworkImport({ ...input, by: actor.id, now: new Date() }),
);

export const undoNetworkImportAction = action(
  { action: 'setup.roads', input: NetworkImportIdInput, revalidate },
  ({ actor, input }) => undoNetworkImport({ id: input.id, by: actor.id, now: new Date() }),
);

export const discardNetworkImportAction = action(
  { action: 'setup.roads', input: NetworkImportIdInput, revalidate: ['/setup/roads'] },
  ({ actor, input }) => discardNetworkImport({ id: input.id, by: actor.id }),
);

export const changeSegmentAction = action(
  { action: 'setup.roads', input: ChangeSegmentInput, revalidate },
  ({ actor, input }) => changeSegment({ input, by: actor.id, now: new Date() }),
);
