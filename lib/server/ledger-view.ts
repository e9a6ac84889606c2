import { differenceInCalendarDays } from 'date-fns';
import { findAgency } from '@/db/queries/agency';
import { listLedgerEntries, type LedgerEntryRecord } from '@/db/queries/ledger';
import { listMaterials } from '@/db/queries/materials';
import { listRunHeads, type RunHead } from '@/db/queries/runs';
import { findStormRow } from '@/db/queries/storms';
import { type LedgerRoad, type LedgerRun, type LedgerView } from '@/lib/contracts/ledger';
import { accountFor, massKg, medianRate, type LedgerMaterial } from '@/lib/ledger/account';
import { notesFor } from '@/lib/ledger/notes';
import { Problem } from '@/lib/problem';

type Materials = ReadonlyMap<number, LedgerMaterial & { form: string; densityKgPerM3: number }>;

/** A storm's ledger: recommended beside spread by run and road, the totals, and what needs a look. */
export async function readLedger(stormId: number): Promise<LedgerView> {
  const storm = await findStormRow({ id: stormId });
  if (!storm) throw new Problem('not-found', { what: 'storm' });
  const [entries, heads, materialRows, agency] = await Promise.all([
    listLedgerEntries({ stormId }),
    listRunHeads({ stormId }),
    listMaterials(),
    findAgency(),
  ]);
  const materials: Materials = new Map(materialRows.map((material) => [material.id, material]));
  const runs = heads.map((head) => runOf(head, entriesOf(entries, head.id), materials));
  return {
    stormId,
    stormNumber: storm.number,
    stormName: storm.name,
    fromAt: storm.fromAt.toISOString(),
    untilAt: storm.untilAt.toISOString(),
    isClosed: storm.closedAt !== null,
    currency: agency.currency,
    total: accountFor(entries, materials),
    laneKm: laneKmOf(entries),
    brineL: brineOf(entries, materials),
    runs,
    roads: entries.map(roadOf),
    notes: notesFor(heads.map((head, index) => factsOf(head, runs[index]?.account ?? accountFor([], materials)))),
  };
}

const entriesOf = (entries: LedgerEntryRecord[], runId: string) => entries.filter((entry) => entry.runId === runId);

function runOf(head: RunHead, entries: LedgerEntryRecord[], materials: Materials): LedgerRun {
  return {
    runId: head.id,
    routeName: head.routeName,
    passNumber: head.passNumber,
    truckNumber: head.truckNumber,
    driverName: head.driverName,
    startedAt: head.startedAt.toISOString(),
    finishedAt: head.finishedAt?.toISOString() ?? null,
    roadsTotal: head.roadsTotal,
    roadsDone: head.roadsDone,
    loadedKg: head.loadedKg,
    medianRateGPerM2: medianRate(
      entries.flatMap((entry) => (entry.outcome === 'spread' && entry.rateGPerM2 !== null ? [entry.rateGPerM2] : [])),
    ),
    account: accountFor(entries, materials),
  };
}

function roadOf(entry: LedgerEntryRecord): LedgerRoad {
  return {
    ...entry,
    spreadKg: entry.outcome === 'spread' ? massKg(entry.rateGPerM2, entry.areaM2) : 0,
    recommendedKg: massKg(entry.recommendedRateGPerM2, entry.areaM2),
    spreadAt: entry.spreadAt.toISOString(),
    recordedAt: entry.recordedAt.toISOString(),
    isAmendment: entry.amendsId !== null,
  };
}

function factsOf(head: RunHead, account: ReturnType<typeof accountFor>) {
  return {
    ...head,
    isFinished: head.finishedAt !== null,
    calibrationAgeDays: head.calibratedOn
      ? differenceInCalendarDays(head.startedAt, new Date(head.calibratedOn))
      : null,
    account,
  };
}

function laneKmOf(entries: LedgerEntryRecord[]): number {
  const treated = entries.filter((entry) => entry.outcome !== 'skipped');
  return treated.reduce((sum, entry) => sum + (entry.lanes * entry.lengthM) / 1000, 0);
}

function brineOf(entries: LedgerEntryRecord[], materials: Materials): number {
  return entries.reduce((litres, entry) => {
    const material = entry.materialId === null ? undefined : materials.get(entry.materialId);
    if (entry.outcome !== 'spread' || material?.form !== 'liquid') return litres;
    return litres + (massKg(entry.rateGPerM2, entry.areaM2) / material.densityKgPerM3) * 1000;
  }, 0);
}
