import { type ColumnMapping, type Mapping } from './mapping';
import { isWordQuantity } from './quantities';
import { factsOfUnit } from './units';
import { readWord } from './words';

/** A cell's value: SI number or word, `missing`, or why it cannot be read. */
export type CellReading =
  { kind: 'value'; value: number | string } | { kind: 'missing' } | { kind: 'bad'; reason: string };

export type CellReader = (cell: string) => CellReading;

const missing: CellReading = { kind: 'missing' };

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

/** `0x1F` and `1e400` are numbers to a computer and none to a station. */
const isPlain = (text: string) => !/[xXoObBI]/.test(text);

function numberReader(column: ColumnMapping, decimalMark: '.' | ',', codes: MissingCodes): CellReader {
  const facts = factsOfUnit(column.unit);
  const { intervalMin } = column;
  const isComma = decimalMark === ',';
  return (cell) => {
    const text = cell.trim();
    if (text === '') return missing;
    const value = Number(isComma ? text.replace('.', 'x').replace(',', '.') : text);
    if (Number.isFinite(value) && isPlain(text)) {
      if (codes.numbers.size > 0 && codes.numbers.has(value)) return missing;
      return { kind: 'value', value: facts ? facts.toSi(value, intervalMin) : value };
    }
    if (codes.texts.has(text.toLowerCase())) return missing;
    if (text.startsWith('\u2212')) return numberReader(column, decimalMark, codes)(`-${text.slice(1)}`);
    return { kind: 'bad', reason: `“${shortened(text)}” is not a number${hintOf(text, isComma)}.` };
  };
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
    if (text === '') return missing;
    const word = readWord(text, quantity);
    if (word === 'missing') return missing;
    if (word !== null) return { kind: 'value', value: word };
    return codes.texts.has(text.toLowerCase())
      ? missing
      : { kind: 'bad', reason: `“${shortened(text)}” is not a word or code that is known here.` };
  };
}
