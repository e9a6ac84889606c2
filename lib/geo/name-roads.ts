/** What naming needs of a segment. */
export interface Nameable {
  name: string;
  roadClass: string;
  fromNode: number;
  toNode: number;
}

/**
 * A name to show for every segment: its own, or, without one, a description by the road it leaves: `Unnamed, off
 * Kulmbacher Straße`; where no neighbour has a name, `Unnamed residential road`. The neighbour with the alphabetically
 * first name is taken, so that the same file always gives the same names.
 */
export function nameRoads(segments: readonly Nameable[]): string[] {
  const namesAt = new Map<number, string>();
  for (const { name, fromNode, toNode } of segments) {
    if (name === '') continue;
    for (const node of [fromNode, toNode]) {
      const other = namesAt.get(node);
      if (other === undefined || name < other) namesAt.set(node, name);
    }
  }
  return segments.map(({ name, roadClass, fromNode, toNode }) => {
    if (name !== '') return name;
    const neighbour = [namesAt.get(fromNode), namesAt.get(toNode)].filter((found) => found !== undefined).sort()[0];
    return neighbour === undefined ? `Unnamed ${describeClass(roadClass)}` : `Unnamed, off ${neighbour}`;
  });
}

/** A road class in words: `motorway_link` is `motorway ramp`, `residential` is `residential road`. */
export function describeClass(roadClass: string): string {
  if (roadClass === 'no class' || roadClass === 'road' || roadClass === 'unclassified') return 'minor road';
  const words = roadClass.replace(/_link$/, ' ramp').replaceAll('_', ' ');
  return /(way|ramp|street|track|path|road|steps)$/.test(words) ? words : `${words} road`;
}
