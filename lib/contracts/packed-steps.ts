/** Stands for "not known" in a packed row. */
export const UNKNOWN_STEP = -32_768;
/** Largest and smallest whole number that a packed row holds. */
const HIGHEST = 32_767;
const LOWEST = -32_767;

/** A physical value as the whole number that is sent; NaN as `UNKNOWN_STEP`, what is beyond the ends as the ends. */
export function toStep(value: number, perUnit: number): number {
  if (Number.isNaN(value)) return UNKNOWN_STEP;
  return Math.min(HIGHEST, Math.max(LOWEST, Math.round(value * perUnit)));
}

/** The value again; null where it was not known. */
export function fromStep(step: number, perUnit: number): number | null {
  return step === UNKNOWN_STEP ? null : step / perUnit;
}

/**
 * Rows of whole numbers as text: each as its difference from the one before in its row, low bytes first and then high
 * bytes, base64. Neighbouring steps are alike, so that gzip then finds little left to send.
 */
export function packSteps(steps: Int16Array, rowLength: number): string {
  const bytes = new Uint8Array(steps.length * 2);
  for (let index = 0; index < steps.length; index += 1) {
    const before = index % rowLength === 0 ? 0 : (steps[index - 1] ?? 0);
    const difference = (((steps[index] ?? 0) - before) << 16) >> 16;
    const folded = ((difference << 1) ^ (difference >> 15)) & 0xffff;
    bytes[index] = folded & 0xff;
    bytes[steps.length + index] = folded >> 8;
  }
  let text = '';
  for (let from = 0; from < bytes.length; from += 8192) {
    text += String.fromCharCode(...bytes.subarray(from, from + 8192));
  }
  return btoa(text);
}

/** The inverse of `packSteps`. A text of an odd number of bytes, or that does not fill its rows, throws RangeError. */
export function unpackSteps(packed: string, rowLength: number): Int16Array {
  const text = atob(packed);
  const count = text.length / 2;
  if (!Number.isInteger(count) || (rowLength > 0 && count % rowLength !== 0)) {
    throw new RangeError(`${text.length} bytes are no whole rows of ${rowLength}`);
  }
  const steps = new Int16Array(count);
  for (let index = 0; index < count; index += 1) {
    const folded = text.charCodeAt(index) | (text.charCodeAt(count + index) << 8);
    const difference = (folded >>> 1) ^ -(folded & 1);
    steps[index] = (index % rowLength === 0 ? 0 : (steps[index - 1] ?? 0)) + difference;
  }
  return steps;
}
