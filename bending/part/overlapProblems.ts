import type { FieldProblem } from "../core/problem";
import { flatOverlaps } from "./flatOverlaps";
import type { PartDocument } from "./partDocument";
import type { PartModel } from "./partModel";
import { stepOf } from "./stepOf";

/** Faces that lie over one another in the unfolded sheet, as problems of the document; each pair is told once. */
export function overlapProblems(part: PartModel, document: PartDocument): readonly FieldProblem[] {
  return flatOverlaps(part).map(({ faces: [a, b] }) => {
    const [first, second] = [part.faces[a]?.id ?? "", part.faces[b]?.id ?? ""];
    return { path: pathOf(second, document), message: `"${second}" and "${first}" overlap in the unfolded sheet, so they cannot be cut from one piece; shorten one, inset it (start, end) or taper its sides` };
  });
}

function pathOf(id: string, document: PartDocument): string {
  if (document.flanges) return `flanges[${document.flanges.findIndex((flange) => flange.id === id || (flange.offset !== undefined && stepOf(flange.id) === id))}]`;
  if (document.profile) return `profile.bends[${Number(id.slice(1)) - 1}]`;
  return "flat";
}
