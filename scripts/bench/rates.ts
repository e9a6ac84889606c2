import { performance } from 'node:perf_hooks';
import { type Station } from '@/lib/pavement/station-series';
import { stepAxis } from '@/lib/time/step-axis';
import { chooseTreatment } from '@/lib/treatment/choose-treatment';
import { defaultMaterials } from '@/lib/treatment/default-materials';
import { defaultPolicy, serviceClasses } from '@/lib/treatment/policy';
import { projectStorm, type StormInputs, type StormSegment } from '@/lib/treatment/project-storm';
import { weatherFrom } from '@/lib/treatment/weather';

const hourMs = 3_600_000;
const startAt = Date.UTC(2026, 0, 10, 18);
const segmentCount = 5000;
const passH = [4, 8, 12, 16];

function station(id: number): Station {
  const forecast = Array.from({ length: 30 }, (_, hour) => ({
    validAt: startAt + (hour - 2) * hourMs,
    pavementTempC: -3 - 3 * Math.sin(hour / 5 + id),
    pavementErrorC: 1,
    precipitationMm: Math.max(0, 0.8 * Math.sin(hour / 4)),
    precipitationType: hour < 14 ? 'snow' : 'freezing-drizzle',
    windSpeedMPerS: 6,
  }));
  return { id, latDeg: 60 + 0.05 * id, lonDeg: 0.1 * (id % 3), heightM: 40 * id, readings: [], forecast };
}

function inputs(): StormInputs {
  const segments = Array.from({ length: segmentCount }, (_, index): StormSegment => ({
    id: index,
    latDeg: 60 + (index % 71) / 200,
    lonDeg: (index % 97) / 400,
    heightM: index % 200,
    exposure: index % 9 === 0 ? 'ridge' : 'open',
    isBridge: index % 23 === 0,
    surface: 'asphalt',
    serviceClass: serviceClasses[index % 4] ?? 'A',
  }));
  const material = defaultMaterials.find(({ form }) => form === 'prewet') ?? null;
  const treatments = segments.flatMap(({ id }) =>
    passH.map((hour) => ({ segmentId: id, at: startAt + hour * hourMs, isPloughed: true, material, rateGPerM2: 25 })),
  );
  return {
    axis: stepAxis({ fromAt: startAt, untilAt: startAt + 24 * hourMs, stepMin: 10 }),
    nowAt: startAt,
    segments,
    stations: [0, 1, 2, 3, 4, 5].map(station),
    treatments,
    policy: defaultPolicy,
  };
}

function timed<T>(work: () => T): { result: T; seconds: number } {
  const before = performance.now();
  const result = work();
  return { result, seconds: (performance.now() - before) / 1000 };
}

/** 5,000 roads over 24 h in 10 min steps, then the rate of every material for each of them, on one core. */
export function benchRates(): void {
  const storm = inputs();
  projectStorm({ ...storm, segments: storm.segments.slice(0, 200) });
  const filmAt = startAt + 8 * hourMs;
  const projected = timed(() => projectStorm({ ...storm, filmAt }));
  const rated = timed(() =>
    projected.result.map(({ filmAt: film, carried }, index) => {
      const weather = weatherFrom({ stepMin: storm.axis.stepMin, ...carried }, 48);
      const serviceClass = storm.segments[index]?.serviceClass ?? 'A';
      if (!film) throw new Error('the film of the pass is missing');
      return chooseTreatment({
        film,
        weather,
        untilMin: 120,
        promise: defaultPolicy.promises[serviceClass],
        policy: defaultPolicy,
        materials: defaultMaterials,
        vehiclesPerH: defaultPolicy.vehiclesPerH[serviceClass],
      });
    }),
  );
  const steps = segmentCount * storm.axis.count;
  const salted = rated.result.filter(({ rateGPerM2 }) => rateGPerM2 !== null).length;
  console.log(
    `rates: ${segmentCount} roads × 24 h projected in ${projected.seconds.toFixed(2)} s ` +
      `(${Math.round(steps / projected.seconds / 1000)} thousand road steps a second); ` +
      `${defaultMaterials.length} materials for each road in ${rated.seconds.toFixed(2)} s (${salted} roads get a rate)`,
  );
}
