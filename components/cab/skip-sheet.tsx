'use client';

import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/dialog';

export type SkipSheetProps = Readonly<{ roadName: string; onClose: () => void; onSkip: (reason: string) => void }>;

const reasons = ['Road blocked', 'Already treated', 'Not needed', 'Out of material', 'Turned back, unsafe'] as const;

export function SkipSheet({ roadName, onClose, onSkip }: SkipSheetProps) {
  return (
    <Sheet
      isOpen
      onOpenChange={(isOpen) => (isOpen ? undefined : onClose())}
      side="bottom"
      title={`Skip ${roadName}`}
      description="The road stays on the dispatcher's list as not treated."
    >
      <div className="mx-auto grid max-w-2xl gap-3 sm:grid-cols-2">
        {reasons.map((reason) => (
          <Button key={reason} size="cab" onClick={() => onSkip(reason)}>
            {reason}
          </Button>
        ))}
      </div>
    </Sheet>
  );
}
