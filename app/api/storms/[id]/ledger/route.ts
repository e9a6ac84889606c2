import { LedgerView, StormParams } from '@/lib/contracts/ledger';
import { handle } from '@/lib/server/handle';
import { readLedger } from '@/lib/server/ledger-view';

export const GET = handle({ action: 'ledger.view', params: StormParams, reply: LedgerView }, ({ params }) =>
  readLedger(params.id),
);
