import { formatNumber, MINUS, type UnitSystem } from '@/lib/units/format';
import { toDisplay } from '@/lib/units/quantity';

/** How near a road is to freezing, worst last; the names are those of the map's styles. */
export const marginBands = ['unknown', 'safe', 'hold', 'closing', 'urgent', 'frozen'] as const;
export type MarginBand = (typeof marginBands)[number];

/** Upper edge of each band, °C of freeze margin. Common practice, no source. */
const upperC = { frozen: 0, urgent: 1, closing: 2, hold: 4 } as const;

export const bandWords: Readonly<Record<MarginBand, string>> = {
  frozen: 'icing',
  urgent: 'next pass',
  closing: 'watch',
  hold: 'holding',
  safe: 'safe',
  unknown: 'not known',
};

/** Band of a freeze margin in °C; bare dry road is safe however cold; null is not known. */
export function bandOf(freezeMarginC: number | null, isDry: boolean): MarginBand {
  if (freezeMarginC === null) return 'unknown';
  if (isDry) return 'safe';
  if (freezeMarginC < upperC.frozen) return 'frozen';
  if (freezeMarginC < upperC.urgent) return 'urgent';
  if (freezeMarginC < upperC.closing) return 'closing';
  return freezeMarginC < upperC.hold ? 'hold' : 'safe';
}

/** The span of a band as it stands in the legend: "1 to 2 °C". */
export function bandRange(band: MarginBand, system: UnitSystem): string {
  const shown = (differenceC: number) => {
    const value = toDisplay(differenceC, 'temperatureDifference', system);
    return formatNumber(value, Number.isInteger(value) ? 0 : 1);
  };
  const unit = system === 'us' ? '°F' : '°C';
  switch (band) {
    case 'frozen':
      return `below 0 ${unit}`;
    case 'urgent':
      return `0 to ${shown(upperC.urgent)} ${unit}`;
    case 'closing':
      return `${shown(upperC.urgent)} to ${shown(upperC.closing)} ${unit}`;
    case 'hold':
      return `${shown(upperC.closing)} to ${shown(upperC.hold)} ${unit}`;
    case 'safe':
      return `over ${shown(upperC.hold)} ${unit}, or dry`;
    case 'unknown':
      return 'no current data';
  }
}

/** A hold or a wait in the list: `0:35`, `over 6:00` when it outlasts what is forecast, a dash when not known. */
export function holdInFigures(minutes: number | null, longestMin: number): string {
  if (minutes === null) return '\u2013';
  const whole = Math.round(Math.min(Math.abs(minutes), longestMin));
  const text = `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, '0')}`;
  if (minutes > longestMin)
    return longestMin < 1 ? '\u2013' : longestMin < 60 ? `>${text}` : `>${Math.floor(longestMin / 60)} h`;
  return minutes < 0 && whole > 0 ? `${MINUS}${text}` : text;
}
