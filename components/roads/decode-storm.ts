import { fromStep, unpackSteps } from '@/lib/contracts/packed-steps';
import { perUnit, precipitationWords, type StormStateView } from '@/lib/contracts/storm-state';
import { endOf, timeAt, type StepAxis } from '@/lib/time/step-axis';
import { type StripContent } from '@/components/storm-strip/strip-content';

type Rows = Readonly<Record<'marginC' | 'pavementC' | 'waterMm' | 'massFraction' | 'holdSteps', Int16Array>>;
type Last = StormStateView['last'][number];

/** A storm's state unpacked: rows are roads, in the order of `view.segmentIds`. */
export interface Storm {
  readonly view: StormStateView;
  readonly axis: StepAxis;
  readonly rows: Rows;
  readonly rowById: ReadonlyMap<number, number>;
  readonly lastByRow: ReadonlyMap<number, Last>;
}

export function decodeStorm(view: StormStateView): Storm {
  const rows = (packed: string) => unpackSteps(packed, view.axis.count);
  return {
    view,
    axis: view.axis,
    rows: {
      marginC: rows(view.marginC),
      pavementC: rows(view.pavementC),
      waterMm: rows(view.waterMm),
      massFraction: rows(view.massFraction),
      holdSteps: rows(view.holdSteps),
    },
    rowById: new Map(view.segmentIds.map((id, row) => [id, row])),
    lastByRow: new Map(view.last.map((last) => [last.index, last])),
  };
}

const scales = {
  marginC: perUnit.marginC,
  pavementC: perUnit.tempC,
  waterMm: perUnit.waterMm,
  massFraction: perUnit.massFraction,
} as const;

/** A value of a road at a step, null where it is not known. */
export function valueAt(storm: Storm, column: keyof typeof scales, at: { row: number; step: number }): number | null {
  return fromStep(storm.rows[column][at.row * storm.axis.count + at.step] ?? 0, scales[column]);
}

const hourMs = 3_600_000;

function hourlyPrecipitation(storm: Storm, station: StormStateView['stations'][number]): StripContent['precipitation'] {
  const mm = unpackSteps(station.precipitationMm, storm.axis.count);
  const bars = new Map<number, { mm: number; byType: Map<number, number> }>();
  mm.forEach((step, index) => {
    const amount = fromStep(step, perUnit.precipitationMm) ?? 0;
    if (amount <= 0) return;
    // The amount of a step fell in the time that ends there.
    const hour = Math.floor((timeAt(storm.axis, index) - 1) / hourMs) * hourMs;
    const bar = bars.get(hour) ?? { mm: 0, byType: new Map<number, number>() };
    const type = station.precipitationTypes[index] ?? 0;
    bar.mm += amount;
    bar.byType.set(type, (bar.byType.get(type) ?? 0) + amount);
    bars.set(hour, bar);
  });
  return [...bars]
    .filter(([, bar]) => bar.mm >= 0.02)
    .map(([fromAt, bar]) => {
      const [type] = [...bar.byType].reduce((most, one) => (one[1] > most[1] ? one : most));
      return { fromAt, untilAt: fromAt + hourMs, mm: bar.mm, type: precipitationWords[type] ?? 'unknown' };
    });
}

/** A station's part of the storm as the strip draws it. */
export function stripOf(storm: Storm, stationIndex: number): StripContent {
  const station = storm.view.stations[stationIndex];
  const base = {
    fromAt: storm.axis.startAt,
    untilAt: endOf(storm.axis),
    nowAt: Math.min(storm.view.nowAt, endOf(storm.axis)),
    passes: storm.view.passes,
  };
  if (!station) return { ...base, measured: [], forecast: [], precipitation: [] };
  const temps = unpackSteps(station.tempC, storm.axis.count);
  const errors = unpackSteps(station.errorC, storm.axis.count);
  const points = Array.from(temps, (step, index) => ({
    at: timeAt(storm.axis, index),
    tempC: fromStep(step, perUnit.tempC),
    errorC: fromStep(errors[index] ?? 0, perUnit.tempC),
  })).flatMap((point) => (point.tempC === null ? [] : [{ ...point, tempC: point.tempC }]));
  const newestAt = station.newestAt ?? -Infinity;
  return {
    ...base,
    measured: points.filter((point) => point.at <= newestAt),
    forecast: points.filter((point) => point.at > newestAt),
    precipitation: hourlyPrecipitation(storm, station),
  };
}
