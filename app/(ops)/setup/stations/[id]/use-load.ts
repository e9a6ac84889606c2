'use client';

import { useRef, useState } from 'react';
import { type ListedStation } from '@/components/setup/stations/listed-station';
import { type ImportReadingsReply } from '@/lib/contracts/readings';
import { type Mapping } from '@/lib/readings/mapping';
import { saveMappingAction } from '../actions';
import { type Progress as UploadProgress, uploadReadings } from './upload-readings';

interface Loaded {
  file: File;
  station: ListedStation;
  mapping: Mapping;
  onLoaded: (fileName: string, reply: ImportReadingsReply) => void;
}

const notSaved = {
  title: 'The server could not be reached.',
  detail: 'Nothing was changed. What you said about the file is still here; check the connection and load it again.',
};
const stopped = { title: 'Stopped.', detail: 'Nothing of the file was kept.' };

/** Remembers the mapping, then sends the file. */
export function useLoad({ file, station, mapping, onLoaded }: Loaded) {
  const [progress, setProgress] = useState<UploadProgress | null>(null);
  const [problem, setProblem] = useState<{ title: string; detail: string } | null>(null);
  const controller = useRef<AbortController | null>(null);
  const run = async (signal: AbortSignal) => {
    const saved = await saveMappingAction({ stationId: station.id, mapping });
    if (!saved.ok) return saved.problem;
    const mappingSavedAt = saved.data.savedAt;
    const sent = await uploadReadings({ file, stationId: station.id, mappingSavedAt, onProgress: setProgress, signal });
    if (!sent.ok) return sent.problem ?? stopped;
    onLoaded(file.name, sent.reply);
    return null;
  };
  const start = () => {
    controller.current = new AbortController();
    setProblem(null);
    setProgress({ kind: 'sending', fraction: 0, bytes: 0 });
    run(controller.current.signal)
      .catch(() => notSaved)
      .then((found) => {
        setProblem(found);
        setProgress(null);
      })
      .catch(() => undefined);
  };
  return { progress, problem, start, stop: () => controller.current?.abort() };
}
