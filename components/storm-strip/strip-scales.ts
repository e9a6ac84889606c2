import { scaleLinear } from '@visx/scale';
import { type StripContent } from './strip-content';

export interface StripFrame {
  readonly widthPx: number;
  readonly heightPx: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export function frameFor(widthPx: number, heightPx: number): StripFrame {
  return { widthPx, heightPx, left: widthPx < 560 ? 46 : 52, right: widthPx < 560 ? 10 : 20, top: 26, bottom: 22 };
}

export interface StripScales {
  readonly x: (at: number) => number;
  readonly atX: (px: number) => number;
  readonly tempY: (tempC: number) => number;
  readonly barY: (mmPerH: number) => number;
  readonly ticksC: readonly number[];
  readonly mostMmPerH: number;
}

/** The span of temperature shown: all of it with its band, always with 0 °C, and air above and below. */
function temperatureSpan({ measured, forecast }: StripContent): [number, number] {
  const lows = [...measured.map((point) => point.tempC), ...forecast.map((point) => point.tempC - (point.errorC ?? 0))];
  const highs = [
    ...measured.map((point) => point.tempC),
    ...forecast.map((point) => point.tempC + (point.errorC ?? 0)),
  ];
  const low = lows.reduce((least, value) => Math.min(least, value), -2);
  const high = highs.reduce((most, value) => Math.max(most, value), 0.5);
  return [low - (high - low) * 0.12, high + (high - low) * 0.06];
}

export function scalesFor(content: StripContent, frame: StripFrame): StripScales {
  const x = scaleLinear<number>({
    domain: [content.fromAt, content.untilAt],
    range: [frame.left, frame.widthPx - frame.right],
    clamp: true,
  });
  const tempY = scaleLinear<number>({
    domain: temperatureSpan(content),
    range: [frame.heightPx - frame.bottom, frame.top],
  });
  const rates = content.precipitation.map((bar) => rateOf(bar));
  const mostMmPerH = rates.reduce((most, rate) => Math.max(most, rate), 1);
  const barY = scaleLinear<number>({
    domain: [0, mostMmPerH],
    range: [frame.heightPx - frame.bottom, frame.top + (frame.heightPx - frame.top - frame.bottom) * 0.34],
  });
  return { x, atX: (px) => x.invert(px), tempY, barY, ticksC: ticksOf(tempY.domain()), mostMmPerH };
}

/** mm an hour of a bar. */
export function rateOf(bar: StripContent['precipitation'][number]): number {
  return (bar.mm * 3_600_000) / Math.max(1, bar.untilAt - bar.fromAt);
}

function ticksOf([low = 0, high = 0]: number[]): number[] {
  const step = [2, 5, 10, 20].find((candidate) => (high - low) / candidate <= 3.2) ?? 20;
  const ticks: number[] = [];
  for (let tick = Math.ceil(low / step) * step; tick <= high; tick += step) ticks.push(tick + 0);
  return ticks;
}

/** Runs of bars of one type, for a word over each. */
export function typeRuns(content: StripContent): { type: string; fromAt: number; untilAt: number; most: number }[] {
  const runs: { type: string; fromAt: number; untilAt: number; most: number }[] = [];
  for (const bar of content.precipitation.filter((candidate) => candidate.mm > 0)) {
    const last = runs.at(-1);
    if (last && last.type === bar.type && bar.fromAt - last.untilAt < 3_600_000) {
      last.untilAt = bar.untilAt;
      last.most = Math.max(last.most, rateOf(bar));
    } else {
      runs.push({ type: bar.type, fromAt: bar.fromAt, untilAt: bar.untilAt, most: rateOf(bar) });
    }
  }
  return runs;
}
