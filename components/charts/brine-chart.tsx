'use client';

import { type ReactNode, useState } from 'react';
import { useUnits } from '@/components/ui/units';
import { formatTime } from '@/lib/time/format';
import { formatNumber, formatQuantity, type UnitSystem } from '@/lib/units/format';
import { toDisplay } from '@/lib/units/quantity';
import { strengthAt, type BrineContent, type CurvePoint } from './brine-content';
import { brineFrame, brineLabels, brineScales, type BrineFrame, type BrineScales } from './brine-scales';
import { BrineTable } from './brine-table';

export type BrineChartProps = Readonly<{
  content: BrineContent;
  zone: string;
  heightPx?: number;
  /** Over the chart, read as its title. */
  caption?: ReactNode;
}>;

function useMeasuredWidth(): [(element: HTMLElement | null) => (() => void) | undefined, number] {
  const [widthPx, setWidthPx] = useState(380);
  const watch = (element: HTMLElement | null) => {
    if (!element) return undefined;
    const observer = new ResizeObserver(([entry]) => {
      if (entry && entry.contentRect.width > 0) setWidthPx(Math.max(240, entry.contentRect.width));
    });
    observer.observe(element);
    return () => observer.disconnect();
  };
  return [watch, widthPx];
}

const pathOf = (points: readonly { x: number; y: number }[]) =>
  points.map((point, index) => `${index === 0 ? 'M' : 'L'}${point.x.toFixed(1)} ${point.y.toFixed(1)}`).join('');

/** The freezing curve, with this road's brine sliding along its days towards it. */
export function BrineChart({ content, zone, heightPx = 152, caption }: BrineChartProps) {
  const system = useUnits();
  const [watch, widthPx] = useMeasuredWidth();
  const frame = brineFrame(widthPx, heightPx);
  const scales = brineScales(content, frame, system);
  const words = wordsFor(content, system, zone);
  return (
    <figure ref={watch} className="relative min-w-0">
      {caption ? <figcaption className="mb-1 text-sm text-soft">{caption}</figcaption> : null}
      <svg
        aria-hidden
        viewBox={`0 0 ${widthPx} ${heightPx}`}
        width="100%"
        height={heightPx}
        className="block overflow-visible"
      >
        <Axes frame={frame} scales={scales} system={system} />
        <Curve content={content} frame={frame} scales={scales} />
        <Road content={content} frame={frame} scales={scales} />
        {brineLabels(content, words, { frame, scales }).map((label) => (
          <text
            key={label.key}
            x={label.x + 1}
            y={label.y + 11.5}
            className={`text-xs ${labelLook[label.key] ?? 'fill-soft'} [paint-order:stroke] [stroke-linejoin:round] [stroke-width:3px] [stroke:var(--panel)]`}
          >
            {words[label.key as keyof typeof words]}
          </text>
        ))}
      </svg>
      <BrineTable content={content} zone={zone} />
    </figure>
  );
}

const labelLook: Readonly<Record<string, string>> = {
  pavement: 'fill-closing',
  refreezes: 'fill-urgent',
  promise: 'fill-ink',
  ice: 'fill-frozen',
  brine: 'fill-soft',
};

function wordsFor(content: BrineContent, system: UnitSystem, zone: string) {
  const pavement = formatQuantity(content.pavementTempC, 'temperature', system);
  const crossing = strengthAt(content.iceBranch, content.pavementTempC);
  const promised = content.promisedMassFraction;
  const isFrozen = content.now !== null && crossing !== null && content.now.massFraction < crossing;
  return {
    pavement: `pavement ${pavement.value} ${pavement.unit} at ${formatTime(content.pavementAt, zone)}`,
    refreezes:
      crossing === null
        ? null
        : `${isFrozen || promised !== null ? 'ice below' : 'refreezes at'} ${formatNumber(crossing * 100, 1)} %`,
    promise: promised === null ? null : `promise kept from ${formatNumber(promised * 100, 1)} %`,
    ice: 'ice + brine',
    brine: 'all brine',
  };
}

