'use client';

import { type ChangeEvent, type DragEvent, useId, useState } from 'react';
import { buttonLook } from '@/components/ui/button-look';
import { classNames } from '@/components/ui/class-names';

export type FileDropProps = Readonly<{ onFile: (file: File) => void; isPrimary: boolean }>;

/** Where a file of readings is dropped or chosen. */
export function FileDrop({ onFile, isPrimary }: FileDropProps) {
  const id = useId();
  const [isOver, setIsOver] = useState(false);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(false);
    const file = event.dataTransfer.files[0];
    if (file) onFile(file);
  };
  const hover = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(true);
  };
  const choose = (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    // the same file may be chosen again after it was mended
    event.target.value = '';
    if (file) onFile(file);
  };
  return (
    <div
      onDragOver={hover}
      onDragLeave={() => setIsOver(false)}
      onDrop={drop}
      className={classNames(
        'flex flex-wrap items-center justify-between gap-x-8 gap-y-4 rounded-lg border border-dashed px-5 py-5 transition-colors',
        isOver ? 'border-lamp bg-raised' : 'border-safe',
      )}
    >
      <div className="max-w-prose">
        <p className="font-semibold">Drop a CSV or text file of this station’s readings here</p>
        <p className="text-soft">Up to 200 MB. You see how it will be understood before anything is loaded.</p>
      </div>
      <div className="relative">
        <input
          id={id}
          type="file"
          accept=".csv,.txt,.tsv,.dat,text/csv,text/plain"
          onChange={choose}
          className="peer absolute inset-0 cursor-pointer opacity-0"
        />
        <label
          htmlFor={id}
          className={buttonLook(
            isPrimary ? 'primary' : 'outline',
            'normal',
            false,
            'cursor-pointer peer-focus-visible:outline-2 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-ink',
          )}
        >
          {isPrimary ? 'Choose a file' : 'Choose another file'}
        </label>
      </div>
    </div>
  );
}
