import 'server-only';
import { compareNetwork, listMissing } from '@/db/queries/network-compare';
import {
  findNetworkImport,
  type NetworkImportDetail,
  type NetworkImportRecord,
  networkOf,
} from '@/db/queries/network-imports';
import {
  MOST_FINDINGS,
  type NetworkImportRow,
  type NetworkImportView,
  type NetworkReportView,
} from '@/lib/contracts/network';
import { type Network, type NetworkReport } from '@/lib/geo/network';
import { type Position } from '@/lib/geo/position';
import { Problem } from '@/lib/problem';

export function presentImport(record: NetworkImportRecord): NetworkImportRow {
  return {
    ...record,
    createdAt: record.createdAt.toISOString(),
    appliedAt: record.appliedAt?.toISOString() ?? null,
    undoneAt: record.undoneAt?.toISOString() ?? null,
  };
}

/** An import with its report, what saving would do, and its roads for the map. */
export async function readNetworkImport(id: number): Promise<NetworkImportView> {
  const detail = await findNetworkImport({ id });
  if (!detail?.payload) throw new Problem('not-found', { what: 'import of roads' });
  const network = networkOf(detail.payload, detail.mapping);
  const roads = detail.state === 'applied' ? savedRoads(network) : await previewedRoads(network, detail);
  const changes = { added: 0, changed: 0, same: 0, retired: 0 };
  for (const { change } of roads) changes[change] += 1;
  return {
    ...presentImport(detail),
    mapping: { ...detail.mapping },
    report: presentReport(network.report),
    changes,
    roads,
  };
}

type Road = NetworkImportView['roads'][number];

function present(segment: Network['segments'][number], change: Road['change']): Road {
  const { sourceId, name, serviceClass, lanes, positions } = segment;
  return { sourceId, name, serviceClass, lanes, change, path: positions.map(turn) };
}

/** GeoJSON's longitude first to the map's latitude first. */
const turn = ([lonDeg, latDeg]: Position): Road['path'][number] => [latDeg, lonDeg];

function savedRoads({ segments }: Network): Road[] {
  return segments.map((segment) => present(segment, 'same'));
}

async function previewedRoads(network: Network, { source }: NetworkImportDetail): Promise<Road[]> {
  const { known } = await compareNetwork(network);
  const missing = await listMissing({ source, keys: network.segments.map(({ sourceKey }) => sourceKey) });
  return [
    ...network.segments.map((segment) => present(segment, known.get(segment.sourceKey) ?? 'added')),
    ...missing.map(({ sourceKey, name, serviceClass, lanes, path }): Road => {
      const { coordinates } = JSON.parse(path) as { coordinates: Position[] };
      return { sourceId: sourceKey, name, serviceClass, lanes, change: 'retired', path: coordinates.map(turn) };
    }),
  ];
}

/** Long lists are cut for the screen; their counts stay whole. */
function presentReport(report: NetworkReport): NetworkReportView {
  const { duplicates, zeroLength, components, traps, warnings, ...rest } = report;
  const firstOf = <T>(list: readonly T[]): T[] => list.slice(0, MOST_FINDINGS);
  return {
    ...rest,
    classes: [...rest.classes],
    duplicateCount: duplicates.length,
    duplicates: firstOf(duplicates).map((finding) => ({ ...finding, differsIn: [...finding.differsIn] })),
    zeroLengthCount: zeroLength.length,
    zeroLength: firstOf(zeroLength),
    componentCount: components.length,
    components: firstOf(components),
    trapCount: traps.length,
    traps: firstOf(traps),
    warningCount: warnings.length,
    warnings: firstOf(warnings).map((warning) => ({ ...warning, sourceIds: [...warning.sourceIds] })),
  };
}
