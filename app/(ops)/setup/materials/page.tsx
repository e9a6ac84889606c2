import { type Metadata } from 'next';
import { findAgency } from '@/db/queries/agency';
import { listMaterials } from '@/db/queries/materials';
import { freezingPoint } from '@/lib/brine/liquidus';
import { salts } from '@/lib/brine/salts';
import { requirePage } from '@/lib/server/page';
import { MaterialsScreen } from './materials-screen';

export const metadata: Metadata = { title: 'Materials' };

type Material = Awaited<ReturnType<typeof listMaterials>>[number];

/** Where a liquid freezes as it stands in the tank; null for what is no liquid, or outside the model. */
function freezesAtC({ form, composition }: Material): number | null {
  if (form !== 'liquid') return null;
  const solutes = salts.flatMap((salt) => (composition[salt] ? [{ salt, massFraction: composition[salt] }] : []));
  const answer = freezingPoint(solutes);
  return answer.ok ? answer.freezingPointC : null;
}

export default async function MaterialsPage() {
  await requirePage('setup.materials');
  const [materials, agency] = await Promise.all([listMaterials(), findAgency()]);
  return (
    <MaterialsScreen
      materials={materials.map((material) => ({ ...material, freezesAtC: freezesAtC(material) }))}
      currency={agency.currency}
    />
  );
}
