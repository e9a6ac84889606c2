import { type SourceLine } from './network';

const OSM_MARKS = ['osm_id', 'osm_way_id', 'full_id', 'osm_type', '@id'];

/**
 * The notice that the data's licence probably asks for, as a suggestion: OpenStreetMap's where its ids are among the
 * tags, otherwise nothing.
 */
export function suggestAttribution(lines: readonly SourceLine[]): string {
  const isOsm = lines.some(({ tags }) => OSM_MARKS.some((mark) => tags[mark] !== undefined));
  return isOsm ? '© OpenStreetMap contributors, ODbL 1.0' : '';
}
