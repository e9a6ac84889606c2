import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { ledgerCsv } from './csv';

const road = {
  runId: 'r1',
  segmentId: 12,
  roadName: 'Ridge Road, "summit" cut',
  serviceClass: 'A',
  outcome: 'spread',
  recommendedMaterialName: 'Rock salt',
  recommendedRateGPerM2: 20,
  recommendedKg: 200,
  materialName: 'Rock salt',
  rateGPerM2: 18,
  spreadKg: 180,
  areaM2: 10_000,
  spreadAt: '2026-12-01T02:40:00.000Z',
  recordedAt: '2026-12-01T02:40:05.000Z',
  isAmendment: false,
  note: '=cmd()',
};
const run = { runId: 'r1', routeName: 'Ridge', truckNumber: 4, driverName: 'M. Aldous', passNumber: 3 };

describe('ledger file', () => {
  it('is read back by a CSV reader as it was written, a row a road', () => {
    const text = ledgerCsv({ stormNumber: 7, runs: [run], roads: [road] });
    const { data, errors } = Papa.parse<Record<string, string>>(text.trimEnd(), { header: true });
    expect(errors).toEqual([]);
    expect(data).toHaveLength(1);
    expect(data[0]).toMatchObject({ road: 'Ridge Road, "summit" cut', truck: '4', difference_kg: '-20' });
  });

  it('never hands a spreadsheet a formula', () => {
    expect(ledgerCsv({ stormNumber: 7, runs: [run], roads: [road] })).toContain("'=cmd()");
  });
});
