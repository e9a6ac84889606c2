'use client';

import { LinePath } from '@visx/shape';
import { useUnits } from '@/components/ui/units';
import { saltName, type Salt } from '@/lib/brine/salts';
import { formatNumber, formatQuantity } from '@/lib/units/format';
import { unitLabel } from '@/lib/units/quantity';
import { frameOf, scalesOf, type ChartFrame, type ChartScales } from './chart-scales';
import { curveOf, type Curve, type CurvePoint } from './curves';
import { writeFormula } from './solid-name';
import { useWidth } from './use-width';

export type LiquidusChartProps = Readonly<{
  salt: Salt;
  brine: { massFraction: number; freezingPointC: number; isPastEutectic: boolean } | null;
  roadC: number;
}>;

const always: readonly Salt[] = ['NaCl', 'CaCl2', 'MgCl2'];
const strokes: Readonly<Record<Salt, string>> = {
  NaCl: 'stroke-hold',
  CaCl2: 'stroke-closing',
  MgCl2: 'stroke-safe',
  KCl: 'stroke-safe',
};
/** Where a name stands beside the end of its curve, so that it covers no other. */
const names: Readonly<Record<Salt, { dx: number; dy: number; anchor: 'start' | 'end' }>> = {
  NaCl: { dx: 9, dy: 13, anchor: 'start' },
  CaCl2: { dx: -10, dy: 12, anchor: 'end' },
  MgCl2: { dx: -10, dy: 14, anchor: 'end' },
  KCl: { dx: 10, dy: 8, anchor: 'start' },
};
/** A rim in the colour of the page keeps words legible on lines. */
const rimmed = '[paint-order:stroke] stroke-ground stroke-[4px] [stroke-linejoin:round]';

function Axes({ frame, scales }: Readonly<{ frame: ChartFrame; scales: ChartScales }>) {
  const system = useUnits();
  return (
    <g className="fill-faint text-[12px]">
      {scales.temperatureTicks.map(({ value, y }) => (
        <g key={value}>
          <path d={`M${frame.left} ${y}H${frame.right}`} className="stroke-line" />
          <text x={frame.left - 7} y={y + 4} textAnchor="end" className="font-mono">
            {formatNumber(value, 0)}
          </text>
        </g>
      ))}
      {scales.strengthTicks.map((massFraction) => (
        <text
          key={massFraction}
          x={scales.x(massFraction)}
          y={frame.bottom + 18}
          textAnchor="middle"
          className="font-mono"
        >
          {formatNumber(100 * massFraction, 0)}
        </text>
      ))}
      <g className="fill-soft">
        <text x={frame.left} y={12}>
          freezing point, {unitLabel('temperature', system)}
        </text>
        <text x={(frame.left + frame.right) / 2} y={frame.bottom + 37} textAnchor="middle">
          salt in the brine, % by mass
        </text>
      </g>
    </g>
  );
}

type SaltCurveProps = Readonly<{ curve: Curve; frame: ChartFrame; scales: ChartScales; isChosen: boolean }>;

function SaltCurve({ curve, frame, scales, isChosen }: SaltCurveProps) {
  const { dx, dy, anchor } = names[curve.salt];
  const end = { x: scales.x(curve.eutectic.massFraction), y: scales.y(curve.eutectic.tempC) };
  const at = {
    x: (point: CurvePoint) => scales.x(point.massFraction),
    y: (point: CurvePoint) => scales.y(point.tempC),
  };
  const stroke = isChosen ? 'stroke-lamp' : strokes[curve.salt];
  return (
    <g>
      <LinePath data={[...curve.ice]} {...at} fill="none" strokeWidth={isChosen ? 3 : 1.75} className={stroke} />
      {isChosen ? (
        <LinePath
          data={[...curve.salts]}
          {...at}
          fill="none"
          strokeWidth={1.75}
          strokeDasharray="5 4"
          className={stroke}
        />
      ) : null}
      <circle cx={end.x} cy={end.y} r={isChosen ? 5 : 3.5} strokeWidth={2} className={`fill-ground ${stroke}`} />
      <text
        x={end.x + dx}
        y={end.y + dy}
        textAnchor={anchor}
        className={`text-[13px] ${rimmed} ${isChosen ? 'fill-ink font-semibold' : 'fill-soft'}`}
      >
        {frame.isNarrow ? writeFormula(curve.salt) : saltName[curve.salt]}
      </text>
    </g>
  );
}

