import { scaleLinear } from '@visx/scale';
import { toDisplay, type UnitSystem } from '@/lib/units/quantity';
import { strengthAt, type BrineContent } from './brine-content';
import { placeLabels, type LabelToPlace, type PlacedLabel } from './place-labels';

export interface BrineFrame {
  readonly widthPx: number;
  readonly heightPx: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export function brineFrame(widthPx: number, heightPx: number): BrineFrame {
  return { widthPx, heightPx, left: 38, right: 14, top: 10, bottom: 24 };
}

export interface BrineScales {
  readonly x: (massFraction: number) => number;
  readonly y: (tempC: number) => number;
  /** mass fractions */
  readonly xTicks: readonly number[];
  /** °C of whole display degrees */
  readonly yTicks: readonly number[];
  readonly coldestC: number;
}

/** Always the whole ice branch; wider when the road's own brine is stronger than that. */
export function brineScales(content: BrineContent, frame: BrineFrame, system: UnitSystem): BrineScales {
  const states = [...content.past, ...content.future, ...(content.now ? [content.now] : [])];
  const eutectic = content.iceBranch.at(-1) ?? { massFraction: 0.25, tempC: -22 };
  const coldestC = Math.min(eutectic.tempC, content.pavementTempC, ...states.map((state) => state.tempC)) - 1.5;
  const warmestC = Math.max(0.8, content.pavementTempC + 0.8, ...states.map((state) => state.tempC + 0.8));
  const strongest = Math.min(
    0.45,
    Math.max(eutectic.massFraction, ...states.map((state) => state.massFraction)) + 0.025,
  );
  const x = scaleLinear<number>({
    domain: [0, strongest],
    range: [frame.left, frame.widthPx - frame.right],
    clamp: true,
  });
  const y = scaleLinear<number>({ domain: [coldestC, warmestC], range: [frame.heightPx - frame.bottom, frame.top] });
  const xTicks = [0, 0.05, 0.1, 0.15, 0.2, 0.25, 0.3, 0.35, 0.4].filter(
    (tick) => tick <= strongest && x(tick) < frame.widthPx - 52,
  );
  return { x, y, xTicks, yTicks: temperatureTicks(coldestC, warmestC, system), coldestC };
}

function temperatureTicks(coldestC: number, warmestC: number, system: UnitSystem): number[] {
  const low = toDisplay(coldestC, 'temperature', system);
  const high = toDisplay(warmestC, 'temperature', system);
  const step = [5, 10, 20].find((candidate) => (high - low) / candidate <= 6) ?? 20;
  const ticks: number[] = [];
  for (let tick = Math.ceil(low / step) * step; tick <= high; tick += step) {
    ticks.push(system === 'us' ? (tick - 32) / 1.8 : tick);
  }
  return ticks;
}

const heightPx = 15;
const widthOf = (text: string) => Math.ceil(text.length * 6.6) + 2;

export interface BrineWords {
  readonly pavement: string;
  readonly refreezes: string | null;
  readonly brine: string;
  readonly ice: string;
}

/** Where the words of the chart stand, so that none covers another, the road's point or the pavement line. */
export function brineLabels(
  content: BrineContent,
  words: BrineWords,
  { frame, scales }: { frame: BrineFrame; scales: BrineScales },
): PlacedLabel[] {
  const lineY = scales.y(content.pavementTempC);
  const right = frame.widthPx - frame.right;
  const box = {
    x: frame.left + 2,
    y: frame.top - 8,
    width: right - frame.left - 2,
    height: frame.heightPx - frame.bottom - frame.top + 8,
  };
  const point = content.now ? { x: scales.x(content.now.massFraction) - 8, y: lineY - 8, width: 16, height: 16 } : null;
  const crossing = strengthAt(content.iceBranch, content.pavementTempC);
  const label = (key: string, text: string, corners: readonly (readonly [number, number])[]): LabelToPlace => ({
    key,
    widthPx: widthOf(text),
    heightPx,
    candidates: corners.map(([x, y]) => ({ x, y })),
  });
  const pavementX = right - widthOf(words.pavement);
  const labels = [
    label(
      'pavement',
      words.pavement,
      [-17, 3, 8, 18, -31, 30, -46].flatMap((shift) => [
        [pavementX, lineY + shift] as const,
        [frame.left + 4, lineY + shift] as const,
      ]),
    ),
  ];
  if (words.refreezes !== null && crossing !== null) {
    const x = scales.x(crossing);
    const width = widthOf(words.refreezes);
    labels.push(
      label('refreezes', words.refreezes, [
        [x - width - 7, lineY + 5],
        [x - width + 4, lineY + 20],
        [x + 12, lineY - 19],
        [x + 22, lineY + 4],
        [frame.left + 4, lineY + 5],
        [x + 12, lineY - 35],
        [x + 60, lineY + 4],
      ]),
    );
  }
  const iceX = frame.left + 12;
  const floor = frame.heightPx - frame.bottom;
  labels.push(
    label('ice', words.ice, [
      [iceX, floor - 22],
      [iceX, lineY + 12],
      [iceX, lineY + 26],
      [iceX, lineY - 24],
    ]),
  );
  const brineX = right - widthOf(words.brine);
  labels.push(
    label('brine', words.brine, [
      [brineX, frame.top],
      [brineX - 70, frame.top],
      [brineX, lineY + 22],
      [brineX, lineY - 40],
    ]),
  );
  const line = { x: frame.left, y: lineY - 1.5, width: right - frame.left, height: 3 };
  const curve = content.iceBranch.map(({ massFraction, tempC }) => ({
    x: scales.x(massFraction) - 2,
    y: scales.y(tempC) - 2,
    width: 4,
    height: 4,
  }));
  return placeLabels(labels, box, [...(point ? [point] : []), line, ...curve]);
}
