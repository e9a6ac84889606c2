import { describe, expect, it } from 'vitest';
import { emptyAccount } from './account';
import { notesFor, type RunFacts } from './notes';

const run = (over: Partial<RunFacts>): RunFacts => ({
  truckNumber: 4,
  driverName: 'M. Aldous',
  routeName: 'Ridge',
  isFinished: true,
  roadsTotal: 10,
  roadsDone: 10,
  loadedKg: 40_000,
  calibrationAgeDays: 27,
  account: { ...emptyAccount, recommendedKg: 26_100, spreadKg: 26_500 },
  ...over,
});

describe('what needs a look', () => {
  it('is nothing when a run kept to its plan', () => {
    expect(notesFor([run({})])).toEqual([]);
  });

  it('names a truck that spread over, with its calibration', () => {
    const [note] = notesFor([run({ account: { ...emptyAccount, recommendedKg: 26_100, spreadKg: 31_800 } })]);
    expect(note?.what).toBe('Truck 4 spread 22 % over on Ridge');
    expect(note?.cause).toContain('27 days');
  });

  it('names roads of a finished run that were never logged, but not of one still out', () => {
    expect(notesFor([run({ roadsDone: 8 })])[0]?.what).toBe('2 of 10 roads on Ridge were never logged');
    expect(notesFor([run({ roadsDone: 8, isFinished: false })])).toEqual([]);
  });

  it('names a run that spread more than it loaded', () => {
    expect(notesFor([run({ loadedKg: 20_000 })])[0]?.what).toBe('Truck 4 logged 26.5 t spread from 20.0 t loaded');
  });
});
