import { StormParams } from '@/lib/contracts/ledger';
import { ledgerCsv } from '@/lib/ledger/csv';
import { handle } from '@/lib/server/handle';
import { readLedger } from '@/lib/server/ledger-view';

export const GET = handle({ action: 'ledger.view', params: StormParams, reply: 'response' }, async ({ params }) => {
  const ledger = await readLedger(params.id);
  return new Response(ledgerCsv(ledger), {
    headers: {
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': `attachment; filename="storm-${String(ledger.stormNumber).padStart(2, '0')}-ledger.csv"`,
    },
  });
});
