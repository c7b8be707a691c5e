import { drawnBend, readStrip } from "../strokes/drawnIds";
import { readHitId } from "../strokes/hitId";
import { sameEdge } from "../strokes/sameEdge";
import type { PartModel } from "../part/partModel";
import type { PlanReason, PlanStep } from "./planDocument";

/** A step in the words of the drawn part: bends and faces that were drawn, and which stroke of how many it is. */
export function drawnStep(step: PlanStep, drawn: PartModel, struck: PartModel): PlanStep {
  const first = readHitId(step.bends[0] ?? "");
  const gauged = faceOf(step.gauge.face, drawn, first?.number ?? null);
  const outline = (part: PartModel, face: string) => part.faces.find(({ id }) => id === face)?.outline ?? [];
  return {
    ...step,
    bends: step.bends.map(drawnBend),
    front: faceOf(step.front, drawn, first?.number ?? null),
    ...(first === null ? {} : { hit: { number: first.number, of: first.of } }),
    gauge: { ...step.gauge, face: gauged, edge: gauged === step.gauge.face ? sameEdge(outline(struck, gauged), step.gauge.edge, outline(drawn, gauged)) : 0 },
  };
}

/** A strip belongs to the drawn face on its side of the stroke; seen from no stroke of its row, to the face that the bend carries. */
function faceOf(id: string, drawn: PartModel, number: number | null): string {
  const strip = readStrip(id);
  if (strip === null) return id;
  const bend = drawn.bends.find((one) => one.id === strip.bend);
  const face = number !== null && strip.number < number ? bend?.parent : bend?.child;
  return drawn.faces[face ?? 0]?.id ?? id;
}

/** A reason that names drawn bends and faces only. */
export function drawnReason(reason: PlanReason): PlanReason {
  return { ...reason, bends: [...new Set(reason.bends.map(drawnBend))], faces: [...new Set(reason.faces.map((id) => readStrip(id)?.bend ?? id))] };
}
