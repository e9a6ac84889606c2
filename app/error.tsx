'use client';

import { Button } from '@/components/ui/button';
import { LinkButton } from '@/components/ui/link-button';

export default function ErrorPage({
  error,
  reset,
}: Readonly<{ error: Error & { digest?: string }; reset: () => void }>) {
  return (
    <main className="grid min-h-[60dvh] content-center gap-3 px-6 md:px-16">
      <h1 className="text-2xl font-bold">This page could not be shown</h1>
      <p className="max-w-prose text-soft">
        What was saved before is safe; something typed on this page and not yet sent may be lost. Try again; if it
        stays, give this reference to whoever runs the server: {error.digest ?? 'none'}.
      </p>
      <div className="mt-2 flex flex-wrap gap-2.5">
        <Button variant="primary" onClick={reset}>
          Try again
        </Button>
        <LinkButton href="/">Go to your first page</LinkButton>
      </div>
    </main>
  );
}
