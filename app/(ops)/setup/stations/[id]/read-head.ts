import { decodeHead, HEAD_BYTES } from '@/lib/readings/bytes';
import { guessMapping, type Guess } from '@/lib/readings/guess';
import { columnNamesOf, type Mapping } from '@/lib/readings/mapping';
import { createRowSplitter } from '@/lib/readings/text-rows';

/** The first bytes of a chosen file, enough to see how it is made. */
export interface FileHead {
  file: File;
  bytes: Uint8Array;
  isWhole: boolean;
}

export async function readHead(file: File): Promise<FileHead> {
  const bytes = new Uint8Array(await file.slice(0, HEAD_BYTES).arrayBuffer());
  return { file, bytes, isWhole: file.size <= HEAD_BYTES };
}

export function guessHead({ bytes, isWhole }: FileHead, zone: string): Guess {
  return guessMapping({ bytes, isWhole, clock: { kind: 'zone', zone } });
}

const SAMPLES = 4;

export interface HeadTable {
  columnNames: string[];
  /** the first cells of each column */
  samples: string[][];
}

/** The columns of a file as a mapping parts it. */
export function tableOf({ bytes, isWhole }: FileHead, mapping: Mapping): HeadTable {
  const rows: (readonly string[])[] = [];
  const splitter = createRowSplitter(mapping, (cells) => {
    if (rows.length <= SAMPLES) rows.push(cells);
  });
  splitter.push(decodeHead(bytes, mapping.encoding, isWhole));
  splitter.end();
  const [first = []] = rows;
  const body = mapping.hasHeader ? rows.slice(1) : rows.slice(0, SAMPLES);
  const columnNames = columnNamesOf(first, mapping.hasHeader);
  return { columnNames, samples: columnNames.map((_, index) => body.map((cells) => (cells[index] ?? '').trim())) };
}