/** What the dashed part of the chosen curve is. */
function SaltBranchName({ curve, scales }: Readonly<{ curve: Curve; scales: ChartScales }>) {
  const middle = curve.salts[Math.floor(curve.salts.length / 2)];
  if (middle === undefined) return null;
  return (
    <text
      x={scales.x(middle.massFraction) - 9}
      y={scales.y(middle.tempC) + 4}
      textAnchor="end"
      className={`fill-soft text-[13px] ${rimmed}`}
    >
      salt separates
    </text>
  );
}

type RoadProps = Readonly<{ roadC: number; frame: ChartFrame; scales: ChartScales }>;

function RoadLine({ roadC, frame, scales }: RoadProps) {
  const y = scales.y(roadC);
  if (y < frame.top || y > frame.bottom) return null;
  return (
    <path
      d={`M${frame.left} ${y}H${frame.right}`}
      strokeDasharray="1 5"
      strokeLinecap="round"
      strokeWidth={2}
      className="stroke-soft"
    />
  );
}

function RoadName({ roadC, frame, scales }: RoadProps) {
  const system = useUnits();
  const y = scales.y(roadC);
  if (y < frame.top || y > frame.bottom) return null;
  const { value, unit } = formatQuantity(roadC, 'temperature', system);
  return (
    <text x={frame.left + 4} y={y + 16} className={`fill-soft text-[13px] ${rimmed}`}>
      {frame.isNarrow ? 'road' : 'tonight’s road'}, {value} {unit}
    </text>
  );
}

function ThisBrine({
  brine,
  frame,
  scales,
}: Readonly<{ brine: NonNullable<LiquidusChartProps['brine']>; frame: ChartFrame; scales: ChartScales }>) {
  const x = scales.x(brine.massFraction);
  const y = scales.y(brine.freezingPointC);
  // On the branch where the salt separates the free side is below and to the left; on the other, above and to the right.
  const isLeft = brine.isPastEutectic;
  return (
    <g>
      <path d={`M${frame.left} ${y}H${x}V${frame.bottom}`} fill="none" strokeDasharray="2 4" className="stroke-ink" />
      <circle cx={x} cy={y} r={7} className="fill-ink" />
      <text
        x={isLeft ? x - 11 : x + 12}
        y={isLeft ? y + 19 : y - 10}
        textAnchor={isLeft ? 'end' : 'start'}
        className={`fill-ink text-[0.875rem] font-semibold ${rimmed}`}
      >
        this brine
      </text>
    </g>
  );
}

/** The freezing curves of the chlorides from water to their eutectics, and this brine on its own. */
export function LiquidusChart({ salt, brine, roadC }: LiquidusChartProps) {
  const system = useUnits();
  const [ref, width] = useWidth<HTMLDivElement>(600);
  const shown = always.includes(salt) ? always : [...always, salt];
  const chosen = curveOf(salt);
  const curves = shown.filter((other) => other !== salt).map(curveOf);
  const frame = frameOf(width);
  const scales = scalesOf(frame, { curves, chosen, brine, system });
  return (
    <div ref={ref} className="min-w-0">
      <svg
        role="img"
        aria-label={`Freezing curves of the chlorides with this brine of ${saltName[salt]} on them; the figures are in the table below.`}
        width={frame.width}
        height={frame.height}
        viewBox={`0 0 ${frame.width} ${frame.height}`}
        className="block h-auto max-w-full"
      >
        <Axes frame={frame} scales={scales} />
        {curves.map((curve) => (
          <SaltCurve key={curve.salt} curve={curve} frame={frame} scales={scales} isChosen={false} />
        ))}
        <RoadLine roadC={roadC} frame={frame} scales={scales} />
        <SaltCurve curve={chosen} frame={frame} scales={scales} isChosen />
        {frame.isNarrow || brine?.isPastEutectic ? null : <SaltBranchName curve={chosen} scales={scales} />}
        <RoadName roadC={roadC} frame={frame} scales={scales} />
        {brine === null ? null : <ThisBrine brine={brine} frame={frame} scales={scales} />}
      </svg>
    </div>
  );
}
