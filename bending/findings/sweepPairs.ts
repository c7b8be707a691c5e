/** Upright boxes as min x, min y, min z, max x, max y, max z, one after another. */
export type Boxes = Float64Array;

/**
 * Calls `meet` with every pair of boxes (i < j) that come within `within` of one another. Boxes are swept along the axis on which they
 * spread widest for their size, so that few are open at a time; no pair is told twice.
 */
export function sweepPairs(boxes: Boxes, within: number, meet: (i: number, j: number) => void): void {
  const count = boxes.length / 6;
  const axis = widestAxis(boxes, count);
  const low = (i: number) => boxes[6 * i + axis] as number;
  const high = (i: number) => boxes[6 * i + 3 + axis] as number;
  const order = Array.from({ length: count }, (_, i) => i).sort((a, b) => low(a) - low(b));
  let open: number[] = [];
  for (const i of order) {
    const from = low(i) - within;
    open = open.filter((j) => high(j) >= from);
    for (const j of open) if (near(boxes, i, j, within)) meet(Math.min(i, j), Math.max(i, j));
    open.push(i);
  }
}

function near(boxes: Boxes, i: number, j: number, within: number): boolean {
  for (let axis = 0; axis < 3; axis++) {
    if ((boxes[6 * i + axis] as number) > (boxes[6 * j + 3 + axis] as number) + within) return false;
    if ((boxes[6 * j + axis] as number) > (boxes[6 * i + 3 + axis] as number) + within) return false;
  }
  return true;
}

function widestAxis(boxes: Boxes, count: number): number {
  const spread = [0, 1, 2].map((axis) => {
    let [from, to, size] = [Infinity, -Infinity, 0];
    for (let i = 0; i < count; i++) {
      const [a, b] = [boxes[6 * i + axis] as number, boxes[6 * i + 3 + axis] as number];
      from = Math.min(from, a);
      to = Math.max(to, b);
      size += b - a;
    }
    return (to - from) / Math.max(size / Math.max(count, 1), 1e-9);
  });
  return spread.indexOf(Math.max(...spread));
}
