import { findAgency } from '@/db/queries/agency';
import { listCabMaterials } from '@/db/queries/cab';
import { listRunHeads } from '@/db/queries/runs';
import { listLoads, listYardSummaries } from '@/db/queries/yards';
import { refusal, requirePage } from '@/lib/server/page';
import { YardScreen } from './yard-screen';

export const metadata = { title: 'Yard' };

export default async function YardPage() {
  const actor = await requirePage('yard.view');
  const [agency, yards, loads, runs, materials] = await Promise.all([
    findAgency(),
    listYardSummaries({ now: new Date() }),
    listLoads({ limit: 60 }),
    listRunHeads({ stormId: null }),
    listCabMaterials(),
  ]);
  return (
    <YardScreen
      zone={agency.zone}
      yards={yards}
      loads={loads.map((load) => ({ ...load, loadedAt: load.loadedAt.toISOString() }))}
      runs={runs.map((run) => ({ id: run.id, label: `Truck ${run.truckNumber}, ${run.driverName}` }))}
      materials={materials}
      loadRefusal={refusal(actor, 'load.record')}
    />
  );
}
