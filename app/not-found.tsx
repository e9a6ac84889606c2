import { type Metadata } from 'next';
import { Wordmark } from '@/components/shell/mark';
import { LinkButton } from '@/components/ui/link-button';

export const metadata: Metadata = { title: 'No such page' };

export default function NotFound() {
  return (
    <main className="grid min-h-[80dvh] content-center gap-3 px-6 md:px-16">
      <Wordmark className="mb-6" />
      <h1 className="text-2xl font-bold">There is no such page</h1>
      <p className="max-w-prose text-soft">
        The address may be mistyped, or what it led to was removed. Nothing was changed.
      </p>
      <div className="mt-2">
        <LinkButton href="/" variant="primary">
          Go to your first page
        </LinkButton>
      </div>
    </main>
  );
}
