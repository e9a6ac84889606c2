/** The parts of a ledger that its file holds. */
interface LedgerFile {
  stormNumber: number;
  runs: readonly {
    runId: string;
    routeName: string | null;
    truckNumber: number;
    driverName: string;
    passNumber: number | null;
  }[];
  roads: readonly {
    runId: string;
    segmentId: number;
    roadName: string;
    serviceClass: string;
    outcome: string;
    recommendedMaterialName: string | null;
    recommendedRateGPerM2: number | null;
    recommendedKg: number;
    materialName: string | null;
    rateGPerM2: number | null;
    spreadKg: number;
    areaM2: number;
    spreadAt: string;
    recordedAt: string;
    isAmendment: boolean;
    note: string;
  }[];
}

const header = [
  'storm',
  'pass',
  'route',
  'truck',
  'driver',
  'run',
  'segment',
  'road',
  'service_class',
  'outcome',
  'recommended_material',
  'recommended_g_per_m2',
  'recommended_kg',
  'spread_material',
  'spread_g_per_m2',
  'spread_kg',
  'difference_kg',
  'area_m2',
  'spread_at_utc',
  'recorded_at_utc',
  'amendment',
  'note',
];

/** The ledger as RFC 4180 text: a row a road, SI units named in the header, times in UTC. */
export function ledgerCsv(ledger: LedgerFile): string {
  const runs = new Map(ledger.runs.map((run) => [run.runId, run]));
  const rows = ledger.roads.map((road) => {
    const run = runs.get(road.runId);
    return [
      ledger.stormNumber,
      run?.passNumber,
      run?.routeName,
      run?.truckNumber,
      run?.driverName,
      road.runId,
      road.segmentId,
      road.roadName,
      road.serviceClass,
      road.outcome,
      road.recommendedMaterialName,
      fixed(road.recommendedRateGPerM2),
      fixed(road.recommendedKg),
      road.materialName,
      fixed(road.rateGPerM2),
      fixed(road.spreadKg),
      fixed(road.spreadKg - road.recommendedKg),
      fixed(road.areaM2),
      road.spreadAt,
      road.recordedAt,
      road.isAmendment ? 'yes' : 'no',
      road.note,
    ];
  });
  return [header, ...rows].map((row) => row.map(cell).join(',')).join('\r\n') + '\r\n';
}

function fixed(value: number | null): string | null {
  return value === null ? null : String(Math.round(value * 100) / 100);
}

/** Quoted where RFC 4180 asks for it; text that a spreadsheet would run as a formula gets an apostrophe. */
function cell(value: string | number | null | undefined): string {
  if (value === null || value === undefined) return '';
  if (typeof value === 'number') return String(value);
  const isNumber = /^-?\d+(\.\d+)?$/.test(value);
  const safe = !isNumber && /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
