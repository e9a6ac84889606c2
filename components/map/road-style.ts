/**
 * What a road on the map can look like. A style is a code in a `Uint8Array`, one a segment, so that restyling
 * thousands of segments is a copy of bytes. The order is the order of drawing: what matters most lies on top.
 */
export const roadStyles = [
  'unknown',
  'safe',
  'hold',
  'closing',
  'urgent',
  'frozen',
  'plain',
  'added',
  'removed',
] as const;
export type RoadStyle = (typeof roadStyles)[number];

interface Look {
  /** A colour token of `app/globals.css`. */
  readonly token: string;
  readonly isDashed: boolean;
  /** Roads in trouble glow; calm ones recede. */
  readonly glow: number;
  readonly widthFactor: number;
}

const look = (token: string, rest: Partial<Look> = {}): Look => ({
  token,
  isDashed: false,
  glow: 0,
  widthFactor: 1,
  ...rest,
});

export const roadLooks: Readonly<Record<RoadStyle, Look>> = {
  unknown: look('safe', { widthFactor: 0.55 }),
  safe: look('safe', { widthFactor: 0.8 }),
  hold: look('hold', { widthFactor: 0.9 }),
  closing: look('closing'),
  urgent: look('urgent', { glow: 0.16, widthFactor: 1.1 }),
  frozen: look('frozen', { glow: 0.26, isDashed: true, widthFactor: 1.2 }),
  plain: look('soft', { widthFactor: 0.8 }),
  added: look('lamp'),
  removed: look('frozen', { isDashed: true }),
};

/** The byte that stands for a style. */
export function styleCode(style: RoadStyle): number {
  return roadStyles.indexOf(style);
}

/** Line widths in px at a middling zoom, by service class. */
export const classWidthPx: Readonly<Record<string, number>> = { A: 5, B: 3.8, C: 2.9, D: 2.2 };
export const otherClassWidthPx = 2.4;

/** Lines grow gently on zooming in, so that a county is not a knot and a street not a thread. */
export function zoomFactor(zoom: number): number {
  return Math.min(2.4, Math.max(0.6, 1 + (zoom - 12) * 0.18));
}
