'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { SaveForm } from '@/components/setup/roads/save-form';
import { counted } from '@/components/setup/roads/words';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { ProblemNotice } from '@/components/ui/notice';
import { useSubmission } from '@/components/ui/use-submission';
import { type NetworkImportView } from '@/lib/contracts/network';
import { applyNetworkImportAction, discardNetworkImportAction, undoNetworkImportAction } from '../actions';

export type ImportActionsProps = Readonly<{ view: NetworkImportView; onChanged: () => void }>;

/** Save, discard, undo: each asks once, and says what it will do. */
export function ImportActions({ view, onChanged }: ImportActionsProps) {
  return view.state === 'applied' ? (
    <Undo view={view} onChanged={onChanged} />
  ) : (
    <>
      <Discard view={view} />
      <Save view={view} onChanged={onChanged} />
    </>
  );
}

function Save({ view, onChanged }: ImportActionsProps) {
  const [isOpen, setIsOpen] = useState(false);
  const announce = useAnnounce();
  const save = useSubmission(applyNetworkImportAction, ({ added, updated, retired, wasApplied }) => {
    setIsOpen(false);
    announce(
      wasApplied
        ? 'It had been saved already; nothing was changed.'
        : `Saved: ${counted(added, 'new road')}, ${updated} brought up to date, ${retired} taken out of use.`,
    );
    onChanged();
  });
  return (
    <>
      <Button
        variant="primary"
        disabledReason={view.report.segments === 0 ? 'No road is left: every class of the file is left out.' : null}
        onClick={() => setIsOpen(true)}
      >
        {view.state === 'undone' ? 'Save again' : 'Save'}
      </Button>
      <Dialog
        isOpen={isOpen}
        onOpenChange={setIsOpen}
        title="Save these roads"
        description="All of it or nothing. It can be undone afterwards."
      >
        <SaveForm view={view} submission={save} />
      </Dialog>
    </>
  );
}

function Discard({ view }: Readonly<{ view: NetworkImportView }>) {
  const [isOpen, setIsOpen] = useState(false);
  const router = useRouter();
  const announce = useAnnounce();
  const discard = useSubmission(discardNetworkImportAction, () => {
    announce(`${view.fileName} was discarded.`);
    router.push('/setup/roads');
  });
  return (
    <>
      <Button onClick={() => setIsOpen(true)}>Discard</Button>
      <Dialog
        isOpen={isOpen}
        onOpenChange={setIsOpen}
        title="Discard this preview"
        description="The network stays as it is. To see this file again, choose it again."
      >
        <ProblemNotice problem={discard.problem} className="mb-3" />
        <div className="flex flex-wrap gap-2.5">
          <Button
            variant="danger"
            isBusy={discard.isSending}
            busyLabel="Discarding"
            onClick={() => discard.send({ id: view.id })}
          >
            Discard
          </Button>
          <Button onClick={() => setIsOpen(false)}>Keep it</Button>
        </div>
      </Dialog>
    </>
  );
}

function Undo({ view, onChanged }: ImportActionsProps) {
  const [isOpen, setIsOpen] = useState(false);
  const announce = useAnnounce();
  const undo = useSubmission(undoNetworkImportAction, ({ removed, restored, kept }) => {
    setIsOpen(false);
    const parts = [
      counted(removed, 'road') + ' removed',
      restored > 0 ? `${restored} put back as they were` : '',
      kept > 0 ? `${kept} kept out of use because plans, routes or runs name them` : '',
    ];
    announce(`Undone: ${parts.filter(Boolean).join(', ')}.`);
    onChanged();
  });
  return (
    <>
      <Button onClick={() => setIsOpen(true)}>Undo</Button>
      <Dialog
        isOpen={isOpen}
        onOpenChange={setIsOpen}
        title="Undo this import"
        description="The network goes back to what it was before it was saved. What was changed by hand on these roads since is lost."
      >
        <p className="mb-4 text-soft">
          New roads are removed; those that a plan, a route or a run names by now are taken out of use instead.
        </p>
        <ProblemNotice problem={undo.problem} className="mb-3" />
        <div className="flex flex-wrap gap-2.5">
          <Button
            variant="danger"
            isBusy={undo.isSending}
            busyLabel="Undoing"
            onClick={() => undo.send({ id: view.id })}
          >
            Undo the import
          </Button>
          <Button onClick={() => setIsOpen(false)}>Leave it saved</Button>
        </div>
      </Dialog>
    </>
  );
}
