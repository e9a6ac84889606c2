import { type Metadata, type Route } from 'next';
import Link from 'next/link';
import { Wordmark } from '@/components/shell/mark';
import { EmptyState } from '@/components/ui/empty-state';
import { Notice } from '@/components/ui/notice';
import { findAgency } from '@/db/queries/agency';
import { findPublicStorm, listPublicRoads, type PublicStorm } from '@/db/queries/status';
import { formatDayTime, formatTime } from '@/lib/time/format';
import { RoadStatus, type StatusRoad } from './road-status';

export const metadata: Metadata = {
  title: 'Road treatment',
  description: 'Which roads have been salted or ploughed in this storm, and when.',
};

// Always as of now: nobody should drive by a page that was made an hour ago.
export const dynamic = 'force-dynamic';

async function roadsOf(storm: PublicStorm | null, zone: string): Promise<StatusRoad[]> {
  if (!storm?.publishedAt) return [];
  const roads = await listPublicRoads({ stormId: storm.id });
  return roads.map(({ lastTreatedAt, ...road }) => ({
    ...road,
    lastTreated: lastTreatedAt ? formatDayTime(lastTreatedAt, zone) : null,
  }));
}

function Quiet({ storm }: Readonly<{ storm: PublicStorm | null }>) {
  return storm ? (
    <EmptyState title="Nothing has been published for this storm yet">
      The crews are at work on it. Look again in a while, and expect every road to be slippery until then.
    </EmptyState>
  ) : (
    <EmptyState title="No storm is being worked on now">
      No road is being treated. Bridges and shaded places can still be icy on a clear night.
    </EmptyState>
  );
}

export default async function StatusPage() {
  const [agency, storm] = await Promise.all([findAgency(), findPublicStorm()]);
  const roads = await roadsOf(storm, agency.zone);
  const now = new Date();
  return (
    <div className="mx-auto grid min-h-dvh max-w-5xl content-start gap-6 px-4 pb-12 md:px-8">
      <header className="flex min-h-14 flex-wrap items-center justify-between gap-x-6 border-b py-2">
        <Wordmark />
        <p className="text-soft">
          {agency.name ? `${agency.name}. ` : ''}
          <Link href={'/sign-in' as Route} className="link print:hidden">
            Sign in
          </Link>
        </p>
      </header>
      <main className="grid gap-6">
        <div>
          <h1 className="text-2xl font-bold">
            {storm ? `Roads treated in storm ${String(storm.number).padStart(2, '0')}` : 'Road treatment'}
          </h1>
          <p className="mt-1 text-soft">
            {storm ? `${storm.name}. ` : ''}As of {formatDayTime(now, agency.zone)}.
            {storm?.publishedAt
              ? ` Plan for pass ${storm.passNumber} published at ${formatTime(storm.publishedAt, agency.zone)}.`
              : ''}
          </p>
        </div>
        <Notice tone="caution" title="Treated does not mean safe. Drive to conditions.">
          A treated road can freeze again, and a road listed here as done may be white by the time you reach it.
        </Notice>
        {roads.length > 0 ? <RoadStatus roads={roads} /> : <Quiet storm={storm} />}
      </main>
      <footer className="border-t pt-4 text-sm text-faint">Times are local. {agency.attribution}</footer>
    </div>
  );
}
