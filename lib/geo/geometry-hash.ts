import { type Position, positionKey } from './position';

/**
 * A short name for a line's geometry, the same whichever way it is drawn: two 32-bit FNV-1a hashes of its rounded
 * places, 16 hexadecimal digits. Two different lines of 5,000 share a name with a chance of about 10⁻¹².
 */
export function geometryHash(line: readonly Position[]): string {
  const keys = line.map(positionKey);
  const forward = keys.join(';');
  const backward = keys.reverse().join(';');
  const text = forward < backward ? forward : backward;
  return fnv1a(text, 0x811c9dc5) + fnv1a(text, 0x01234567);
}

function fnv1a(text: string, seed: number): string {
  let hash = seed;
  for (let at = 0; at < text.length; at += 1) {
    hash = Math.imul(hash ^ text.charCodeAt(at), 0x01000193) >>> 0;
  }
  return hash.toString(16).padStart(8, '0');
}
