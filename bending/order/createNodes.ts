/** The nodes of a search as columns, with a queue over them: least total first, of equal totals the deepest, of those the first made. */
export interface Nodes {
  readonly add: (node: SearchNode, total: number) => number;
  /** Takes the next node from the queue; -1 when it is empty. */
  readonly take: () => number;
  /** Puts a node back with another total. */
  readonly again: (node: number, total: number) => void;
  readonly set: (node: number, weight: number, gauge: number, demerits: number) => void;
  readonly total: (node: number) => number;
  readonly get: (node: number) => SearchNode;
  /** Nodes made so far. */
  readonly count: () => number;
}

export interface SearchNode {
  /** The bends formed before the step. */
  readonly formed: number;
  readonly move: number;
  readonly station: number;
  /** Gauge setting of the step, `UNASKED` before the problem was asked. */
  readonly gauge: number;
  /** Weight of the step and all later ones. */
  readonly weight: number;
  readonly demerits: number;
  /** How many steps follow. */
  readonly depth: number;
  /** The step that follows, -1 for the last. */
  readonly after: number;
}

export const UNASKED = -2;
/** Seconds; two totals nearer than this are equal: over rounding noise, under anything a clock shows. */
export const SAME_SECONDS = 1e-7;

export function createNodes(): Nodes {
  let room = 1024;
  let count = 0;
  let [weights, totals] = [new Float64Array(room), new Float64Array(room)];
  let [formed, moves, gauges, demerits, afters] = [new Int32Array(room), new Int32Array(room), new Int32Array(room), new Int32Array(room), new Int32Array(room)];
  let [stations, depths] = [new Uint8Array(room), new Uint8Array(room)];
  let heap = new Int32Array(room);
  let waiting = 0;
  const grow = () => {
    room *= 2;
    const longer = <T extends Float64Array | Int32Array | Uint8Array>(made: T, old: T): T => { made.set(old); return made; };
    [weights, totals] = [longer(new Float64Array(room), weights), longer(new Float64Array(room), totals)];
    [formed, moves, gauges] = [longer(new Int32Array(room), formed), longer(new Int32Array(room), moves), longer(new Int32Array(room), gauges)];
    [demerits, afters, heap] = [longer(new Int32Array(room), demerits), longer(new Int32Array(room), afters), longer(new Int32Array(room), heap)];
    [stations, depths] = [longer(new Uint8Array(room), stations), longer(new Uint8Array(room), depths)];
  };
  const sooner = (a: number, b: number): boolean => {
    const apart = (totals[a] as number) - (totals[b] as number);
    if (Math.abs(apart) > SAME_SECONDS) return apart < 0;
    const deeper = (depths[a] as number) - (depths[b] as number);
    return deeper !== 0 ? deeper > 0 : a < b;
  };
  const push = (node: number) => {
    let at = waiting;
    waiting += 1;
    while (at > 0) {
      const up = (at - 1) >> 1;
      const above = heap[up] as number;
      if (!sooner(node, above)) break;
      heap[at] = above;
      at = up;
    }
    heap[at] = node;
  };
  return {
    count: () => count,
    add: (node, total) => {
      if (count === room) grow();
      const at = count;
      count += 1;
      weights[at] = node.weight;
      totals[at] = total;
      formed[at] = node.formed;
      moves[at] = node.move;
      gauges[at] = node.gauge;
      demerits[at] = node.demerits;
      afters[at] = node.after;
      stations[at] = node.station;
      depths[at] = node.depth;
      push(at);
      return at;
    },
    take: () => {
      if (waiting === 0) return -1;
      const first = heap[0] as number;
      waiting -= 1;
      const node = heap[waiting] as number;
      let at = 0;
      for (;;) {
        let down = 2 * at + 1;
        if (down >= waiting) break;
        if (down + 1 < waiting && sooner(heap[down + 1] as number, heap[down] as number)) down += 1;
        if (!sooner(heap[down] as number, node)) break;
        heap[at] = heap[down] as number;
        at = down;
      }
      heap[at] = node;
      return first;
    },
    again: (node, total) => {
      totals[node] = total;
      push(node);
    },
    set: (node, weight, gauge, unmet) => {
      weights[node] = weight;
      gauges[node] = gauge;
      demerits[node] = unmet;
    },
    total: (node) => totals[node] as number,
    get: (node) => ({
      formed: formed[node] as number, move: moves[node] as number, station: stations[node] as number, gauge: gauges[node] as number,
      weight: weights[node] as number, demerits: demerits[node] as number, depth: depths[node] as number, after: afters[node] as number,
    }),
  };
}
