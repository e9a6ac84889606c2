import { type Encoding } from './mapping';

/** Largest file of readings that is taken, bytes. */
export const READINGS_FILE_BYTES = 200 * 1024 * 1024;
/** What is enough of a file to see how it is made, bytes. */
export const HEAD_BYTES = 65_536;

const startsWith = (bytes: Uint8Array, ...mark: number[]) => mark.every((byte, index) => bytes[index] === byte);

/**
 * Why a file cannot be a table of text, as a sentence with what to do; null when it may be one. Looks at the first
 * bytes: an Excel or OpenDocument workbook, an archive, a PDF, or bytes that no text has.
 */
export function whyNoText(bytes: Uint8Array): { reason: string; todo: string } | null {
  if (bytes.length === 0) {
    return { reason: 'The file is empty.', todo: 'Choose a file with one line for each reading.' };
  }
  const asCsv = 'Open it there, save the sheet as CSV, and load that.';
  if (startsWith(bytes, 0x50, 0x4b, 3, 4))
    return { reason: 'The file is a workbook or an archive, not text.', todo: asCsv };
  if (startsWith(bytes, 0xd0, 0xcf, 0x11, 0xe0))
    return { reason: 'The file is an old Excel workbook, not text.', todo: asCsv };
  if (startsWith(bytes, 0x1f, 0x8b))
    return { reason: 'The file is packed.', todo: 'Unpack it and load what is in it.' };
  if (startsWith(bytes, 0x25, 0x50, 0x44, 0x46)) {
    return { reason: 'The file is a PDF, not a table.', todo: 'Ask for the readings as CSV.' };
  }
  if (startsWith(bytes, 0xff, 0xfe)) return null;
  const isBinary = bytes.some((byte) => byte < 9 || (byte > 13 && byte < 32 && byte !== 27));
  return isBinary
    ? { reason: 'The file is not text: it holds bytes that no table has.', todo: 'Choose a CSV or text file.' }
    : null;
}

/**
 * The encoding of a file by its first bytes: a mark at the start, else UTF-8 when it is valid, else Windows-1252.
 * `isWhole` is false when the bytes were cut and may end inside a character.
 */
export function guessEncoding(bytes: Uint8Array, isWhole: boolean): Encoding {
  if (startsWith(bytes, 0xff, 0xfe)) return 'utf-16le';
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(bytes, { stream: !isWhole });
    return 'utf-8';
  } catch {
    return 'windows-1252';
  }
}

/** The whole lines at the start of a file; of a cut file the last, broken line is left out. */
export function decodeHead(bytes: Uint8Array, encoding: Encoding, isWhole: boolean): string {
  const text = new TextDecoder(encoding).decode(bytes, { stream: !isWhole });
  if (isWhole) return text;
  const end = Math.max(text.lastIndexOf('\n'), text.lastIndexOf('\r'));
  return end < 0 ? text : text.slice(0, end + 1);
}
