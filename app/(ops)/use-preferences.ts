'use client';

import { useRouter } from 'next/navigation';
import { startTransition, useState } from 'react';
import { type PreferencesProps, type Theme, type Units } from '@/components/shell/preferences';
import { useAnnounce } from '@/components/ui/announcements';
import { useSubmission } from '@/components/ui/use-submission';
import { savePreferences } from './account/actions';

/** The person's units and theme: shown as chosen at once, kept on the server, taken back when refused. */
export function usePreferences(saved: { units: Units; theme: Theme }): PreferencesProps {
  const router = useRouter();
  const announce = useAnnounce();
  const [pending, setPending] = useState<Partial<{ units: Units; theme: Theme }>>({});
  const { send } = useSubmission(
    savePreferences,
    () =>
      startTransition(() => {
        router.refresh();
        setPending({});
      }),
    (problem) => {
      setPending({});
      announce(`${problem.title} ${problem.detail}`);
    },
  );
  return {
    ...saved,
    ...pending,
    onChange: (change) => {
      setPending((before) => ({ ...before, ...change }));
      send('units' in change ? { unitSystem: change.units } : { theme: change.theme });
    },
  };
}
