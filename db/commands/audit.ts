import { database } from '../connection';
import { type Tx } from '../transaction';

export interface AuditEntry {
  personId: number | null;
  action: string;
  subjectKind: string;
  subjectId: string | number;
  detail?: Record<string, unknown>;
  /** when it was done, where that is not now */
  recordedAt?: Date;
}

/** The audit row of a command, in the command's own transaction: both happen or neither. */
export async function recordAudit(tx: Tx, entry: AuditEntry): Promise<void> {
  await database().models.AuditRecord.create(
    { ...entry, subjectId: String(entry.subjectId), detail: entry.detail ?? {} },
    { transaction: tx },
  );
}
