import { NetworkImportParams, NetworkImportView } from '@/lib/contracts/network';
import { handle } from '@/lib/server/handle';
import { readNetworkImport } from '@/lib/server/network-import-view';

/** A import of roads with its report and its roads, for the map. */
export const GET = handle(
  { action: 'setup.roads', params: NetworkImportParams, reply: NetworkImportView },
  ({ params }) => readNetworkImport(params.id),
);
