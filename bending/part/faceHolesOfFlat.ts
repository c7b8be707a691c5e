import type { FieldProblem } from "../core/problem";
import type { Vec2 } from "../geometry/vec2";
import { holeAsChords } from "./holeAsChords";
import { holeWithin, holesMeet } from "./holeWithin";
import type { DocumentHole } from "./partDocument";

/** The holes of a drawn flat, sorted to the faces that they lie in; a hole across a bend lies in none. */
export function faceHolesOfFlat(holes: readonly DocumentHole[] | undefined, faces: readonly (readonly Vec2[])[]): {
  readonly byFace: readonly (readonly (readonly Vec2[])[])[];
  readonly problems: readonly FieldProblem[];
} {
  const byFace = faces.map((): (readonly Vec2[])[] => []);
  const problems: FieldProblem[] = [];
  const seen: (readonly Vec2[])[] = [];
  (holes ?? []).forEach((entry, i) => {
    const hole = holeAsChords(entry);
    const face = faces.findIndex((outline) => holeWithin(hole, outline));
    const other = seen.findIndex((earlier) => holesMeet(earlier, hole));
    if (face < 0) problems.push({ path: `flat.holes[${i}]`, message: "the hole must lie in one face: it reaches into a bend or over the outline" });
    else if (other >= 0) problems.push({ path: `flat.holes[${i}]`, message: `the hole overlaps flat.holes[${other}]` });
    else byFace[face]?.push(hole);
    seen.push(hole);
  });
  return { byFace, problems };
}
