import { findAgency } from '@/db/queries/agency';
import { listCabTrucks, listCabYards, listRoadChoices } from '@/db/queries/cab';
import { findUncoveredRoads, listRoutes } from '@/db/queries/routes';
import { refusal, requirePage } from '@/lib/server/page';
import { RoutesScreen } from './routes-screen';

export const metadata = { title: 'Routes' };

export default async function RoutesPage() {
  const actor = await requirePage('routes.view');
  const [agency, routes, uncovered, roads, trucks, yards] = await Promise.all([
    findAgency(),
    listRoutes(),
    findUncoveredRoads(),
    listRoadChoices(),
    listCabTrucks(),
    listCabYards(),
  ]);
  return (
    <RoutesScreen
      attribution={agency.attribution}
      routes={routes}
      uncovered={uncovered}
      roads={roads}
      trucks={trucks.map(({ id, number }) => ({ id, name: `Truck ${number}` }))}
      yards={yards}
      editRefusal={refusal(actor, 'routes.edit')}
    />
  );
}
