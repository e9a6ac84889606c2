'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { KeysTable } from '@/components/setup/stations/keys-table';
import { type ListedKey } from '@/components/setup/stations/listed-station';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { ProblemNotice } from '@/components/ui/notice';
import { Section } from '@/components/ui/section';
import { useSubmission } from '@/components/ui/use-submission';
import { issueKeyAction, revokeKeyAction } from '../actions';

export type StationKeysProps = Readonly<{ stationId: number; keys: readonly ListedKey[]; zone: string }>;

export function StationKeys({ stationId, keys, zone }: StationKeysProps) {
  const router = useRouter();
  const announce = useAnnounce();
  const [issued, setIssued] = useState<string | null>(null);
  const [revoking, setRevoking] = useState<ListedKey | null>(null);
  const issue = useSubmission(issueKeyAction, ({ key }) => {
    setIssued(key);
    router.refresh();
  });
  const revoke = useSubmission(revokeKeyAction, () => {
    setRevoking(null);
    announce('The key is revoked.');
    router.refresh();
  });
  return (
    <Section
      title="Station keys"
      lead="With a key, a script sends this station’s files by itself."
      actions={
        <Button size="small" isBusy={issue.isSending} busyLabel="Issuing" onClick={() => issue.send({ stationId })}>
          Issue a key
        </Button>
      }
    >
      <ProblemNotice problem={issue.problem} className="mb-3" />
      {keys.length > 0 ? (
        <KeysTable keys={keys} zone={zone} onRevoke={setRevoking} />
      ) : (
        <p className="text-soft">No key yet. A key opens nothing but the loading of this station’s readings.</p>
      )}
      <Dialog
        isOpen={issued !== null}
        onOpenChange={() => setIssued(null)}
        title="The new key"
        description="It is shown this once. Copy it into the station’s script now; only its last four letters are kept."
        className="max-w-2xl"
      >
        {issued ? <NewKey value={issued} /> : null}
      </Dialog>
      <Dialog
        isOpen={revoking !== null}
        onOpenChange={() => setRevoking(null)}
        title={`Revoke the key that ends in ${revoking?.hint ?? ''}`}
        description="The script that uses it can send nothing from then on. What it has sent stays."
      >
        <ProblemNotice problem={revoke.problem} className="mb-3" />
        <Button
          variant="danger"
          isBusy={revoke.isSending}
          busyLabel="Revoking"
          onClick={() => revoke.send({ keyId: revoking?.id ?? 0 })}
        >
          Revoke it
        </Button>
      </Dialog>
    </Section>
  );
}

function NewKey({ value }: Readonly<{ value: string }>) {
  const announce = useAnnounce();
  const copy = () => {
    navigator.clipboard.writeText(value).then(
      () => announce('Copied.'),
      () => announce('The browser did not allow copying: select the key and copy it.'),
    );
  };
  const command = `curl --data-binary @readings.csv -H 'content-type: text/csv' \\\n  -H 'authorization: Bearer ${value}' \\\n  '${window.location.origin}/api/import/readings?fileName=readings.csv'`;
  return (
    <div className="grid gap-4">
      <p className="rounded-md border bg-raised px-3 py-2 font-mono wrap-anywhere select-all">{value}</p>
      <Button className="justify-self-start" variant="primary" onClick={copy}>
        Copy the key
      </Button>
      <div className="grid gap-1">
        <p className="text-sm text-soft">A script sends a file so:</p>
        <pre className="overflow-x-auto rounded-md border bg-raised px-3 py-2 font-mono text-sm" tabIndex={0}>
          {command}
        </pre>
      </div>
    </div>
  );
}
