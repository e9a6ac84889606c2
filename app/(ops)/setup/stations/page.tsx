import { type Metadata } from 'next';
import { findAgency } from '@/db/queries/agency';
import { listStations } from '@/db/queries/stations';
import { refusal, requirePage } from '@/lib/server/page';
import { StationsScreen } from './stations-screen';

export const metadata: Metadata = { title: 'Stations' };

export default async function StationsPage() {
  const actor = await requirePage('readings.import');
  const [agency, stations] = await Promise.all([findAgency(), listStations({ now: new Date() })]);
  return (
    <StationsScreen
      zone={agency.zone}
      stations={stations.map((station) => ({ ...station, observedAt: station.observedAt?.toISOString() ?? null }))}
      whyNotChange={refusal(actor, 'setup.stations')}
    />
  );
}