function Axes({ frame, scales, system }: Readonly<{ frame: BrineFrame; scales: BrineScales; system: UnitSystem }>) {
  const floor = frame.heightPx - frame.bottom;
  return (
    <g>
      {scales.yTicks.map((tempC) => (
        <g key={tempC}>
          <line
            x1={frame.left}
            x2={frame.widthPx - frame.right}
            y1={scales.y(tempC)}
            y2={scales.y(tempC)}
            className="stroke-line"
          />
          <text x={frame.left - 7} y={scales.y(tempC) + 4} textAnchor="end" className="fill-soft font-mono text-xs">
            {formatNumber(toDisplay(tempC, 'temperature', system), 0)}
          </text>
        </g>
      ))}
      {scales.xTicks.map((massFraction) => (
        <text
          key={massFraction}
          x={scales.x(massFraction)}
          y={floor + 15}
          textAnchor="middle"
          className="fill-soft font-mono text-xs"
        >
          {formatNumber(massFraction * 100, 0)}
        </text>
      ))}
      <text x={frame.widthPx - 1} y={floor + 15} textAnchor="end" className="fill-soft text-xs">
        % salt
      </text>
      <text x={2} y={frame.top + 1} className="fill-soft text-xs">
        {system === 'us' ? '°F' : '°C'}
      </text>
    </g>
  );
}

function Curve({
  content,
  frame,
  scales,
}: Readonly<{ content: BrineContent; frame: BrineFrame; scales: BrineScales }>) {
  const at = (point: CurvePoint) => ({ x: scales.x(point.massFraction), y: scales.y(point.tempC) });
  const ice = content.iceBranch.map(at);
  const end = content.iceBranch.at(-1);
  if (!end) return null;
  const floor = frame.heightPx - frame.bottom;
  const eutectic = at(end);
  return (
    <g>
      <path
        d={`${pathOf(ice)}L${eutectic.x} ${floor}L${frame.left} ${floor}Z`}
        className="fill-frozen opacity-[0.13]"
      />
      <path d={pathOf(ice)} className="fill-none stroke-lamp" strokeWidth={2.5} strokeLinejoin="round" />
      {content.saltBranch.length > 1 ? (
        <path
          d={pathOf(content.saltBranch.map(at))}
          className="fill-none stroke-lamp opacity-50"
          strokeWidth={2}
          strokeDasharray="4 3"
        />
      ) : null}
      <circle cx={eutectic.x} cy={eutectic.y} r={3.5} className="fill-panel stroke-lamp" strokeWidth={2} />
    </g>
  );
}

/** Pavement as a dashed line; where the road was solid, where it is going hollow. */
function Road({ content, frame, scales }: Readonly<{ content: BrineContent; frame: BrineFrame; scales: BrineScales }>) {
  const y = scales.y(content.pavementTempC);
  const at = (state: { massFraction: number; tempC: number }) => ({
    x: scales.x(state.massFraction),
    y: scales.y(state.tempC),
  });
  const trail = [...content.past, ...(content.now ? [content.now] : []), ...content.future].map(at);
  const crossing = strengthAt(content.iceBranch, content.pavementTempC);
  return (
    <g>
      <line
        x1={frame.left}
        x2={frame.widthPx - frame.right}
        y1={y}
        y2={y}
        className="stroke-closing"
        strokeWidth={1.5}
        strokeDasharray="4 4"
      />
      <path d={pathOf(trail)} className="fill-none stroke-soft opacity-40" strokeWidth={1} />
      {content.past.map((state) => (
        <circle key={state.at} cx={at(state).x} cy={at(state).y} r={2.5} className="fill-soft" />
      ))}
      {content.future.map((state) => (
        <circle
          key={state.at}
          cx={at(state).x}
          cy={at(state).y}
          r={2.75}
          className="fill-panel stroke-soft"
          strokeWidth={1.25}
        />
      ))}
      {crossing === null ? null : (
        <path d={`M${scales.x(crossing)} ${y - 5}v10`} className="stroke-urgent" strokeWidth={2} />
      )}
      {content.promisedMassFraction === null ? null : (
        <path d={`M${scales.x(content.promisedMassFraction)} ${y - 5}v10`} className="stroke-ink" strokeWidth={2} />
      )}
      {content.now ? (
        <circle
          cx={at(content.now).x}
          cy={at(content.now).y}
          r={6}
          className="fill-urgent stroke-panel"
          strokeWidth={1.5}
        />
      ) : null}
    </g>
  );
}
