import { permissions, roleNames, type Action } from '@/lib/permissions';
import { LinkButton } from '@/components/ui/link-button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { getActor } from '@/lib/server/session';

export const metadata = { title: 'Not for your role' };

export default async function NotAllowedPage({ searchParams }: PageProps<'/not-allowed'>) {
  const [actor, { for: wanted }] = await Promise.all([getActor(), searchParams]);
  const does =
    typeof wanted === 'string' && wanted in permissions ? permissions[wanted as Action].does : 'see this page';
  const role = actor ? roleNames[actor.role].toLowerCase() : 'person signed out';
  return (
    <>
      <PageHeader title="Not for your role" />
      <PageBody>
        <EmptyState
          title={`A ${role} may not ${does}.`}
          action={<LinkButton href="/">Go to your own screen</LinkButton>}
        >
          If you need to, an administrator can change your role in Set-up, People.
        </EmptyState>
      </PageBody>
    </>
  );
}
