declare module 'pg-copy-streams' {
  import { type Submittable } from 'pg';
  import { type Writable } from 'node:stream';

  export type CopyFromStream = Writable & Submittable & { rowCount: number };
  /** The stream of a `COPY … FROM STDIN`, to be given to `client.query`. */
  export function from(text: string): CopyFromStream;
}
