import { mm, rad, type Mm } from "../core/units";
import { FORCE_V_RANGE } from "../handbook/airBendForce";
import { bendAllowance } from "../handbook/bendAllowance";
import { naturalRadius } from "../handbook/naturalRadius";
import type { Bend, PartModel } from "../part/partModel";
import type { Die, Tool } from "../tooling/tool";
import type { BendSplit } from "./bendSplit";
import { levelNeeded } from "./levelNeeded";
import { canSplit } from "./splitBends";

/** A radius over so many times what the widest V gives is made in steps. Common practice, no source. */
const BEYOND_RATIO = 1.5;
/** Radians (20 degrees). A coarser step is no radius any more. Common practice, no source. */
const COARSEST_STEP = Math.PI / 9;

/**
 * Bends whose radius no V in service gives by itself, and the strokes that make each: as many as keep the die's shoulders
 * on the plane strip between two of them (a V of about twice the pitch, MetalForming Magazine), on the narrowest V that suits the thickness.
 * `most`: bends that the part may have in the end, all strokes counted.
 */
export function splitsFor(part: PartModel, tools: readonly Tool[], most: number): readonly BendSplit[] {
  const suits = (v: number) => v >= FORCE_V_RANGE[0] * part.thickness - 1e-9 && v <= FORCE_V_RANGE[1] * part.thickness + 1e-9;
  const dies = tools.filter((tool): tool is Die => tool.kind === "die" && tool.pieces.length > 0 && suits(tool.vOpening)).sort((a, b) => a.vOpening - b.vOpening);
  const [narrow, wide] = [dies[0], dies[dies.length - 1]];
  if (narrow === undefined || wide === undefined) return [];
  const large = part.bends.filter((bend) => bend.radiusSource === "document" && bend.insideRadius > BEYOND_RATIO * naturalRadius(part.material, wide.vOpening) && canSplit(part, bend));
  const each = large.length === 0 ? 0 : Math.floor((most - part.bends.length + large.length) / large.length);
  return large.flatMap((bend) => splitOf(part, bend, narrow, each) ?? []);
}

/** The finest split that a die can make; null when it is too coarse for a radius. */
function splitOf(part: PartModel, bend: Bend, die: Die, most: number): BendSplit | null {
  const radius = naturalRadius(part.material, die.vOpening);
  for (let hits = most; hits >= 2 && bend.angle / hits <= COARSEST_STEP; hits -= 1) {
    const angle = rad(bend.angle / hits);
    const allowance = bendAllowance(angle, radius, bend.k, part.thickness);
    const beside: Mm = mm(bend.allowance / hits - allowance / 2);
    if (beside >= levelNeeded({ angle, insideRadius: radius, allowance }, part.thickness, die)) return { bend: bend.id, hits, allowance };
  }
  return null;
}
