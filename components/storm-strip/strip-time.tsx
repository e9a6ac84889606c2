import { formatDayTime, formatTime } from '@/lib/time/format';
import { hourTicks } from '@/lib/time/step-axis';
import { type StripContent } from './strip-content';
import { type StripFrame, type StripScales } from './strip-scales';

type LayerProps = Readonly<{ content: StripContent; frame: StripFrame; scales: StripScales }>;

export function TimeAxis({ content, frame, scales, zone }: LayerProps & { zone: string }) {
  const widthPx = frame.widthPx - frame.left - frame.right;
  const ticks = hourTicks({ fromAt: content.fromAt, untilAt: content.untilAt, zone, widthPx, minGapPx: 62 });
  return (
    <g>
      {ticks.map((at) => {
        const word = formatTime(at, zone);
        const isMidnight = word === '00:00';
        const x = scales.x(at);
        const isAtEnd = x > frame.widthPx - frame.right - 18;
        return (
          <g key={at}>
            <line
              x1={x}
              x2={x}
              y1={frame.heightPx - frame.bottom}
              y2={frame.heightPx - frame.bottom + 4}
              className="stroke-faint"
            />
            <text
              x={isAtEnd ? frame.widthPx - 2 : x}
              y={frame.heightPx - 5}
              textAnchor={isAtEnd ? 'end' : 'middle'}
              className={`font-mono text-xs ${isMidnight ? 'fill-ink font-semibold' : 'fill-soft'}`}
            >
              {isMidnight ? formatDayTime(at, zone).slice(0, 3) : word}
            </text>
          </g>
        );
      })}
    </g>
  );
}

/** What is behind us lies on raised ground; a line and two words say where the forecast takes over. */
export function NowDivider({ content, frame, scales, cursorAt }: LayerProps & { cursorAt: number }) {
  const x = scales.x(content.nowAt);
  if (content.nowAt <= content.fromAt) return null;
  const floor = frame.heightPx - frame.bottom;
  // The head of the cursor would cover the words: they step aside.
  const aside = Math.abs(scales.x(cursorAt) - x) < 96 ? 38 + Math.abs(scales.x(cursorAt) - x) : 6;
  const isRunning = content.nowAt < content.untilAt;
  return (
    <g>
      <rect
        x={frame.left}
        y={0}
        width={Math.max(0, x - frame.left)}
        height={floor}
        className="fill-raised opacity-60"
      />
      {isRunning ? (
        <>
          <line x1={x} x2={x} y1={4} y2={floor} className="stroke-faint" />
          <text x={x - aside} y={14} textAnchor="end" className="fill-soft text-xs">
            measured
          </text>
          <text x={x + aside} y={14} className="fill-soft text-xs">
            forecast
          </text>
        </>
      ) : null}
    </g>
  );
}

/** A tick for each pass, under the zero line; the word only where there is room for it. */
export function Passes({ content, frame, scales }: LayerProps) {
  const y = frame.top + 2;
  const shown = content.passes.filter((pass) => pass.startsAt >= content.fromAt && pass.startsAt <= content.untilAt);
  return (
    <g>
      {shown.map((pass, index) => {
        const x = scales.x(pass.startsAt);
        const next = shown[index + 1];
        const room = (next ? scales.x(next.startsAt) : frame.widthPx) - x;
        const word = room > 56 ? `pass ${pass.number}` : room > 16 ? String(pass.number) : '';
        return (
          <g key={pass.number}>
            <path
              d={`M${x} ${y}v${frame.heightPx - frame.bottom - y}`}
              className="stroke-lamp opacity-35"
              strokeDasharray="2 4"
            />
            <path d={`M${x - 4} ${y}h8l-4 6z`} className="fill-lamp" />
            <text x={x + 7} y={y + 8} className="fill-lamp text-xs">
              {word}
            </text>
          </g>
        );
      })}
    </g>
  );
}

/** The cursor that drives the screen: a lamp line with the time on its head. */
export function TimeCursor({ at, frame, scales, zone }: Omit<LayerProps, 'content'> & { at: number; zone: string }) {
  const x = scales.x(at);
  const half = 31;
  const head = Math.min(frame.widthPx - half - 1, Math.max(half + 1, x));
  return (
    <g className="pointer-events-none">
      <line x1={x} x2={x} y1={18} y2={frame.heightPx - frame.bottom + 3} className="stroke-lamp" strokeWidth={2} />
      <rect x={head - half} y={0} width={half * 2} height={21} rx={4} className="fill-lamp" />
      <text x={head} y={15} textAnchor="middle" className="fill-on-lamp font-mono text-sm font-semibold">
        {formatTime(at, zone)}
      </text>
    </g>
  );
}
