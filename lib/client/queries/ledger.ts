import { queryOptions } from '@tanstack/react-query';
import { LedgerView } from '@/lib/contracts/ledger';
import { ask } from '../api';

export const ledgerQuery = (stormId: number) =>
  queryOptions({
    queryKey: ['ledger', stormId],
    queryFn: ({ signal }) => ask(`/api/storms/${stormId}/ledger`, LedgerView, { signal }),
    refetchInterval: 60_000,
  });
