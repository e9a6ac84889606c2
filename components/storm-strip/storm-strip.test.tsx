import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { keyMove, snapped } from './cursor-keys';
import { StormStrip } from './storm-strip';
import { type StripContent } from './strip-content';
import { frameFor, scalesFor, typeRuns } from './strip-scales';

afterEach(cleanup);

const hourMs = 3_600_000;
const fromAt = Date.UTC(2026, 11, 1, 17);
const nowAt = fromAt + 8 * hourMs + 7 * 60_000;
const untilAt = fromAt + 18 * hourMs;

const content: StripContent = {
  fromAt,
  untilAt,
  nowAt,
  measured: [
    { at: fromAt, tempC: -1 },
    { at: nowAt, tempC: -5 },
  ],
  forecast: [{ at: untilAt, tempC: 1, errorC: 1.5 }],
  precipitation: [
    { fromAt, untilAt: fromAt + hourMs, mm: 1, type: 'snow' },
    { fromAt: fromAt + hourMs, untilAt: fromAt + 2 * hourMs, mm: 2, type: 'snow' },
    { fromAt: fromAt + 2 * hourMs, untilAt: fromAt + 3 * hourMs, mm: 0.2, type: 'freezing-drizzle' },
  ],
  passes: [{ number: 4, startsAt: fromAt + 9 * hourMs }],
};
const limits = { fromAt, untilAt, nowAt, stepMin: 10 };
const key = (name: string, shiftKey = false) => ({ key: name, shiftKey });

describe('the keys of the time cursor', () => {
  it('an arrow moves a step, with shift an hour', () => {
    expect(keyMove(key('ArrowRight'), fromAt, limits)).toBe(fromAt + 600_000);
    expect(keyMove(key('ArrowRight', true), fromAt, limits)).toBe(fromAt + hourMs);
    expect(keyMove(key('ArrowLeft'), fromAt + hourMs, limits)).toBe(fromAt + hourMs - 600_000);
  });

  it('never leaves the strip; Home and End are its ends, N is the newest step of now', () => {
    expect(keyMove(key('ArrowLeft', true), fromAt, limits)).toBe(fromAt);
    expect(keyMove(key('End'), fromAt, limits)).toBe(untilAt);
    expect(keyMove(key('Home'), untilAt, limits)).toBe(fromAt);
    expect(keyMove(key('n'), fromAt, limits)).toBe(fromAt + 8 * hourMs);
    expect(keyMove(key('a'), fromAt, limits)).toBeNull();
  });

  it('lands on whole steps', () => {
    expect(snapped(fromAt + 14 * 60_000, limits)).toBe(fromAt + 600_000);
    expect(snapped(fromAt + 16 * 60_000, limits)).toBe(fromAt + 1_200_000);
  });
});

describe('the strip', () => {
  function show(onMove = vi.fn()) {
    render(
      <StormStrip
        content={content}
        cursorAt={fromAt + 10 * hourMs}
        isFollowingNow={false}
        onMove={onMove}
        onNow={vi.fn()}
        zone="Europe/Oslo"
        stationName="Ridge"
      />,
    );
    return { onMove, slider: screen.getByRole('slider', { name: 'Time shown' }) };
  }

  it('says its time in words, in the agency’s zone', () => {
    expect(show().slider.getAttribute('aria-valuetext')).toBe('Wed 04:00, forecast, in 1 h 53 min');
  });

  it('moves by a key and leaves other keys alone', () => {
    const { slider, onMove } = show();
    fireEvent.keyDown(slider, { key: 'ArrowRight' });
    expect(onMove).toHaveBeenCalledExactlyOnceWith(fromAt + 10 * hourMs + 600_000);
    fireEvent.keyDown(slider, { key: 'Tab' });
    fireEvent.keyDown(slider, { key: 'ArrowRight', altKey: true });
    expect(onMove).toHaveBeenCalledTimes(1);
  });

  it('covers its temperatures with their band, and 0 °C, from 360 to 1600 px', () => {
    for (const widthPx of [360, 1600]) {
      const frame = frameFor(widthPx, 140);
      const { tempY, x } = scalesFor(content, frame);
      expect(tempY(2.5)).toBeGreaterThanOrEqual(frame.top - 0.5);
      expect(tempY(-5)).toBeLessThanOrEqual(140 - frame.bottom);
      expect(tempY(0)).toBeGreaterThan(frame.top);
      expect([x(fromAt), x(untilAt)]).toEqual([frame.left, widthPx - frame.right]);
    }
  });

  it('names each run of one type once', () => {
    expect(typeRuns(content).map((run) => run.type)).toEqual(['snow', 'freezing-drizzle']);
  });
});
