import type { FieldProblem } from "../core/problem";
import { EMPTY_AREA_MM2, SAME_POINT_MM } from "../core/tolerance";
import type { LengthUnit } from "../core/units";
import { selfCrossing } from "../geometry/selfCrossing";
import { signedArea } from "../geometry/signedArea";
import { formatLength } from "../core/formatLength";
import { outlineAsChords } from "./outlineAsChords";
import type { DocumentVertex } from "./partDocument";

/** What is wrong with a drawn outline (given in mm); the first thing only, as the rest follows from it. */
export function checkOutline(outline: readonly DocumentVertex[], path: string, units: LengthUnit): FieldProblem | null {
  for (const [k, vertex] of outline.entries()) {
    const next = outline[(k + 1) % outline.length] ?? vertex;
    if (Math.hypot(next[0] - vertex[0], next[1] - vertex[1]) <= SAME_POINT_MM) {
      return { path: `${path}[${k}]`, message: `edge ${k} has no length: vertices ${k} and ${(k + 1) % outline.length} are the same point; leave one out (the outline closes by itself)` };
    }
    if (Math.abs(vertex[2] ?? 0) > 1000) return { path: `${path}[${k}]`, message: "the bulge must lie between -1000 and 1000 (it is the tangent of a quarter of the arc's angle)" };
  }
  const chords = outlineAsChords(outline);
  const crossing = selfCrossing(chords.points);
  if (crossing) {
    const [a, b] = crossing.edges.map((i) => chords.edgeOf[i] ?? 0);
    const at = crossing.at.map((value) => formatLength(value, units)).join(", ");
    return { path, message: a === b ? `edge ${a} crosses itself at ${at}` : `edges ${a} and ${b} cross or touch at ${at}; the outline must not cross itself` };
  }
  const area = signedArea(chords.points);
  if (Math.abs(area) <= EMPTY_AREA_MM2) return { path, message: "the outline encloses no area" };
  if (area < 0) return { path, message: "the outline runs clockwise; list its vertices counter-clockwise, as seen from the top" };
  return null;
}
