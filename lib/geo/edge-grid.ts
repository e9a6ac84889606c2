import { type Position } from './position';

/** An edge of a segment, for questions of nearness. */
export interface Edge {
  segment: number;
  from: Position;
  to: Position;
}

/**
 * Edges sorted into square cells, so that only neighbours need comparing. An edge stands in every cell that it may
 * pass; the cell is as wide as two mean edges.
 */
export class EdgeGrid {
  private readonly cells = new Map<string, Edge[]>();
  private readonly cellDeg: number;

  constructor(edges: readonly Edge[]) {
    const spans = edges.map(({ from, to }) => Math.max(Math.abs(to[0] - from[0]), Math.abs(to[1] - from[1])));
    const meanDeg = spans.reduce((sum, span) => sum + span, 0) / Math.max(edges.length, 1);
    this.cellDeg = Math.max(meanDeg * 2, 1e-5);
    edges.forEach((edge, at) => this.add(edge, spans[at] ?? 0));
  }

  /** Edges that may come within `marginDeg` of a place; every edge once. */
  near([lonDeg, latDeg]: Position, marginDeg: number): Set<Edge> {
    const found = new Set<Edge>();
    const [west, east] = [this.step(lonDeg - marginDeg), this.step(lonDeg + marginDeg)];
    const [south, north] = [this.step(latDeg - marginDeg), this.step(latDeg + marginDeg)];
    for (let column = west; column <= east; column += 1) {
      for (let row = south; row <= north; row += 1) {
        for (const edge of this.cells.get(`${column},${row}`) ?? []) found.add(edge);
      }
    }
    return found;
  }

  /** The edges of each cell in turn. */
  groups(): IterableIterator<Edge[]> {
    return this.cells.values();
  }

  private step(degrees: number): number {
    return Math.floor(degrees / this.cellDeg);
  }

  /** Walks the edge in steps no longer than a cell, and stands it in the cells around each step. */
  private add(edge: Edge, spanDeg: number): void {
    const steps = Math.ceil(spanDeg / this.cellDeg) || 1;
    const taken = new Set<string>();
    for (let at = 0; at < steps; at += 1) {
      const [from, to] = [placeOn(edge, at / steps), placeOn(edge, (at + 1) / steps)];
      for (
        let column = this.step(Math.min(from[0], to[0]));
        column <= this.step(Math.max(from[0], to[0]));
        column += 1
      ) {
        for (let row = this.step(Math.min(from[1], to[1])); row <= this.step(Math.max(from[1], to[1])); row += 1) {
          taken.add(`${column},${row}`);
        }
      }
    }
    for (const key of taken) {
      const cell = this.cells.get(key);
      if (cell) cell.push(edge);
      else this.cells.set(key, [edge]);
    }
  }
}

function placeOn({ from, to }: Edge, share: number): Position {
  return [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share];
}
