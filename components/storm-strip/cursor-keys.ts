const MS_PER_MIN = 60_000;

export interface CursorLimits {
  readonly fromAt: number;
  readonly untilAt: number;
  readonly nowAt: number;
  readonly stepMin: number;
}

/** An instant moved to the nearest whole step and kept on the strip. */
export function snapped(at: number, { fromAt, untilAt, stepMin }: CursorLimits): number {
  const stepMs = stepMin * MS_PER_MIN;
  const whole = Math.round(at / stepMs) * stepMs;
  if (whole < fromAt) return Math.ceil(fromAt / stepMs) * stepMs;
  return whole > untilAt ? Math.floor(untilAt / stepMs) * stepMs : whole;
}

/**
 * Where a key moves the time cursor, or null when the key is not its own: arrows a step, with shift an hour; Page keys
 * three hours; Home and End the ends; N now.
 */
export function keyMove(
  key: { key: string; shiftKey: boolean },
  cursorAt: number,
  limits: CursorLimits,
): number | null {
  const stepMs = (key.shiftKey ? 60 : limits.stepMin) * MS_PER_MIN;
  switch (key.key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return snapped(cursorAt + stepMs, limits);
    case 'ArrowLeft':
    case 'ArrowDown':
      return snapped(cursorAt - stepMs, limits);
    case 'PageUp':
      return snapped(cursorAt + 180 * MS_PER_MIN, limits);
    case 'PageDown':
      return snapped(cursorAt - 180 * MS_PER_MIN, limits);
    case 'Home':
      return snapped(limits.fromAt, limits);
    case 'End':
      return snapped(limits.untilAt, limits);
    case 'n':
    case 'N':
      return snapped(Math.floor(limits.nowAt / (limits.stepMin * MS_PER_MIN)) * limits.stepMin * MS_PER_MIN, limits);
    default:
      return null;
  }
}
