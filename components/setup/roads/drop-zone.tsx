'use client';

import { type ChangeEvent, type DragEvent, useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import { buttonLook } from '@/components/ui/button-look';
import { classNames } from '@/components/ui/class-names';
import { ProblemNotice } from '@/components/ui/notice';
import { Progress } from '@/components/ui/progress';
import { type ProblemView } from '@/lib/problem';

export interface UploadState {
  fileName: string;
  /** 0 to 1 while bytes are going out; null while the server works */
  fraction: number | null;
}

export type DropZoneProps = Readonly<{
  upload: UploadState | null;
  problem: ProblemView | null;
  onFile: (file: File) => void;
  onStop: () => void;
}>;

/** Where a file of roads is dropped or chosen; while one goes out, how far it is. */
export function DropZone({ upload, problem, onFile, onStop }: DropZoneProps) {
  const [isOver, setIsOver] = useState(false);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(false);
    const file = event.dataTransfer.files[0];
    if (file && !upload) onFile(file);
  };
  const hover = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(true);
  };
  return (
    <div className="grid gap-3">
      <div
        onDragOver={hover}
        onDragLeave={() => setIsOver(false)}
        onDrop={drop}
        className={classNames(
          'rounded-lg border border-dashed px-5 py-6 transition-colors',
          isOver ? 'border-lamp bg-raised' : 'border-safe',
        )}
      >
        {upload ? (
          <Progress
            label={upload.fraction === null ? `Reading ${upload.fileName}` : `Sending ${upload.fileName}`}
            fraction={upload.fraction}
            detail={upload.fraction === null ? 'cutting lines at their junctions' : undefined}
            action={
              <Button size="small" onClick={onStop}>
                Stop
              </Button>
            }
          />
        ) : (
          <FilePicker onFile={onFile} />
        )}
      </div>
      <ProblemNotice problem={problem} />
    </div>
  );
}

function FilePicker({ onFile }: Pick<DropZoneProps, 'onFile'>) {
  const id = useId();
  const choose = (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    // the same file may be chosen again after it was mended
    event.target.value = '';
    if (file) onFile(file);
  };
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-8 gap-y-4">
      <div className="max-w-prose">
        <p className="font-semibold">Drop a GeoJSON file of road centre lines here</p>
        <p className="text-soft">
          WGS 84, up to 50 MB. Nothing is changed until you have seen it on the map and saved it.
        </p>
      </div>
      <div className="relative">
        <input
          id={id}
          type="file"
          accept=".geojson,.json,application/geo+json,application/json"
          onChange={choose}
          className="peer absolute inset-0 cursor-pointer opacity-0"
        />
        <label
          htmlFor={id}
          className={buttonLook(
            'primary',
            'normal',
            false,
            'cursor-pointer peer-focus-visible:outline-2 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-ink',
          )}
        >
          Choose a file
        </label>
      </div>
    </div>
  );
}
