import { type NetworkReportView } from '@/lib/contracts/network';
import { formatQuantity, type UnitSystem } from '@/lib/units/format';
import { classWords, counted } from './words';

/** Something of the file that wants a look: a sentence, what it means, and where it is. */
export interface Finding {
  key: string;
  what: string;
  meaning: string;
  /** longitude, latitude */
  at: readonly [number, number] | null;
  sourceIds: readonly string[];
}

export interface FindingGroup {
  title: string;
  count: number;
  findings: readonly Finding[];
}

const trapWords: Readonly<Record<NetworkReportView['traps'][number]['kind'], readonly [string, string]>> = {
  'no-way-out': ['no way back', 'A truck can get here, but the one-way directions lead it out of the map.'],
  'no-way-in': ['no way in', 'A truck can leave from here, but no road of the file leads here.'],
  'through-only': ['not tied to the rest', 'The one-way directions lead past the rest of the network.'],
};

/** The report as groups of sentences; empty groups are left out. */
export function findingsOf(report: NetworkReportView, system: UnitSystem): FindingGroup[] {
  const length = (lengthM: number) => {
    const { value, unit } = formatQuantity(lengthM, lengthM < 1000 ? 'shortDistance' : 'distance', system);
    return `${value} ${unit}`;
  };
  const groups: FindingGroup[] = [
    { title: 'Tags and drawing', count: report.warningCount, findings: warningsOf(report) },
    { title: 'Drawn twice', count: report.duplicateCount, findings: duplicatesOf(report, length) },
    { title: 'Without length', count: report.zeroLengthCount, findings: zeroLengthOf(report) },
    { title: 'Cut off from the rest', count: report.componentCount - 1, findings: partsOf(report, length) },
    { title: 'One-way ends', count: report.trapCount, findings: trapsOf(report, length) },
  ];
  return groups.filter(({ count }) => count > 0);
}

type Length = (lengthM: number) => string;

function warningsOf({ warnings }: NetworkReportView): Finding[] {
  return warnings.map(({ sentence, sourceIds, at }, index) => ({
    key: `warning ${index}`,
    what: sentence,
    meaning: '',
    at,
    sourceIds,
  }));
}

function duplicatesOf({ duplicates }: NetworkReportView, length: Length): Finding[] {
  return duplicates.map(({ droppedId, keptId, extent, isReversed, lengthM, differsIn, at }, index) => ({
    key: `duplicate ${index}`,
    what: `${extent === 'whole' ? 'Line' : 'Part of line'} ${droppedId} (${length(lengthM)}) lies on line ${keptId}${isReversed ? ', drawn the other way' : ''}; kept once.`,
    meaning: differsIn.length > 0 ? `The copy that was dropped says otherwise: ${differsIn.join(', ')}.` : '',
    at,
    sourceIds: [keptId],
  }));
}

function zeroLengthOf({ zeroLength }: NetworkReportView): Finding[] {
  return zeroLength.map(({ sourceId, at }, index) => ({
    key: `zero ${index}`,
    what: `Line ${sourceId} has no length and was dropped.`,
    meaning: '',
    at,
    sourceIds: [],
  }));
}

function partsOf({ components }: NetworkReportView, length: Length): Finding[] {
  return components.slice(1).map(({ segments, lengthKm, at }, index) => ({
    key: `part ${index}`,
    what: `${counted(segments, 'road')}, ${length(lengthKm * 1000)}, ${segments === 1 ? 'meets' : 'meet'} no other road.`,
    meaning: '',
    at,
    sourceIds: [],
  }));
}

function trapsOf({ traps }: NetworkReportView, length: Length): Finding[] {
  return traps.map(({ kind, segments, lengthKm, at }, index) => {
    const [what, meaning] = trapWords[kind];
    return {
      key: `trap ${index}`,
      what: `${counted(segments, 'road')}, ${length(lengthKm * 1000)}: ${what}.`,
      meaning,
      at,
      sourceIds: [],
    };
  });
}

/** What of the file did not become a road, in sentences. */
export function leftOutSentences(report: NetworkReportView, system: UnitSystem): string[] {
  const classes = report.classes
    .filter(({ target }) => target === 'leave-out')
    .map(({ roadClass, lines, lengthKm }) => {
      const { value, unit } = formatQuantity(lengthKm * 1000, 'distance', system);
      return `${counted(lines, 'line')} of class “${classWords(roadClass)}” (${value} ${unit})`;
    });
  const skipped = Object.entries(report.skipped).map(([what, count]) => `${counted(count, 'feature')}: ${what}`);
  return [...classes, ...skipped];
}
