export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

export interface LabelToPlace {
  readonly key: string;
  readonly widthPx: number;
  readonly heightPx: number;
  /** Upper left corners to try, best first. */
  readonly candidates: readonly { readonly x: number; readonly y: number }[];
}

export interface PlacedLabel extends Box {
  readonly key: string;
}

function overlap(a: Box, b: Box): number {
  const width = Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x);
  const height = Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y);
  return width > 0 && height > 0 ? width * height : 0;
}

function isInside(box: Box, frame: Box): boolean {
  return (
    box.x >= frame.x &&
    box.y >= frame.y &&
    box.x + box.width <= frame.x + frame.width &&
    box.y + box.height <= frame.y + frame.height
  );
}

/**
 * Gives each label the first of its places that is inside the frame and covers no label placed before and no obstacle.
 * A label for which no place is free is left out: never one over another. Earlier labels go first.
 */
export function placeLabels(
  labels: readonly LabelToPlace[],
  frame: Box,
  obstacles: readonly Box[] = [],
): PlacedLabel[] {
  const placed: PlacedLabel[] = [];
  for (const label of labels) {
    const boxes = label.candidates.map((corner) => ({ ...corner, width: label.widthPx, height: label.heightPx }));
    const free = boxes.find(
      (box) =>
        isInside(box, frame) &&
        placed.every((other) => overlap(box, other) === 0) &&
        obstacles.every((other) => overlap(box, other) === 0),
    );
    if (free) placed.push({ key: label.key, ...free });
  }
  return placed;
}
