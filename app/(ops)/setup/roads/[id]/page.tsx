import { dehydrate, HydrationBoundary, QueryClient } from '@tanstack/react-query';
import { type Metadata } from 'next';
import { notFound } from 'next/navigation';
import { findAgency } from '@/db/queries/agency';
import { findNetworkImport } from '@/db/queries/network-imports';
import { networkImportQuery } from '@/lib/client/queries/network-imports';
import { NetworkImportParams } from '@/lib/contracts/network';
import { readNetworkImport } from '@/lib/server/network-import-view';
import { requirePage } from '@/lib/server/page';
import { ImportScreen } from './import-screen';

export const metadata: Metadata = { title: 'Import of roads' };

export default async function ImportPage({ params }: PageProps<'/setup/roads/[id]'>) {
  await requirePage('setup.roads');
  const parsed = NetworkImportParams.safeParse(await params);
  if (!parsed.success) notFound();
  const { id } = parsed.data;
  const [agency, found] = await Promise.all([findAgency(), findNetworkImport({ id })]);
  if (!found?.payload) notFound();
  const queryClient = new QueryClient();
  queryClient.setQueryData(networkImportQuery(id).queryKey, await readNetworkImport(id));
  return (
    <HydrationBoundary state={dehydrate(queryClient)}>
      <ImportScreen id={id} zone={agency.zone} />
    </HydrationBoundary>
  );
}
