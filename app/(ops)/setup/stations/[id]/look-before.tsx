'use client';

import { useState } from 'react';
import { type ListedStation } from '@/components/setup/stations/listed-station';
import { MappingEditor } from '@/components/setup/stations/mapping-editor';
import { Seen } from '@/components/setup/stations/seen';
import { Button } from '@/components/ui/button';
import { Notice, ProblemNotice } from '@/components/ui/notice';
import { type ImportReadingsReply } from '@/lib/contracts/readings';
import { faultsOfMapping, type Mapping } from '@/lib/readings/mapping';
import { previewFile, type Preview } from '@/lib/readings/preview';
import { formatDateTime } from '@/lib/time/format';
import { type Proposal, type Remembered } from './load-readings';
import { guessHead, tableOf } from './read-head';
import { Loading } from './loading-progress';
import { useLoad } from './use-load';

export type LookBeforeProps = Readonly<{
  proposal: Proposal;
  remembered: Remembered | null;
  station: ListedStation;
  zone: string;
  onLeave: () => void;
  onLoaded: (fileName: string, reply: ImportReadingsReply) => void;
}>;

const ROWS_SHOWN = 10;
const sizeOf = (bytes: number) => (bytes < 1e6 ? `${Math.ceil(bytes / 1000)} kB` : `${(bytes / 1e6).toFixed(1)} MB`);

function whyNot(preview: Preview, faults: Readonly<Record<string, string>>): string | null {
  const [fault] = Object.values(faults);
  if (fault) return fault;
  if (preview.fault) return preview.fault;
  if (preview.lacking.length > 0)
    return `The file has no column ${preview.lacking.map((name) => `“${name}”`).join(', ')}.`;
  if (preview.goodCount > 0) return null;
  return preview.badCount > 0
    ? 'No row at its beginning can be read: say above how it is to be read.'
    : 'There is no row to read.';
}

/** A file before it is loaded: what is proposed, what a person should look at, and its first rows as understood. */
export function LookBefore({ proposal, remembered, station, zone, onLeave, onLoaded }: LookBeforeProps) {
  const { head } = proposal;
  const [mapping, setMapping] = useState<Mapping>(proposal.mapping);
  const [doubts, setDoubts] = useState(proposal.doubts);
  const [isRemembered, setIsRemembered] = useState(proposal.isRemembered);
  const [nowMs] = useState(Date.now);
  const load = useLoad({ file: head.file, station, mapping, onLoaded });
  const faults = faultsOfMapping(mapping);
  const isSound = Object.keys(faults).length === 0;
  const { columnNames, samples } = tableOf(head, mapping);
  const preview = previewFile(isSound ? mapping : { ...mapping, columns: [] }, {
    ...head,
    nowMs,
    rowCount: ROWS_SHOWN,
  });
  const guessAnew = () => {
    const guess = guessHead(head, station.zone);
    if (!guess.ok) return;
    setMapping(guess.mapping);
    setDoubts(guess.doubts);
    setIsRemembered(false);
  };
  return (
    <div className="grid gap-5">
      <div className="flex flex-wrap items-center justify-between gap-3 border-b pb-3">
        <p className="min-w-0">
          <span className="font-bold wrap-anywhere">{head.file.name}</span>{' '}
          <span className="text-soft">{sizeOf(head.file.size)}</span>
        </p>
        {load.progress ? null : (
          <Button size="small" onClick={onLeave}>
            Choose another file
          </Button>
        )}
      </div>
      {isRemembered && remembered ? (
        <Notice
          title="It is read as this station’s files were before."
          todo={`As ${remembered.updatedByName} said on ${formatDateTime(new Date(remembered.updatedAt), zone)}. Change below what is different now.`}
          action={
            <Button size="small" onClick={guessAnew}>
              Guess anew from the file
            </Button>
          }
        />
      ) : null}
      {doubts.length > 0 ? (
        <Notice tone="caution" title="Guessed from the file: look at these before you load it.">
          <ul className="grid list-disc gap-1 pl-5">
            {doubts.map(({ part, sentence }) => (
              <li key={`${part} ${sentence}`}>{sentence}</li>
            ))}
          </ul>
        </Notice>
      ) : null}
      <MappingEditor
        mapping={mapping}
        columnNames={columnNames}
        samplesOf={(index) => samples[index] ?? []}
        stationZone={station.zone}
        faults={faults}
        onChange={setMapping}
      />
      {isSound ? <Seen preview={preview} mapping={mapping} zone={station.zone} isWhole={head.isWhole} /> : null}
      <ProblemNotice problem={load.problem} />
      {load.progress ? (
        <Loading progress={load.progress} fileName={head.file.name} onStop={load.stop} />
      ) : (
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
          <Button variant="primary" disabledReason={whyNot(preview, faults)} onClick={load.start}>
            Load this file
          </Button>
          <p className="text-soft">{whyNot(preview, faults) ?? 'How it is read is remembered for this station.'}</p>
        </div>
      )}
    </div>
  );
}
