import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { collectMoves } from "../order/collectMoves";
import type { PartModel } from "../part/partModel";

/** A typed order as masks, one a stroke; or what is wrong with it. */
export function readOrder(part: PartModel, order: readonly string[]): Result<readonly number[], readonly FieldProblem[]> {
  const moves = collectMoves(part);
  const known = part.bends.map(({ id }) => id).join(", ");
  const problems: FieldProblem[] = [];
  const masks: number[] = [];
  let formed = 0;
  order.forEach((entry, index) => {
    const path = `order[${index}]`;
    let mask = 0;
    for (const id of entry.split("+").map((part) => part.trim())) {
      const bend = part.bends.findIndex((candidate) => candidate.id === id);
      if (bend < 0) problems.push({ path, message: `"${id}" is not a bend of ${part.name}; it has ${known}` });
      else if ((formed | mask) & (1 << bend)) problems.push({ path, message: `bend ${id} is in the order twice` });
      else mask |= 1 << bend;
    }
    if (mask !== 0 && problems.length === 0 && !moves.some((move) => move.mask === mask)) problems.push({ path, message: `${entry} is not one stroke: only bends on one line of one face, alike, are formed together` });
    formed |= mask;
    masks.push(mask);
  });
  const missing = part.bends.filter((_, bend) => !(formed & (1 << bend))).map(({ id }) => id);
  if (missing.length > 0 && problems.length === 0) problems.push({ path: "order", message: `the order leaves out ${missing.join(", ")}; every bend is made once` });
  return problems.length > 0 ? fail(problems) : ok(masks);
}
