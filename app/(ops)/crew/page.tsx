import { dehydrate, HydrationBoundary, QueryClient } from '@tanstack/react-query';
import { findAgency } from '@/db/queries/agency';
import { listCrew, listDrivers } from '@/db/queries/crew';
import { crewQuery } from '@/lib/client/queries/crew';
import { CrewView } from '@/lib/contracts/crew';
import { requirePage } from '@/lib/server/page';
import { CrewScreen } from './crew-screen';

export const metadata = { title: 'Crew' };

export default async function CrewPage() {
  await requirePage('crew.view');
  const [agency, trucks, drivers] = await Promise.all([findAgency(), listCrew(), listDrivers()]);
  const queryClient = new QueryClient();
  queryClient.setQueryData(crewQuery.queryKey, CrewView.parse({ trucks, drivers }));
  return (
    <HydrationBoundary state={dehydrate(queryClient)}>
      <CrewScreen zone={agency.zone} />
    </HydrationBoundary>
  );
}
