/** A graph of segments for the questions of connection: ends by node number. */
export interface Arc {
  from: number;
  to: number;
  isOneWay: boolean;
}

/**
 * For every node the number of the part it belongs to, whatever the one-way directions (weakly connected
 * components). Parts are numbered from 0 in the order of their first node.
 */
export function findParts(nodeCount: number, arcs: readonly Arc[]): Int32Array {
  const parent = Int32Array.from({ length: nodeCount }, (_, node) => node);
  const rootOf = (node: number): number => {
    let root = node;
    while (parent[root] !== root) root = parent[root] ?? root;
    for (let at = node; at !== root;) {
      const next = parent[at] ?? root;
      parent[at] = root;
      at = next;
    }
    return root;
  };
  for (const { from, to } of arcs) parent[rootOf(from)] = rootOf(to);
  const numbers = new Map<number, number>();
  return parent.map((_, node) => {
    const root = rootOf(node);
    const part = numbers.get(root) ?? numbers.size;
    numbers.set(root, part);
    return part;
  });
}

interface Adjacency {
  starts: Int32Array;
  heads: Int32Array;
}

function adjacency(nodeCount: number, arcs: readonly Arc[], isBackwards: boolean): Adjacency {
  const directed = arcs.flatMap(({ from, to, isOneWay }): [number, number][] => {
    const along: [number, number] = isBackwards ? [to, from] : [from, to];
    return isOneWay ? [along] : [along, [along[1], along[0]]];
  });
  const starts = new Int32Array(nodeCount + 1);
  for (const [tail] of directed) starts[tail + 1] = (starts[tail + 1] ?? 0) + 1;
  for (let node = 0; node < nodeCount; node += 1) starts[node + 1] = (starts[node + 1] ?? 0) + (starts[node] ?? 0);
  const next = starts.slice();
  const heads = new Int32Array(directed.length);
  for (const [tail, head] of directed) {
    const place = next[tail] ?? 0;
    heads[place] = head;
    next[tail] = place + 1;
  }
  return { starts, heads };
}

/** Every node that can be driven to from the start nodes, as 1 in the answer. */
function reachFrom(roots: readonly number[], { starts, heads }: Adjacency): Uint8Array {
  const isReached = new Uint8Array(starts.length - 1);
  const open = [...roots];
  for (const root of roots) isReached[root] = 1;
  for (let node = open.pop(); node !== undefined; node = open.pop()) {
    for (let at = starts[node] ?? 0; at < (starts[node + 1] ?? 0); at += 1) {
      const head = heads[at] ?? 0;
      if (isReached[head] === 1) continue;
      isReached[head] = 1;
      open.push(head);
    }
  }
  return isReached;
}

/**
 * The number of each node's circle of mutual reach along the one-way directions (strongly connected components,
 * Kosaraju's two sweeps, without recursion). Two nodes share a number when a truck can go from each to the other.
 */
export function findRounds(nodeCount: number, arcs: readonly Arc[]): Int32Array {
  const order = finishOrder(nodeCount, adjacency(nodeCount, arcs, false));
  const { starts, heads } = adjacency(nodeCount, arcs, true);
  const round = new Int32Array(nodeCount).fill(-1);
  let rounds = 0;
  for (let at = order.length - 1; at >= 0; at -= 1) {
    const root = order[at] ?? 0;
    if (round[root] !== -1) continue;
    const open = [root];
    round[root] = rounds;
    for (let node = open.pop(); node !== undefined; node = open.pop()) {
      for (let arc = starts[node] ?? 0; arc < (starts[node + 1] ?? 0); arc += 1) {
        const head = heads[arc] ?? 0;
        if (round[head] !== -1) continue;
        round[head] = rounds;
        open.push(head);
      }
    }
    rounds += 1;
  }
  return round;
}

function finishOrder(nodeCount: number, { starts, heads }: Adjacency): Int32Array {
  const order = new Int32Array(nodeCount);
  let finished = 0;
  const isSeen = new Uint8Array(nodeCount);
  const nextArc = starts.slice(0, nodeCount);
  for (let root = 0; root < nodeCount; root += 1) {
    if (isSeen[root] === 1) continue;
    const path = [root];
    isSeen[root] = 1;
    while (path.length > 0) {
      const node = path.at(-1) ?? 0;
      const arc = nextArc[node] ?? 0;
      if (arc < (starts[node + 1] ?? 0)) {
        nextArc[node] = arc + 1;
        const head = heads[arc] ?? 0;
        if (isSeen[head] === 1) continue;
        isSeen[head] = 1;
        path.push(head);
      } else {
        order[finished] = node;
        finished += 1;
        path.pop();
      }
    }
  }
  return order;
}

/** How a node stands to the core, the largest circle of mutual reach of its part. */
export type Reach = 'core' | 'no-way-out' | 'no-way-in' | 'through-only';

/**
 * For every node: whether it belongs to the core of its part; can be reached from it but not left towards it
 * (`no-way-out`); only left (`no-way-in`); or neither (`through-only`, as a carriageway that passes by).
 */
export function findReach(nodeCount: number, arcs: readonly Arc[]): Reach[] {
  const parts = findParts(nodeCount, arcs);
  const rounds = findRounds(nodeCount, arcs);
  // parts do not touch, so one sweep from all their cores at once does for each of them
  const roots = coreRoots(parts, rounds);
  const isReached = reachFrom(roots, adjacency(nodeCount, arcs, false));
  const isLeaving = reachFrom(roots, adjacency(nodeCount, arcs, true));
  return Array.from({ length: nodeCount }, (_, node): Reach => {
    if (isReached[node] === 1) return isLeaving[node] === 1 ? 'core' : 'no-way-out';
    return isLeaving[node] === 1 ? 'no-way-in' : 'through-only';
  });
}

/** One node of the largest round of each part. */
function coreRoots(parts: Int32Array, rounds: Int32Array): number[] {
  const sizes = new Map<number, number>();
  for (const round of rounds) sizes.set(round, (sizes.get(round) ?? 0) + 1);
  const best = new Map<number, number>();
  parts.forEach((part, node) => {
    const current = best.get(part);
    const size = sizes.get(rounds[node] ?? 0) ?? 0;
    if (current === undefined || size > (sizes.get(rounds[current] ?? 0) ?? 0)) best.set(part, node);
  });
  return [...best.values()];
}
