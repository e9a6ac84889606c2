import { type Metadata } from 'next';
import { EmptyState } from '@/components/ui/empty-state';
import { LinkButton } from '@/components/ui/link-button';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { actions, permissions, roleNames } from '@/lib/permissions';
import { requirePage } from '@/lib/server/page';

export const metadata: Metadata = { title: 'Not for your role' };

type Search = Promise<{ for?: string | string[] }>;

export default async function NotAllowedPage({ searchParams }: Readonly<{ searchParams: Search }>) {
  const actor = await requirePage('bench.use');
  const { for: asked } = await searchParams;
  const action = actions.find((known) => known === asked);
  const may = action
    ? Object.keys(permissions[action].grants).map((role) => roleNames[role as keyof typeof roleNames].toLowerCase())
    : [];
  return (
    <>
      <PageHeader title="Not for your role" />
      <PageBody>
        <EmptyState
          title={`You are signed in as ${roleNames[actor.role].toLowerCase()}, which may not ${action ? permissions[action].does : 'open this page'}.`}
          action={<LinkButton href="/">Go to your first page</LinkButton>}
        >
          {may.length > 0 ? `Roles that may: ${may.join(', ')}. ` : ''}
          If you need it, ask an administrator to change your role. Nothing was changed.
        </EmptyState>
      </PageBody>
    </>
  );
}
