import { once } from 'node:events';
import type pg from 'pg';
import { from, type CopyFromStream } from 'pg-copy-streams';
import { type Tx } from './transaction';

export interface CopySink {
  /** Resolves when the server is ready for more: nothing piles up in memory. */
  write: (chunk: Uint8Array) => Promise<void>;
  /** All is sent; resolves when the rows are in. */
  finish: () => Promise<void>;
  /** Takes the copy back; the transaction can only be rolled back from here. */
  abort: () => Promise<void>;
}

/** `COPY … FROM STDIN` on the connection of a transaction, so that it is part of it. */
export function openCopy(tx: Tx, statement: string): CopySink {
  // Sequelize keeps the connection of a transaction there, without saying so in its types.
  const { connection } = tx as Tx & { connection?: pg.Client };
  if (!connection) throw new Error('The transaction has no connection.');
  const stream: CopyFromStream = connection.query(from(statement));
  let failure: Error | null = null;
  stream.on('error', (error) => {
    failure = error;
  });
  const closed = new Promise<void>((resolve) => stream.once('close', resolve));
  const check = () => {
    if (failure) throw failure;
  };
  return {
    write: async (chunk) => {
      check();
      if (!stream.write(chunk)) await Promise.race([once(stream, 'drain'), closed]);
      check();
    },
    finish: async () => {
      stream.end();
      await closed;
      check();
    },
    abort: async () => {
      if (stream.closed) return;
      stream.destroy(new Error('taken back'));
      await closed;
    },
  };
}
