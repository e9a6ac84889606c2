import { scaleLinear } from '@visx/scale';
import { toDisplay, type UnitSystem } from '@/lib/units/quantity';
import { type Curve } from './curves';

export interface ChartFrame {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  /** No room for names in full. */
  readonly isNarrow: boolean;
}

/** Room for the figures of the axes. */
export function frameOf(width: number): ChartFrame {
  const height = Math.max(320, Math.min(470, Math.round(width * 0.78)));
  return { width, height, left: 40, right: width - 12, top: 26, bottom: height - 44, isNarrow: width < 460 };
}

const COLDEST_C = -54;

export interface ChartContent {
  readonly curves: readonly Curve[];
  readonly chosen: Curve;
  readonly brine: { readonly massFraction: number; readonly freezingPointC: number } | null;
  readonly system: UnitSystem;
}

/** Scales from mass fraction and °C to pixels, rounded so that server and browser write the same path. */
export function scalesOf(frame: ChartFrame, content: ChartContent) {
  const furthest = Math.max(
    0.32,
    content.chosen.salts.at(-1)?.massFraction ?? 0,
    (content.brine?.massFraction ?? 0) + 0.01,
  );
  const warmestC = Math.max(0, (content.brine?.freezingPointC ?? 0) + 3);
  const shown = (tempC: number) => toDisplay(tempC, 'temperature', content.system);
  const strength = scaleLinear<number>({ domain: [0, furthest], range: [frame.left, frame.right] });
  const temperature = scaleLinear<number>({
    domain: [shown(warmestC), shown(COLDEST_C)],
    range: [frame.top, frame.bottom],
  });
  const round = (pixels: number) => Math.round(pixels * 10) / 10;
  return {
    x: (massFraction: number) => round(strength(massFraction)),
    y: (tempC: number) => round(temperature(shown(tempC))),
    strengthTicks: strength.ticks(7),
    /** In the units shown. */
    temperatureTicks: temperature.ticks(6).map((value) => ({ value, y: round(temperature(value)) })),
  };
}

export type ChartScales = ReturnType<typeof scalesOf>;
