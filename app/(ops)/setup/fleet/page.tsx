import { type Metadata } from 'next';
import { listSpreaders, listTrucks, listYards } from '@/db/queries/fleet';
import { requirePage } from '@/lib/server/page';
import { FleetScreen } from './fleet-screen';

export const metadata: Metadata = { title: 'Yards and trucks' };

export default async function FleetPage() {
  await requirePage('setup.fleet');
  const [yards, trucks, spreaders] = await Promise.all([listYards(), listTrucks(), listSpreaders()]);
  return <FleetScreen yards={yards} trucks={trucks} spreaders={spreaders} />;
}
