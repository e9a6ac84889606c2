import { Area, LinePath } from '@visx/shape';
import { toDisplay, type UnitSystem } from '@/lib/units/quantity';
import { MINUS } from '@/lib/units/format';
import { precipitationWords, type PrecipitationType, type StripContent } from './strip-content';
import { rateOf, typeRuns, type StripFrame, type StripScales } from './strip-scales';

type LayerProps = Readonly<{ content: StripContent; frame: StripFrame; scales: StripScales }>;

const fills: Readonly<Record<PrecipitationType, string>> = {
  none: 'fill-none',
  snow: 'fill-hold',
  sleet: 'fill-hold',
  rain: 'fill-closing',
  drizzle: 'fill-closing',
  'freezing-rain': 'fill-closing',
  'freezing-drizzle': 'fill-closing',
  frost: 'fill-soft',
  unknown: 'fill-soft',
};

const hatchOf: Readonly<Partial<Record<PrecipitationType, string>>> = {
  sleet: 'sleet',
  'freezing-rain': 'freezing',
  'freezing-drizzle': 'freezing',
  frost: 'frost',
};

/** A hatch over the bars of what freezes or is mixed, so that the type does not hang on colour. */
export function Hatches() {
  return (
    <defs>
      <pattern id="strip-sleet" width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <rect width="2" height="6" className="fill-panel opacity-45" />
      </pattern>
      <pattern id="strip-freezing" width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(-45)">
        <rect width="2.2" height="5" className="fill-panel opacity-60" />
      </pattern>
      <pattern id="strip-frost" width="5" height="5" patternUnits="userSpaceOnUse">
        <circle cx="2" cy="2" r="1" className="fill-panel" />
      </pattern>
    </defs>
  );
}

export function Precipitation({ content, frame, scales }: LayerProps) {
  const floor = frame.heightPx - frame.bottom;
  return (
    <g>
      {content.precipitation
        .filter((bar) => bar.mm > 0)
        .map((bar) => {
          const top = scales.barY(rateOf(bar));
          const left = scales.x(bar.fromAt);
          const width = Math.max(1, scales.x(bar.untilAt) - left - 2);
          const place = { x: left + 1, y: top, width, height: Math.max(1, floor - top) };
          const isPast = bar.untilAt <= content.nowAt;
          return (
            <g key={bar.fromAt}>
              <rect {...place} className={`${fills[bar.type]} ${isPast ? 'opacity-80' : 'opacity-45'}`} />
              {hatchOf[bar.type] ? <rect {...place} fill={`url(#strip-${hatchOf[bar.type]})`} /> : null}
            </g>
          );
        })}
      {typeRuns(content)
        .filter((run) => scales.x(run.untilAt) - scales.x(run.fromAt) > 70)
        .map((run) => (
          <text
            key={run.fromAt}
            x={(scales.x(run.fromAt) + scales.x(run.untilAt)) / 2}
            y={floor - 5}
            textAnchor="middle"
            className="fill-ink text-xs [paint-order:stroke] [stroke-linejoin:round] [stroke-width:3px] [stroke:var(--panel)]"
          >
            {precipitationWords[run.type as PrecipitationType]}
          </text>
        ))}
    </g>
  );
}

export function Temperature({ content, scales }: LayerProps) {
  const { measured, forecast } = content;
  const band = forecast.filter((point) => point.errorC !== null);
  const seam = measured.at(-1);
  const ahead = seam ? [{ ...seam, errorC: null }, ...forecast.filter((point) => point.at > seam.at)] : forecast;
  return (
    <g>
      <Area
        data={band}
        x={(point) => scales.x(point.at)}
        y0={(point) => scales.tempY(point.tempC - (point.errorC ?? 0))}
        y1={(point) => scales.tempY(point.tempC + (point.errorC ?? 0))}
        className="fill-soft opacity-20"
      />
      <LinePath
        data={[...measured]}
        x={(point) => scales.x(point.at)}
        y={(point) => scales.tempY(point.tempC)}
        className="fill-none stroke-ink"
        strokeWidth={2.25}
        strokeLinejoin="round"
      />
      <LinePath
        data={[...ahead]}
        x={(point) => scales.x(point.at)}
        y={(point) => scales.tempY(point.tempC)}
        className="fill-none stroke-ink"
        strokeWidth={2.25}
        strokeDasharray="0.1 5"
        strokeLinecap="round"
      />
    </g>
  );
}

export function TemperatureAxis({ frame, scales, system }: Omit<LayerProps, 'content'> & { system: UnitSystem }) {
  const word = (tempC: number) => {
    const shown = Math.round(toDisplay(tempC, 'temperature', system));
    return `${shown < 0 ? MINUS : ''}${Math.abs(shown)}`;
  };
  return (
    <g>
      {scales.ticksC.map((tempC) => (
        <g key={tempC}>
          <line
            x1={frame.left}
            x2={frame.widthPx - frame.right}
            y1={scales.tempY(tempC)}
            y2={scales.tempY(tempC)}
            className={tempC === 0 ? 'stroke-faint' : 'stroke-line'}
            strokeDasharray={tempC === 0 ? '1.5 4' : undefined}
          />
          <text x={frame.left - 8} y={scales.tempY(tempC) + 4} textAnchor="end" className="fill-soft font-mono text-xs">
            {word(tempC)}
            {tempC === 0 ? (system === 'us' ? ' °F' : ' °C') : ''}
          </text>
        </g>
      ))}
    </g>
  );
}
