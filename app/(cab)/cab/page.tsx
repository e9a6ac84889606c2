import { listCabMaterials, listCabTrucks, listCabYards, listRoadChoices } from '@/db/queries/cab';
import { listRoutes } from '@/db/queries/routes';
import { findAgency } from '@/db/queries/agency';
import { findOpenRunOf } from '@/db/queries/runs';
import { requirePage } from '@/lib/server/page';
import { CabScreen } from './cab-screen';

export const metadata = { title: 'Cab' };

export default async function CabPage() {
  const actor = await requirePage('cab.use');
  const [agency, open, trucks, routes, roads, materials, yards] = await Promise.all([
    findAgency(),
    findOpenRunOf({ driverId: actor.id }),
    listCabTrucks(),
    listRoutes(),
    listRoadChoices(),
    listCabMaterials(),
    listCabYards(),
  ]);
  return (
    <CabScreen
      driver={{ id: actor.id, name: actor.name, role: actor.role }}
      zone={agency.zone}
      openRunId={open?.id ?? null}
      trucks={trucks}
      routes={routes.map((route) => ({ ...route, roads: route.segmentIds.length }))}
      roads={roads}
      materials={materials}
      yards={yards}
    />
  );
}
