'use client';

import { useState } from 'react';
import { FileDrop } from '@/components/setup/stations/file-drop';
import { type ListedStation } from '@/components/setup/stations/listed-station';
import { UploadResult } from '@/components/setup/stations/upload-result';
import { ProblemNotice } from '@/components/ui/notice';
import { type ImportReadingsReply } from '@/lib/contracts/readings';
import { type Doubt } from '@/lib/readings/guess-columns';
import { type Mapping } from '@/lib/readings/mapping';
import { previewFile } from '@/lib/readings/preview';
import { LookBefore } from './look-before';
import { type FileHead, guessHead, readHead } from './read-head';

export interface Remembered {
  mapping: Mapping;
  updatedAt: string;
  updatedByName: string;
}

export type LoadReadingsProps = Readonly<{
  station: ListedStation;
  remembered: Remembered | null;
  zone: string;
  onLoaded: () => void;
}>;

/** A chosen file with what is proposed for it. */
export interface Proposal {
  head: FileHead;
  mapping: Mapping;
  doubts: readonly Doubt[];
  /** the mapping is the one that was said of earlier files */
  isRemembered: boolean;
}

type State =
  | { kind: 'choosing'; problem: { title: string; detail: string } | null }
  | { kind: 'looking'; proposal: Proposal }
  | { kind: 'loaded'; fileName: string; reply: ImportReadingsReply };

function propose(head: FileHead, station: ListedStation, remembered: Remembered | null): State {
  const guess = guessHead(head, station.zone);
  if (remembered && (guess.ok || head.bytes.length > 0)) {
    const { bytes, isWhole } = head;
    const seen = previewFile(remembered.mapping, { bytes, isWhole, nowMs: Date.now(), rowCount: 1 });
    if (seen.lacking.length === 0 && seen.goodCount > 0) {
      return { kind: 'looking', proposal: { head, mapping: remembered.mapping, doubts: [], isRemembered: true } };
    }
  }
  if (!guess.ok) {
    return { kind: 'choosing', problem: { title: guess.reason, detail: `Nothing was changed. ${guess.todo}` } };
  }
  return { kind: 'looking', proposal: { head, mapping: guess.mapping, doubts: guess.doubts, isRemembered: false } };
}

const unreadable = { title: 'The browser could not read the file.', detail: 'Nothing was changed. Choose it again.' };

/** From a file on the desk to readings of the station: choose, look how it is understood, load. */
export function LoadReadings({ station, remembered, zone, onLoaded }: LoadReadingsProps) {
  const [state, setState] = useState<State>({ kind: 'choosing', problem: null });
  const choose = async (file: File) => {
    try {
      setState(propose(await readHead(file), station, remembered));
    } catch {
      setState({ kind: 'choosing', problem: unreadable });
    }
  };
  const loaded = (fileName: string, reply: ImportReadingsReply) => {
    setState({ kind: 'loaded', fileName, reply });
    onLoaded();
  };
  return (
    <div className="grid gap-4">
      {state.kind === 'looking' ? null : (
        <FileDrop isPrimary={state.kind === 'choosing'} onFile={(file) => void choose(file)} />
      )}
      {state.kind === 'choosing' ? <ProblemNotice problem={state.problem} /> : null}
      {state.kind === 'loaded' ? <UploadResult fileName={state.fileName} reply={state.reply} /> : null}
      {state.kind === 'looking' ? (
        <LookBefore
          key={`${state.proposal.head.file.name} ${state.proposal.head.file.lastModified}`}
          proposal={state.proposal}
          remembered={remembered}
          station={station}
          zone={zone}
          onLeave={() => setState({ kind: 'choosing', problem: null })}
          onLoaded={loaded}
        />
      ) : null}
    </div>
  );
}
