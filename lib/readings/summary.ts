import { formatNumber } from '@/lib/units/format';

export interface UploadCounts {
  rowsRead: number;
  rowsAdded: number;
  rowsFilled: number;
  rowsUnchanged: number;
  rowsRejected: number;
  rowsFlagged: number;
  rowsEmpty: number;
}

const counted = (count: number, one: string, many = `${one}s`) =>
  `${formatNumber(count, 0)} ${count === 1 ? one : many}`;

/** What an upload did, in sentences, the most telling first. `alreadyRead`: when the same file was read before, in words. */
export function summariseUpload(counts: UploadCounts, alreadyRead: string | null): string {
  const { rowsRead, rowsAdded, rowsFilled, rowsUnchanged, rowsRejected, rowsFlagged, rowsEmpty } = counts;
  if (alreadyRead !== null) {
    return `This file was already read on ${alreadyRead}, in the same way: nothing was changed.`;
  }
  const parts = [
    rowsAdded > 0 ? `${counted(rowsAdded, 'reading')} added` : '',
    rowsFilled > 0 ? `${counted(rowsFilled, 'reading')} filled where something was missing` : '',
    rowsUnchanged > 0 ? `${formatNumber(rowsUnchanged, 0)} already there` : '',
  ].filter(Boolean);
  const did = parts.length > 0 ? parts.join(', ') : 'no reading was added';
  const sentences = [`${counted(rowsRead, 'row')} read: ${did}.`];
  if (rowsRejected > 0) sentences.push(`${counted(rowsRejected, 'row')} rejected and kept with the reason.`);
  if (rowsFlagged > 0) sentences.push(`${counted(rowsFlagged, 'row')} with a value to look at: kept, and flagged.`);
  if (rowsEmpty > 0) sentences.push(`${counted(rowsEmpty, 'row')} in which everything was missing.`);
  return sentences.join(' ');
}
