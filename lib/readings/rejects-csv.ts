import Papa from 'papaparse';

interface Reject {
  line: number;
  columnName: string;
  reason: string;
  raw: string;
}

const newline = '\r\n';

export const rejectsHead = `line,column,reason,row${newline}`;

/**
 * Rejected rows as RFC 4180 text without heads, a line each: line of the file, column, reason, the row as it came. Text
 * that a spreadsheet would run as a formula gets an apostrophe.
 */
export function rejectsCsv(rejects: readonly Reject[]): string {
  const rows = rejects.map(({ line, columnName, reason, raw }) => [String(line), columnName, reason, raw]);
  return Papa.unparse(rows, { escapeFormulae: true, newline }) + newline;
}
