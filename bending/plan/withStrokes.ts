import { MAX_BENDS } from "../order/orderProblem";
import type { PartModel } from "../part/partModel";
import type { BendSplit } from "../strokes/bendSplit";
import { splitBends, type SplitPart } from "../strokes/splitBends";
import { splitsFor } from "../strokes/splitsFor";
import type { PlanRequest } from "./planRequest";

/** A part as it is bent: every stroke a bend of its own where several make one. */
export interface StruckPart extends SplitPart {
  /** As it was drawn. */
  readonly drawn: PartModel;
  readonly splits: readonly BendSplit[];
}

/** Splits the bends that the dies of this machine make in steps only. */
export function withStrokes(drawn: PartModel, { tools, machine }: Pick<PlanRequest, "tools" | "machine">): StruckPart {
  const splits = splitsFor(drawn, tools.filter(({ kind, tang }) => kind !== "die" || tang === machine.dieTang), MAX_BENDS);
  return { ...splitBends(drawn, splits), drawn, splits };
}
