'use client';

import { type KeyboardEvent, type PointerEvent, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { useUnits } from '@/components/ui/units';
import { formatDateTime, formatDayTime, formatUtcOffset, relativeInWords } from '@/lib/time/format';
import { keyMove, snapped } from './cursor-keys';
import { type StripContent } from './strip-content';
import { frameFor, scalesFor } from './strip-scales';
import { NowDivider, Passes, TimeAxis, TimeCursor } from './strip-time';
import { Hatches, Precipitation, Temperature, TemperatureAxis } from './strip-weather';

export type StormStripProps = Readonly<{
  content: StripContent;
  cursorAt: number;
  /** True while the cursor stays on the clock. */
  isFollowingNow: boolean;
  onMove: (at: number) => void;
  onNow: () => void;
  /** IANA name of the agency's zone. */
  zone: string;
  /** Which station's pavement it is. */
  stationName: string;
  stepMin?: number;
  className?: string;
}>;

/** The window's width in px, followed; a guess until measured. */
function useWidth(): [(element: HTMLElement | null) => (() => void) | undefined, number, number] {
  const [size, setSize] = useState({ widthPx: 720, heightPx: 132 });
  const watch = (element: HTMLElement | null) => {
    if (!element) return undefined;
    const observer = new ResizeObserver(([entry]) => {
      if (entry)
        setSize({ widthPx: Math.max(280, entry.contentRect.width), heightPx: Math.max(90, entry.contentRect.height) });
    });
    observer.observe(element);
    return () => observer.disconnect();
  };
  return [watch, size.widthPx, size.heightPx];
}

/** Measured then forecast: the time line of a storm, whose cursor drives the whole screen. */
export function StormStrip(props: StormStripProps) {
  const { content, cursorAt, onMove, onNow, zone, stationName, isFollowingNow, stepMin = 10, className } = props;
  const system = useUnits();
  const [watch, widthPx, heightPx] = useWidth();
  const svg = useRef<SVGSVGElement>(null);
  const isDragging = useRef(false);
  const frame = frameFor(widthPx, heightPx);
  const scales = scalesFor(content, frame);
  const limits = { fromAt: content.fromAt, untilAt: content.untilAt, nowAt: content.nowAt, stepMin };

  const moveTo = (clientX: number) => {
    const box = svg.current?.getBoundingClientRect();
    if (!box || box.width === 0) return;
    const at = snapped(scales.atX(((clientX - box.left) / box.width) * widthPx), limits);
    if (at !== cursorAt) onMove(at);
  };
  const press = (event: PointerEvent<HTMLDivElement>) => {
    if (event.button !== 0) return;
    isDragging.current = true;
    event.currentTarget.setPointerCapture(event.pointerId);
    event.currentTarget.focus({ preventScroll: true });
    moveTo(event.clientX);
  };
  const drag = (event: PointerEvent<HTMLDivElement>) => {
    if (isDragging.current) moveTo(event.clientX);
  };
  const release = () => {
    isDragging.current = false;
  };
  const type = (event: KeyboardEvent<HTMLDivElement>) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const at = keyMove(event, cursorAt, limits);
    if (at === null) return;
    event.preventDefault();
    if (event.key.toLowerCase() === 'n') onNow();
    else onMove(at);
  };

  return (
    <section aria-label="Storm strip" className={classNames('flex min-h-0 flex-col', className)}>
      <header className="flex min-h-8 items-center justify-between gap-3 px-3 md:px-4">
        <p className="truncate text-sm text-soft">
          Pavement at {stationName}
          <span className="hidden sm:inline">
            , {formatDateTime(cursorAt, zone)} {formatUtcOffset(cursorAt, zone)}
          </span>
        </p>
        <Button
          size="small"
          variant="quiet"
          onClick={onNow}
          disabledReason={isFollowingNow ? 'The cursor is at now.' : null}
        >
          Now
        </Button>
      </header>
      <div
        ref={watch}
        role="slider"
        tabIndex={0}
        aria-label="Time shown"
        aria-orientation="horizontal"
        aria-valuemin={content.fromAt}
        aria-valuemax={content.untilAt}
        aria-valuenow={cursorAt}
        aria-valuetext={timeInWords(content, cursorAt, zone)}
        onPointerDown={press}
        onPointerMove={drag}
        onPointerUp={release}
        onPointerCancel={release}
        onKeyDown={type}
        className="relative min-h-0 flex-1 cursor-ew-resize touch-pan-y select-none focus-visible:-outline-offset-2"
      >
        <svg
          ref={svg}
          aria-hidden
          width="100%"
          height="100%"
          viewBox={`0 0 ${widthPx} ${heightPx}`}
          className="absolute inset-0 block"
        >
          <Hatches />
          <NowDivider content={content} frame={frame} scales={scales} cursorAt={cursorAt} />
          <TemperatureAxis frame={frame} scales={scales} system={system} />
          <Precipitation content={content} frame={frame} scales={scales} />
          <Temperature content={content} frame={frame} scales={scales} />
          <Passes content={content} frame={frame} scales={scales} />
          <TimeAxis content={content} frame={frame} scales={scales} zone={zone} />
          <TimeCursor at={cursorAt} frame={frame} scales={scales} zone={zone} />
        </svg>
      </div>
    </section>
  );
}

/** "Tue 04:10, forecast, in 1 h 30 min": what the slider says of itself. */
export function timeInWords(content: StripContent, at: number, zone: string): string {
  const kind = at > content.nowAt ? 'forecast' : 'measured';
  return `${formatDayTime(at, zone)}, ${kind}, ${relativeInWords(at, content.nowAt)}`;
}
