'use client';

import { Button } from '@/components/ui/button';
import { Progress } from '@/components/ui/progress';
import { formatNumber } from '@/lib/units/format';
import { type Progress as UploadProgress } from './upload-readings';

type LoadingProps = Readonly<{ progress: UploadProgress; fileName: string; onStop: () => void }>;

export function Loading({ progress, fileName, onStop }: LoadingProps) {
  const rows = `${formatNumber(progress.rows, 0)} rows read`;
  return (
    <Progress
      label={progress.kind === 'sending' ? `Sending and reading ${fileName}` : 'Storing the readings'}
      fraction={progress.kind === 'sending' ? progress.fraction : null}
      detail={progress.kind === 'sending' ? `${Math.round(progress.fraction * 100)} %, ${rows}` : rows}
      action={
        <Button size="small" onClick={onStop}>
          Stop
        </Button>
      }
    />
  );
}
