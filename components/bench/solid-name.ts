import { crystals } from '@/lib/brine/equilibrium-constants';
import { type Solid } from '@/lib/brine/liquidus';
import { THIN_SPACE } from '@/lib/units/format';

/** U+22C5: the middle dot of the word face is as narrow as a stroke and runs into the digit behind it. */
const DOT = '\u22C5';

const lowered = (digits: string) => [...digits].map((digit) => String.fromCharCode(0x2080 + Number(digit))).join('');

/** Counts of atoms set low, as chemists write them, and the count of waters on the line: NaCl · 2H₂O. */
export function writeFormula(formula: string): string {
  return formula
    .replace(/([A-Za-z])(\d+)/g, (_, letter: string, digits: string) => letter + lowered(digits))
    .replaceAll('·', `${THIN_SPACE}${DOT}${THIN_SPACE}`);
}

/** The solid in words. */
export function solidName(solid: Solid): string {
  return solid === 'ice' ? 'ice' : (crystals.find(({ formula }) => formula === solid)?.name ?? solid);
}
