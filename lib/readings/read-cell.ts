import { type ColumnMapping, type Mapping } from './mapping';
import { isWordQuantity } from './quantities';
import { factsOfUnit } from './units';
import { readWord } from './words';

/** Why a cell cannot be read, as a sentence. */
export class BadCell {
  constructor(readonly reason: string) {}
}

/** SI number or word, null when missing, or why it cannot be read. Plain values: there is one for each cell of a file. */
export type CellReading = number | string | null | BadCell;
export type CellReader = (cell: string) => CellReading;

interface MissingCodes {
  texts: ReadonlySet<string>;
  numbers: ReadonlySet<number>;
}

function codesOf(codes: readonly string[]): MissingCodes {
  const texts = codes.map((code) => code.trim().toLowerCase()).filter(Boolean);
  return {
    texts: new Set(texts),
    numbers: new Set(texts.map((text) => Number(text.replace(',', '.'))).filter(Number.isFinite)),
  };
}

const shortened = (text: string) => (text.length > 40 ? `${text.slice(0, 40)}…` : text);

/** `0x1F` is a number to a computer and none to a station. */
const isPlain = (text: string) => text.length < 3 || text.charCodeAt(0) !== 48 || text.charCodeAt(1) < 65;

function numberReader(column: ColumnMapping, decimalMark: '.' | ',', codes: MissingCodes): CellReader {
  const toSi = factsOfUnit(column.unit)?.toSi;
  const { intervalMin } = column;
  const isComma = decimalMark === ',';
  const hasCodes = codes.numbers.size > 0;
  const read: CellReader = (cell) => {
    const text = cell.trim();
    if (text === '') return null;
    const value = Number(isComma ? text.replace('.', 'x').replace(',', '.') : text);
    if (Number.isFinite(value) && isPlain(text)) {
      if (hasCodes && codes.numbers.has(value)) return null;
      return toSi ? toSi(value, intervalMin) : value;
    }
    if (codes.texts.has(text.toLowerCase())) return null;
    if (text.startsWith('\u2212')) return read(`-${text.slice(1)}`);
    return new BadCell(`“${shortened(text)}” is not a number${hintOf(text, isComma)}.`);
  };
  return read;
}

function hintOf(text: string, isComma: boolean): string {
  if (/^[-+]?[\d.]+$/.test(text) && isComma) return '; the decimal mark of this file is the comma';
  if (/^[-+]?[\d,]+$/.test(text) && !isComma) return '; the decimal mark of this file is the point';
  return '';
}

/** Makes the reader of one column: trims, knows what stands for missing, converts to SI. */
export function createCellReader(column: ColumnMapping, mapping: Mapping): CellReader {
  const codes = codesOf([...mapping.missing, ...column.missing]);
  const { quantity } = column;
  if (!isWordQuantity(quantity)) return numberReader(column, mapping.decimalMark, codes);
  return (cell) => {
    const text = cell.trim();
    if (text === '') return null;
    const word = readWord(text, quantity);
    if (word === 'missing') return null;
    if (word !== null) return word;
    if (codes.texts.has(text.toLowerCase())) return null;
    return new BadCell(`“${shortened(text)}” is not a word or code that is known here.`);
  };
}
