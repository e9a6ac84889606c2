import { dehydrate, HydrationBoundary, QueryClient } from '@tanstack/react-query';
import { findAgency } from '@/db/queries/agency';
import { listStorms } from '@/db/queries/storms';
import { ledgerQuery } from '@/lib/client/queries/ledger';
import { readLedger } from '@/lib/server/ledger-view';
import { requirePage } from '@/lib/server/page';
import { LedgerScreen } from './ledger-screen';

export const metadata = { title: 'Ledger' };

export default async function LedgerPage({ searchParams }: PageProps<'/ledger'>) {
  await requirePage('ledger.view');
  const [storms, agency, { storm }] = await Promise.all([listStorms(), findAgency(), searchParams]);
  const chosen = storms.find((head) => String(head.id) === storm) ?? storms[0];
  const queryClient = new QueryClient();
  if (chosen) queryClient.setQueryData(ledgerQuery(chosen.id).queryKey, await readLedger(chosen.id));
  return (
    <HydrationBoundary state={dehydrate(queryClient)}>
      <LedgerScreen
        zone={agency.zone}
        chosenId={chosen?.id ?? null}
        storms={storms.map(({ id, number, name }) => ({ id, number, name }))}
      />
    </HydrationBoundary>
  );
}
