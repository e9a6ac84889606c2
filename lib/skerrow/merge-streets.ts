import { degrees, type Draft } from './drafts';

const joins = (a: Draft, b: Draft, degree: ReadonlyMap<string, number>) =>
  a.isStreet && b.isStreet && a.road === b.road && a.to === b.from && degree.get(a.to) === 2;

const reversed = (draft: Draft): Draft => ({
  ...draft,
  from: draft.to,
  to: draft.from,
  line: [...draft.line].reverse(),
});

/** Joins stretches of one street where nothing else meets them: segments end at junctions. */
export function mergeStreets(drafts: readonly Draft[]): Draft[] {
  const degree = degrees(drafts);
  const merged: Draft[] = [];
  for (const draft of drafts) {
    const last = merged.at(-1);
    const next = last && !draft.isOneWay && draft.to === last.to && draft.from !== last.from ? reversed(draft) : draft;
    if (last && joins(last, next, degree)) {
      merged[merged.length - 1] = { ...last, to: next.to, line: [...last.line, ...next.line.slice(1)] };
    } else if (last && draft.isOneWay && joins(draft, last, degree)) {
      merged[merged.length - 1] = { ...last, from: draft.from, line: [...draft.line, ...last.line.slice(1)] };
    } else {
      merged.push(draft);
    }
  }
  return merged;
}

interface Ends {
  low: string;
  high: string;
}

function compass(pieces: readonly Draft[]): { ends: Ends; isBackward: boolean } {
  const first = pieces[0]?.line[0];
  const last = pieces.at(-1)?.line.at(-1);
  const east = (last?.xM ?? 0) - (first?.xM ?? 0);
  const north = (last?.yM ?? 0) - (first?.yM ?? 0);
  const ends = Math.abs(east) > Math.abs(north) ? { low: 'west', high: 'east' } : { low: 'south', high: 'north' };
  return { ends, isBackward: (Math.abs(east) > Math.abs(north) ? east : north) < 0 };
}

function crossStreets(piece: Draft, drafts: readonly Draft[]): string[] {
  return drafts
    .filter((other) => other.isStreet && other.road !== piece.road)
    .filter((other) => [other.from, other.to].some((key) => key === piece.from || key === piece.to))
    .map((other) => other.road);
}

function nameStreet(pieces: readonly Draft[], drafts: readonly Draft[]): void {
  const { ends, isBackward } = compass(pieces);
  const ordered = isBackward ? [...pieces].reverse() : pieces;
  const isRing = pieces.length > 1 && pieces[0]?.from === pieces.at(-1)?.to;
  const taken = new Set<string>();
  ordered.forEach((piece, index) => {
    const isMiddle = index === Math.floor(ordered.length / 2);
    if (ordered.length === 1 || (piece.serviceClass === 'B' && isMiddle && ordered.length > 2)) return;
    const cross = crossStreets(piece, drafts).find((street) => !taken.has(street));
    let qualifier = cross ? `by ${cross}` : `part ${index + 1}`;
    if (isRing) {
      if (cross) taken.add(cross);
    } else if (index === 0) qualifier = `${ends.low} end`;
    else if (index === ordered.length - 1) qualifier = `${ends.high} end`;
    else if (cross) taken.add(cross);
    piece.name = `${piece.road}, ${qualifier}`;
  });
}

/** Sets apart the pieces of one street: its two ends by compass, the rest by a street they meet. */
export function nameStreets(drafts: readonly Draft[]): void {
  const byStreet = new Map<string, Draft[]>();
  for (const draft of drafts.filter(({ isStreet }) => isStreet)) {
    byStreet.set(draft.road, [...(byStreet.get(draft.road) ?? []), draft]);
  }
  for (const pieces of byStreet.values()) nameStreet(pieces, drafts);
}
