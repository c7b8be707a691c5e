import type { FieldProblem } from "../core/problem";
import { ok, type Result } from "../core/result";
import { mm, mmPer } from "../core/units";
import type { MaterialLookup } from "../handbook/material";
import { buildPart } from "../part/buildPart";
import type { PartDocument } from "../part/partDocument";
import type { PartModel } from "../part/partModel";
import { hitId } from "../strokes/hitId";
import { sameEdge } from "../strokes/sameEdge";
import { splitBends } from "../strokes/splitBends";
import type { PlanDocument, PlanStep } from "./planDocument";
import { plannedBends } from "./plannedBends";

/** The part as a plan bends it: its own radii and allowances, and every stroke a bend of its own. */
export interface PlannedPart {
  readonly part: PartModel;
  /** As it was drawn: the same where every bend takes one stroke. */
  readonly drawn: PartModel;
  /** Indices in `part`: the bends of a step, the face in front, the face that is gauged and its edge; -1 where the step names none of the part's. */
  readonly places: (step: PlanStep) => { readonly bends: readonly number[]; readonly front: number; readonly gaugeFace: number; readonly gaugeEdge: number };
}

export function plannedPart(document: PartDocument, materials: MaterialLookup, plan: Pick<PlanDocument, "flat" | "units" | "splits">): Result<PlannedPart, readonly FieldProblem[]> {
  const built = buildPart(document, { materials, ...plannedBends(plan) });
  if (!built.ok) return built;
  const drawn = built.value;
  const { part } = splitBends(drawn, (plan.splits ?? []).map((split) => ({ ...split, allowance: mm(split.allowance * mmPer(plan.units)) })));
  return ok({ part, drawn, places: (step) => places(part, drawn, step) });
}

function places(part: PartModel, drawn: PartModel, step: PlanStep) {
  const bends = step.bends.map((id) => part.bends.findIndex((bend) => bend.id === (step.hit ? hitId(id, step.hit.number, step.hit.of) : id)));
  const faceOf = (id: string) => part.faces.findIndex((face) => face.id === id);
  const bend = part.bends[bends[0] ?? -1];
  const drawnBend = drawn.bends.find(({ id }) => id === step.bends[0]);
  const parentInFront = drawnBend !== undefined && drawn.faces[drawnBend.parent]?.id === step.front;
  const gaugeFace = faceOf(step.gauge.face);
  const outline = (of: PartModel) => of.faces.find(({ id }) => id === step.gauge.face)?.outline ?? [];
  return {
    bends,
    front: step.hit === undefined || bend === undefined ? faceOf(step.front) : parentInFront ? bend.parent : bend.child,
    gaugeFace,
    gaugeEdge: part === drawn ? step.gauge.edge : sameEdge(outline(drawn), step.gauge.edge, outline(part)),
  };
}
