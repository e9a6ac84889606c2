import { type Metadata } from 'next';
import { findAgency } from '@/db/queries/agency';
import { listNetworkAttributions, listNetworkImports } from '@/db/queries/network-imports';
import { listSetupSegments, SEGMENTS_A_PAGE, sumSetupSegments } from '@/db/queries/setup-segments';
import { SegmentFilter } from '@/lib/contracts/network';
import { presentImport } from '@/lib/server/network-import-view';
import { requirePage } from '@/lib/server/page';
import { RoadsSetupScreen } from './roads-setup-screen';

export const metadata: Metadata = { title: 'Roads' };

export default async function RoadsSetupPage({ searchParams }: PageProps<'/setup/roads'>) {
  await requirePage('setup.roads');
  const { find, serviceClass, assumed, page } = await searchParams;
  const filter = SegmentFilter.parse({ find, serviceClass, assumed, page });
  const everything = SegmentFilter.parse({});
  const [agency, imports, roads, shown, totals, attributions] = await Promise.all([
    findAgency(),
    listNetworkImports(),
    listSetupSegments(filter),
    sumSetupSegments(filter),
    sumSetupSegments(everything),
    listNetworkAttributions(),
  ]);
  return (
    <RoadsSetupScreen
      zone={agency.zone}
      imports={imports.map(presentImport)}
      roads={roads.map((road) => ({ ...road, updatedAt: road.updatedAt.toISOString() }))}
      filter={filter}
      shown={shown}
      totals={totals}
      pages={Math.max(1, Math.ceil(shown.segments / SEGMENTS_A_PAGE))}
      attributions={attributions}
    />
  );
}
