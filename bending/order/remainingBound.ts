import { handlingSeconds } from "./handlingSeconds";
import type { OrderProblem } from "./orderProblem";
import type { Pose } from "./pose";

/**
 * Least seconds that the bends not yet formed can take, whatever their order: as few strokes as the moves
 * allow, one flip when a bend of the other side is left, one turn for every other axis that is left.
 * Each term counts something that no order can avoid and no two count the same, so it is a bound from below;
 * a move lowers it by at most its own seconds, so it is consistent too. Handling takes as long either way, so the same
 * holds of bends made before a pose as of bends left after it.
 */
export function remainingBound(problem: OrderProblem): (remaining: number, pose: Pose | null) => number {
  const { times } = problem;
  const up = unionOf(problem, (pose) => pose.up === 1);
  const down = unionOf(problem, (pose) => pose.up === -1);
  const axes = axesOf(problem);
  const groups = lineGroups(problem);
  const turn = handlingSeconds({ flip: false, turn: 90 }, times);
  return (remaining, pose) => {
    let strokes = 0;
    for (const group of groups) if (group.mask & remaining) strokes += group.strokes;
    const sides = (remaining & up ? 1 : 0) + (remaining & down ? 1 : 0);
    const sideSeen = pose !== null && remaining & (pose.up === 1 ? up : down) ? 1 : 0;
    const flips = pose === null ? Math.max(0, sides - 1) : sides - sideSeen;
    let others = 0;
    for (const axis of axes) if (axis.mask & remaining && (pose === null || axisOf(pose) !== axis.key)) others += 1;
    if (pose === null) others = Math.max(0, others - 1);
    return strokes * times.stroke + flips * times.flip + others * turn;
  };
}

const axisOf = (pose: Pose): number => {
  const half = (pose.heading * 180) / Math.PI;
  return Math.round((((half % 180) + 180) % 180) * 10) % 1800;
};

/** Bends all of whose moves have such a pose. */
function unionOf(problem: OrderProblem, which: (pose: Pose) => boolean): number {
  const others = problem.moves.reduce((mask, move) => (which(move.pose) ? mask : mask | move.mask), 0);
  return problem.moves.reduce((mask, move) => mask | move.mask, 0) & ~others;
}

/** Bends by the axis of their moves; a bend with moves of several axes counts for none. */
function axesOf(problem: OrderProblem): readonly { readonly key: number; readonly mask: number }[] {
  const keyOfBend = new Map<number, number | null>();
  for (const move of problem.moves) {
    for (let bend = 0; bend < problem.bends; bend += 1) {
      if (!(move.mask & (1 << bend))) continue;
      const key = axisOf(move.pose);
      const known = keyOfBend.get(bend);
      keyOfBend.set(bend, known === undefined || known === key ? key : null);
    }
  }
  const masks = new Map<number, number>();
  for (const [bend, key] of keyOfBend) if (key !== null) masks.set(key, (masks.get(key) ?? 0) | (1 << bend));
  return [...masks].map(([key, mask]) => ({ key, mask }));
}

interface LineGroup { readonly mask: number; readonly strokes: number }

/** Bends that may share a stroke, joined; each group needs at least the strokes of its quickest move. */
function lineGroups(problem: OrderProblem): readonly LineGroup[] {
  let groups: LineGroup[] = [];
  for (const { mask, strokes = 1 } of problem.moves) {
    const own = groups.filter((group) => group.mask & mask);
    const joined = own.reduce((all, group) => ({ mask: all.mask | group.mask, strokes: Math.min(all.strokes, group.strokes) }), { mask, strokes });
    groups = [...groups.filter((group) => !(group.mask & mask)), joined];
  }
  return groups;
}
