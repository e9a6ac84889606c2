'use client';

import { Button } from '@/components/ui/button';
import { Progress } from '@/components/ui/progress';
import { formatNumber } from '@/lib/units/format';
import { type Progress as UploadProgress } from './upload-readings';

type LoadingProps = Readonly<{ progress: UploadProgress; fileName: string; onStop: () => void }>;

export function Loading({ progress, fileName, onStop }: LoadingProps) {
  const isSending = progress.kind === 'sending';
  const detail = isSending
    ? `${Math.round(progress.fraction * 100)} %, ${(progress.bytes / 1e6).toFixed(1)} MB`
    : progress.rows > 0
      ? `${formatNumber(progress.rows, 0)} rows read`
      : undefined;
  return (
    <Progress
      label={isSending ? `Sending and reading ${fileName}` : 'Storing the readings'}
      fraction={isSending ? progress.fraction : null}
      detail={detail}
      action={
        <Button size="small" onClick={onStop}>
          Stop
        </Button>
      }
    />
  );
}
