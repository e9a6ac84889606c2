import { type AssumedAttribute } from '@/lib/geo/network';
import { type NetworkImportRow, type RoadChange } from '@/lib/contracts/network';
import { formatNumber } from '@/lib/units/format';

export const attributeWords: Readonly<Record<AssumedAttribute, string>> = {
  name: 'name',
  roadClass: 'road class',
  lanes: 'lanes',
  widthM: 'width',
  speedKmPerH: 'speed',
  surface: 'surface',
  isOneWay: 'direction',
  exposure: 'exposure',
};

/** Where a value comes from when the file is silent. */
export const assumedFrom: Readonly<Record<AssumedAttribute, string>> = {
  name: 'named after the road it leaves',
  roadClass: 'taken as a minor road',
  lanes: 'from the class and direction',
  widthM: 'lanes times the lane width of the class',
  speedKmPerH: 'usual for the class',
  surface: 'usual for the class',
  isOneWay: 'one-way, as the class implies',
  exposure: 'open, until set by hand',
};

export const changeWords: Readonly<Record<RoadChange, string>> = {
  added: 'new',
  changed: 'changed',
  same: 'as it is',
  retired: 'taken out of use',
};

export const stateWords: Readonly<Record<NetworkImportRow['state'], string>> = {
  previewed: 'not saved yet',
  applied: 'saved',
  undone: 'undone',
  discarded: 'discarded',
};

/** `1 road`, `1 028 roads`. */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${formatNumber(count, 0)} ${count === 1 ? one : many}`;
}

/** A road class as people say it: `motorway_link` is `motorway link`. */
export function classWords(roadClass: string): string {
  return roadClass.replaceAll('_', ' ');
}

export function isAssumedAttribute(name: string): name is AssumedAttribute {
  return name in attributeWords;
}
