import { crystals } from '@/lib/brine/equilibrium-constants';
import { type Solid } from '@/lib/brine/liquidus';

/** Counts of atoms set low, as chemists write them, and the count of waters on the line: NaCl·2H₂O. */
export function writeFormula(formula: string): string {
  return formula.replace(
    /([A-Za-z])(\d+)/g,
    (_, letter: string, digits: string) =>
      letter + [...digits].map((digit) => String.fromCharCode(0x2080 + Number(digit))).join(''),
  );
}

/** The solid in words. */
export function solidName(solid: Solid): string {
  return solid === 'ice' ? 'ice' : (crystals.find(({ formula }) => formula === solid)?.name ?? solid);
}
