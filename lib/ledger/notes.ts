import { differenceFraction, type Account } from './account';
import { rateToleranceFraction } from './limits';

export interface RunFacts {
  truckNumber: number;
  driverName: string;
  routeName: string | null;
  isFinished: boolean;
  roadsTotal: number;
  roadsDone: number;
  loadedKg: number;
  /** days between the spreader's calibration and the run; null when never calibrated */
  calibrationAgeDays: number | null;
  account: Account;
}

export interface Note {
  what: string;
  cause: string;
}

/** Calibration older than this is named as a likely cause, days (once a season at least; common practice, no source). */
const calibrationDueDays = 180;

/** What a supervisor should look at, worst first, each with the likely cause in words. */
export function notesFor(runs: readonly RunFacts[]): Note[] {
  return [
    ...runs.flatMap(overOrUnder),
    ...runs.flatMap(neverLogged),
    ...runs.flatMap(skipped),
    ...runs.flatMap(loadsDisagree),
  ];
}

const routeOf = (run: RunFacts) => run.routeName ?? 'a free list of roads';

function overOrUnder(run: RunFacts): Note[] {
  const difference = differenceFraction(run.account);
  if (difference === null || Math.abs(difference) <= rateToleranceFraction) return [];
  const percent = Math.round(Math.abs(difference) * 100);
  return [
    {
      what: `Truck ${run.truckNumber} spread ${percent} % ${difference > 0 ? 'over' : 'under'} on ${routeOf(run)}`,
      cause: calibrationCause(run),
    },
  ];
}

function calibrationCause(run: RunFacts): string {
  if (run.calibrationAgeDays === null) return 'Its spreader has no calibration on record.';
  if (run.calibrationAgeDays > calibrationDueDays)
    return `Its spreader was last calibrated ${run.calibrationAgeDays} days before; a catch test is due.`;
  return `Its spreader was calibrated ${run.calibrationAgeDays} days before: ask ${run.driverName} about the road.`;
}

function neverLogged(run: RunFacts): Note[] {
  const missing = run.roadsTotal - run.roadsDone;
  if (!run.isFinished || missing <= 0) return [];
  return [
    {
      what: `${missing} of ${run.roadsTotal} roads on ${routeOf(run)} were never logged`,
      cause: `Truck ${run.truckNumber} finished the run without them; treated or not is unknown.`,
    },
  ];
}

function skipped(run: RunFacts): Note[] {
  if (run.account.skipped === 0) return [];
  return [
    {
      what: `Truck ${run.truckNumber} skipped ${run.account.skipped} ${run.account.skipped === 1 ? 'road' : 'roads'} on ${routeOf(run)}`,
      cause: 'The reason, if one was given, stands beside the road below.',
    },
  ];
}

function loadsDisagree(run: RunFacts): Note[] {
  if (run.loadedKg === 0 || run.account.spreadKg <= run.loadedKg * (1 + rateToleranceFraction)) return [];
  const tonnes = (kg: number) => (kg / 1000).toFixed(1);
  return [
    {
      what: `Truck ${run.truckNumber} logged ${tonnes(run.account.spreadKg)} t spread from ${tonnes(run.loadedKg)} t loaded`,
      cause: 'A load was not recorded, or the rates set were not the rates spread.',
    },
  ];
}
