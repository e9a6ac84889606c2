import { preload } from 'react-dom';
import { findAgency } from '@/db/queries/agency';
import { findNewestClosedStorm, findOpenStorm, findStorm } from '@/db/queries/storm-state';
import { curveOf } from '@/components/bench/curves';
import { saltName, salts } from '@/lib/brine/salts';
import { can } from '@/lib/permissions';
import { requirePage } from '@/lib/server/page';
import { RoadsScreen } from './roads-screen';

export const metadata = { title: 'Roads' };

type PageProps = Readonly<{ searchParams: Promise<Record<string, string | string[] | undefined>> }>;

const wholeNumber = (value: string | string[] | undefined) => {
  const number = Number(value);
  return typeof value === 'string' && Number.isInteger(number) && number > 0 ? number : null;
};

const curves = () =>
  Object.fromEntries(
    salts.map((salt) => {
      const { ice, salts: saltBranch } = curveOf(salt);
      return [salt, { name: saltName[salt], iceBranch: ice, saltBranch }];
    }),
  );

export default async function RoadsPage({ searchParams }: PageProps) {
  const actor = await requirePage('roads.view');
  const asked = await searchParams;
  const askedStorm = wholeNumber(asked.storm);
  const [agency, open, chosen] = await Promise.all([
    findAgency(),
    findOpenStorm(),
    askedStorm === null ? null : findStorm({ id: askedStorm }),
  ]);
  const storm = chosen ?? open;
  const before = storm ? null : await findNewestClosedStorm();
  // Large, and mostly answered by the browser's own cache: asked for at once, but never written into the page.
  preload('/api/road-map', { as: 'fetch', crossOrigin: 'anonymous' });
  if (storm) preload(`/api/storms/${storm.id}/state`, { as: 'fetch', crossOrigin: 'anonymous' });
  return (
    <RoadsScreen
      storm={storm && { id: storm.id, number: storm.number, name: storm.name }}
      before={before && { id: before.id, number: before.number, name: before.name }}
      zone={agency.zone}
      curves={curves()}
      address={{ segmentId: wholeNumber(asked.segment), at: wholeNumber(asked.at) }}
      may={{
        workOut: can(actor, 'plans.work-out'),
        publish: can(actor, 'plans.publish'),
        importRoads: can(actor, 'setup.roads').allowed,
        openStorm: can(actor, 'storms.open').allowed,
      }}
    />
  );
}
