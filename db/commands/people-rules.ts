import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { selectRows, type Tx } from '../transaction';

/** What every command of Set-up is given. */
export interface By<Input> {
  input: Input;
  by: number;
  now: Date;
}

/**
 * Locks every administrator in use, so that two of them cannot take the role from one another at the same moment, and
 * refuses when nobody would be left who may set things up.
 */
export async function keepAnAdministrator(tx: Tx, withoutId: number): Promise<void> {
  const administrators = await selectRows<{ id: number }>(
    `select id from people where role = 'administrator' and not is_disabled order by id for update`,
    {},
    tx,
  );
  const isAmong = administrators.some((person) => person.id === withoutId);
  if (isAmong && administrators.length === 1) {
    throw new Problem('not-possible-now', {
      reason: 'This is the only administrator left.',
      todo: 'Make someone else an administrator first.',
    });
  }
}

export async function findForChange(tx: Tx, id: number) {
  const person = await database().models.Person.findByPk(id, { transaction: tx, lock: true });
  if (!person) throw new Problem('not-found', { what: 'person' });
  return person;
}
