import { type Metadata } from 'next';
import { notFound } from 'next/navigation';
import { findAgency } from '@/db/queries/agency';
import { findStation, findStationMapping, listStationKeys } from '@/db/queries/stations';
import { listUploads } from '@/db/queries/uploads';
import { UploadParams as StationParams } from '@/lib/contracts/readings';
import { refusal, requirePage } from '@/lib/server/page';
import { StationScreen } from './station-screen';

export const metadata: Metadata = { title: 'Station' };

const UPLOADS_SHOWN = 50;
const isoOf = (at: Date | null) => at?.toISOString() ?? null;

export default async function StationPage({ params }: PageProps<'/setup/stations/[id]'>) {
  const actor = await requirePage('readings.import');
  const parsed = StationParams.safeParse(await params);
  if (!parsed.success) notFound();
  const stationId = parsed.data.id;
  const whyNotChange = refusal(actor, 'setup.stations');
  const [agency, station, mapping, keys, uploads] = await Promise.all([
    findAgency(),
    findStation({ id: stationId }),
    findStationMapping({ stationId }),
    whyNotChange === null ? listStationKeys({ stationId }) : [],
    listUploads({ stationId, limit: UPLOADS_SHOWN }),
  ]);
  if (!station) notFound();
  return (
    <StationScreen
      zone={agency.zone}
      station={station}
      remembered={mapping && { ...mapping, updatedAt: mapping.updatedAt.toISOString() }}
      keys={keys.map((key) => ({
        ...key,
        issuedAt: key.issuedAt.toISOString(),
        revokedAt: isoOf(key.revokedAt),
        lastUsedAt: isoOf(key.lastUsedAt),
      }))}
      uploads={uploads.map((upload) => ({ ...upload, finishedAt: upload.finishedAt.toISOString() }))}
      whyNotChange={whyNotChange}
    />
  );
}
