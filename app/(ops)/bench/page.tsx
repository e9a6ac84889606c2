import { type BenchProduct } from '@/components/bench/tonight-row';
import { findAgency } from '@/db/queries/agency';
import { findColdestPavement } from '@/db/queries/coldest-pavement';
import { listMaterials, type MaterialRecord } from '@/db/queries/materials';
import { requirePage } from '@/lib/server/page';
import { formatTime } from '@/lib/time/format';
import { BenchScreen } from './bench-screen';

export const metadata = { title: 'Brine bench' };

function productsOf(materials: readonly MaterialRecord[]): BenchProduct[] {
  return materials
    .filter(({ isActive, form }) => isActive && (form === 'liquid' || form === 'solid'))
    .map((material) => ({
      key: String(material.id),
      name: material.name,
      isLiquid: material.form === 'liquid',
      composition: material.composition,
      waterMassFraction: material.waterMassFraction,
      densityKgPerM3: material.densityKgPerM3,
      costCentsPerTonne: material.costCentsPerTonne,
      practicalMinimumC: material.practicalMinimumC,
    }));
}

export default async function BenchPage() {
  await requirePage('bench.use');
  const [agency, materials, coldest] = await Promise.all([
    findAgency(),
    listMaterials(),
    findColdestPavement({ now: new Date() }),
  ]);
  const road = coldest && {
    tempC: coldest.pavementTempC,
    words: `${coldest.stationName}, measured ${formatTime(coldest.observedAt, agency.zone)}`,
  };
  return <BenchScreen materials={productsOf(materials)} currency={agency.currency} road={road} />;
}
