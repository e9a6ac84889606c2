import { scaleLinear } from '@visx/scale';
import { toDisplay, type UnitSystem } from '@/lib/units/quantity';
import { strengthAt, type BrineContent } from './brine-content';
import { placeLabels, type Box, type LabelToPlace, type PlacedLabel } from './place-labels';

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
  readonly promise: string | null;
  readonly brine: string;
  readonly ice: string;
}

type Corner = readonly [x: number, y: number];

const label = (key: string, text: string, corners: readonly Corner[]): LabelToPlace => ({
  key,
  widthPx: widthOf(text),
  heightPx,
  candidates: corners.map(([x, y]) => ({ x, y })),
});

/** Places for a word that belongs to a tick on the pavement line. */
function beside(x: number, lineY: number, width: number): Corner[] {
  return [
    [x - width - 7, lineY + 5],
    [x - width + 4, lineY + 20],
    [x + 12, lineY - 19],
    [x + 22, lineY + 4],
    [x - 4, lineY + 20],
    [x - 4, lineY + 36],
    [x + 12, lineY - 35],
    [x + 60, lineY + 4],
  ];
}

function tickLabels(content: BrineContent, words: BrineWords, scales: BrineScales): LabelToPlace[] {
  const lineY = scales.y(content.pavementTempC);
  const crossing = strengthAt(content.iceBranch, content.pavementTempC);
  const at = (key: string, text: string | null, massFraction: number | null) =>
    text === null || massFraction === null
      ? []
      : [label(key, text, beside(scales.x(massFraction), lineY, widthOf(text)))];
  return [...at('refreezes', words.refreezes, crossing), ...at('promise', words.promise, content.promisedMassFraction)];
}

/** Where the words of the chart stand, so that none covers another, the road's point, the curve or the pavement line. */
export function brineLabels(
  content: BrineContent,
  words: BrineWords,
  { frame, scales }: { frame: BrineFrame; scales: BrineScales },
): PlacedLabel[] {
  const lineY = scales.y(content.pavementTempC);
  const right = frame.widthPx - frame.right;
  const floor = frame.heightPx - frame.bottom;
  const box = { x: frame.left + 2, y: frame.top - 8, width: right - frame.left - 2, height: floor - frame.top + 8 };
  const pavementX = right - widthOf(words.pavement);
  const brineX = right - widthOf(words.brine);
  const iceX = frame.left + 12;
  const rows = (x: number, ys: readonly number[]) => ys.map((y): Corner => [x, y]);
  const pavementRows = [-17, 3, 8, 18, -31, 30, -46].map((shift) => lineY + shift);
  const labels = [
    label(
      'pavement',
      words.pavement,
      pavementRows.flatMap((y): Corner[] => [
        [pavementX, y],
        [frame.left + 4, y],
      ]),
    ),
    ...tickLabels(content, words, scales),
    label('ice', words.ice, rows(iceX, [floor - 22, lineY + 12, lineY + 26, lineY - 24])),
    label('brine', words.brine, [
      [brineX, frame.top],
      [brineX - 70, frame.top],
      ...rows(brineX, [lineY + 22, lineY - 40]),
    ]),
  ];
  return placeLabels(labels, box, obstacles(content, { frame, scales }));
}

function obstacles(content: BrineContent, { frame, scales }: { frame: BrineFrame; scales: BrineScales }): Box[] {
  const lineY = scales.y(content.pavementTempC);
  const width = frame.widthPx - frame.right - frame.left;
  const curve = content.iceBranch.map(({ massFraction, tempC }) => ({
    x: scales.x(massFraction) - 2,
    y: scales.y(tempC) - 2,
    width: 4,
    height: 4,
  }));
  const point = content.now ? [{ x: scales.x(content.now.massFraction) - 8, y: lineY - 8, width: 16, height: 16 }] : [];
  return [...point, { x: frame.left, y: lineY - 1.5, width, height: 3 }, ...curve];
}
