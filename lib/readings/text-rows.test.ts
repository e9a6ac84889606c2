import { describe, expect, it } from 'vitest';
import { createRowSplitter, LONGEST_ROW } from './text-rows';

function split(pieces: readonly string[], over: Partial<Parameters<typeof createRowSplitter>[0]> = {}) {
  const rows: [number, ...string[]][] = [];
  const splitter = createRowSplitter({ delimiter: ',', quote: '"', skipLines: 0, ...over }, (cells, line) =>
    rows.push([line, ...cells.map((cell) => cell.trim())]),
  );
  const results = pieces.map((piece) => splitter.push(piece));
  return { rows, fault: [...results, splitter.end()].find(({ ok }) => !ok) };
}

describe('rows of a text', () => {
  it('come out the same wherever the text is cut', () => {
    const text = 'a,b\r\n1,"x, ""y""\nz"\r\n\r\n2,w';
    const whole = split([text]).rows;
    expect(whole).toEqual([
      [1, 'a', 'b'],
      [2, '1', 'x, "y"\nz'],
      [5, '2', 'w'],
    ]);
    expect(split([...text]).rows).toEqual(whole);
    for (let at = 1; at < text.length; at += 1) expect(split([text.slice(0, at), text.slice(at)]).rows).toEqual(whole);
  });

  it('are parted by semicolons or tabs, and by lone carriage returns', () => {
    expect(split(['a;b\n1,5;2'], { delimiter: ';' }).rows).toEqual([
      [1, 'a', 'b'],
      [2, '1,5', '2'],
    ]);
    expect(split(['a\tb\r1\t2\r'], { delimiter: '\t' }).rows).toEqual([
      [1, 'a', 'b'],
      [2, '1', '2'],
    ]);
  });

  it('keep their line numbers after skipped and blank lines', () => {
    expect(split(['Station 4\n\na,b\n\n1,2\n'], { skipLines: 2 }).rows).toEqual([
      [3, 'a', 'b'],
      [5, '1', '2'],
    ]);
  });

  it('a quotation mark that is never closed is told with its line, at the end or when a row grows too long', () => {
    expect(split(['a,b\n1,"2\n3,4\n']).fault).toMatchObject({ line: 2 });
    const { fault } = split(['a,b\n1,2\n', '1,"', ...Array.from({ length: 20 }, () => 'x'.repeat(LONGEST_ROW / 16))]);
    expect(fault).toMatchObject({ ok: false, line: 3 });
  });
});
