import { newId } from '@/lib/client/new-id';
import { type Entry, type KeptMessage } from '@/lib/client/outbox/store';
import { type PendingRoad } from '@/components/cab/progress';

type Kind = KeptMessage['kind'];
type PayloadOf<K extends Kind> = Extract<KeptMessage, { kind: K }>['payload'];

/** A message as the outbox keeps it: the payload's own id is the message's, so both are recorded once. */
export function messageOf<K extends Kind>(kind: K, id: string, payload: PayloadOf<K>): KeptMessage {
  return { version: 1, id, madeAt: new Date().toISOString(), kind, payload } as KeptMessage;
}

interface RoadDone {
  runId: string;
  segmentId: number;
  outcome: 'spread' | 'ploughed' | 'skipped';
  materialId?: number | null;
  rateGPerM2?: number | null;
  isPloughed?: boolean;
  rateSource?: 'as-shown' | 'typed';
  note?: string;
  amendsId?: string | null;
}

export function roadDone(done: RoadDone): KeptMessage {
  const id = newId();
  return messageOf('spread-entry', id, { ...done, id, spreadAt: new Date().toISOString() });
}

/** The roads of a run as this tablet logged them, oldest first. Refused ones are not counted as done. */
export function loggedHere(
  kept: { entries: readonly Entry[]; sent: readonly KeptMessage[] },
  runId: string,
  nameOf: (materialId: number) => string,
): PendingRoad[] {
  const waiting = kept.entries.flatMap(({ message, refusal }) => (refusal === null ? [message] : []));
  return [...kept.sent, ...waiting].flatMap((message) => {
    if (message.kind !== 'spread-entry' || message.payload.runId !== runId) return [];
    const { id, segmentId, outcome, rateGPerM2, materialId, spreadAt } = message.payload;
    return [
      {
        entryId: id,
        segmentId,
        outcome,
        rateGPerM2: rateGPerM2 ?? null,
        materialName: materialId ? nameOf(materialId) : null,
        spreadAt,
      },
    ];
  });
}
