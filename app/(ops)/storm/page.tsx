import { findAgency } from '@/db/queries/agency';
import { listStorms } from '@/db/queries/storms';
import { refusal, requirePage } from '@/lib/server/page';
import { StormsScreen } from './storms-screen';

export const metadata = { title: 'Storms' };

export default async function StormsPage() {
  const actor = await requirePage('storms.view');
  const [storms, agency] = await Promise.all([listStorms(), findAgency()]);
  return (
    <StormsScreen
      zone={agency.zone}
      openRefusal={refusal(actor, 'storms.open')}
      storms={storms.map(({ fromAt, untilAt, closedAt, ...storm }) => ({
        ...storm,
        fromAt: fromAt.getTime(),
        untilAt: untilAt.getTime(),
        closedAt: closedAt?.getTime() ?? null,
      }))}
    />
  );
}
