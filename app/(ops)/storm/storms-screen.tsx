'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { OpenStormForm } from '@/components/storm/open-storm-form';
import { StormsTable, type StormRowView } from '@/components/storm/storms-table';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';
import { EmptyState } from '@/components/ui/empty-state';
import { PageBody, PageHeader } from '@/components/ui/page-header';
import { useNow } from '@/components/ui/use-now';
import { useSubmission } from '@/components/ui/use-submission';
import { openStorm } from './actions';

export type StormsScreenProps = Readonly<{
  zone: string;
  openRefusal: string | null;
  storms: readonly StormRowView[];
}>;

export function StormsScreen({ zone, openRefusal, storms }: StormsScreenProps) {
  const router = useRouter();
  const announce = useAnnounce();
  const nowAt = useNow();
  const [isOpening, setIsOpening] = useState(false);
  const opening = useSubmission(openStorm, ({ id, number }) => {
    setIsOpening(false);
    announce(`Storm ${number} is open.`);
    router.push(`/storm/${id}`);
  });
  const open = storms.filter(({ closedAt }) => closedAt === null).length;
  const button = (
    <Button variant="primary" disabledReason={openRefusal} onClick={() => setIsOpening(true)}>
      Open a storm
    </Button>
  );
  return (
    <>
      <PageHeader
        title="Storms"
        facts={storms.length > 0 ? [`${open} open, ${storms.length - open} closed`] : []}
        actions={button}
      />
      <PageBody>
        {storms.length === 0 ? (
          <EmptyState title="No storm has been opened yet.">
            A storm has a span of time and passes. Open one, then work out what each pass should spread.
          </EmptyState>
        ) : (
          <StormsTable storms={storms} zone={zone} />
        )}
      </PageBody>
      <Sheet
        isOpen={isOpening}
        onOpenChange={setIsOpening}
        title="Open a storm"
        description="Times of passes are when trucks leave the yard."
      >
        {nowAt === null ? null : <OpenStormForm submission={opening} zone={zone} nowAt={nowAt} />}
      </Sheet>
    </>
  );
}
