import type { FaceRole, LeftOut } from "./recognisedPart";
import type { Solid } from "./solid";
import type { SolidTopology } from "./solidTopology";

/** Faces listed by number in a message; the rest is counted. */
const MOST_NUMBERS = 12;

/** What was not understood, in groups of neighbouring faces, each named with its face numbers (from 1). */
export function describeLeftOut(solid: Solid, topology: SolidTopology, roles: readonly FaceRole[]): readonly LeftOut[] {
  const seen = new Set<number>();
  const groups: LeftOut[] = [];
  roles.forEach((role, start) => {
    if (role !== "left out" || seen.has(start)) return;
    const group = [start];
    seen.add(start);
    for (let i = 0; i < group.length; i += 1) {
      for (const { edge } of topology.around[group[i] ?? -1] ?? []) {
        for (const next of topology.facesOf[edge] ?? []) {
          if (roles[next] !== "left out" || seen.has(next)) continue;
          seen.add(next);
          group.push(next);
        }
      }
    }
    group.sort((a, b) => a - b);
    groups.push({ faces: group, message: `${numbers(group)}: ${whatItIs(solid, group)}` });
  });
  return groups;
}

function numbers(faces: readonly number[]): string {
  const listed = faces.slice(0, MOST_NUMBERS).map((face) => face + 1).join(", ");
  return `${faces.length === 1 ? "Face" : "Faces"} ${listed}${faces.length > MOST_NUMBERS ? ` and ${faces.length - MOST_NUMBERS} more` : ""}`;
}

function whatItIs(solid: Solid, faces: readonly number[]): string {
  const kinds = faces.map((face) => solid.faces[face]?.surface).flatMap((surface) => (surface ? [surface.kind === "other" ? surface.name : surface.kind] : []));
  if (kinds.includes("cone")) return "a cone, such as a countersink, a chamfer or a rolled cone";
  if (kinds.every((kind) => kind === "plane")) return "plane faces that are neither a side of the sheet nor square to it: another thickness, a bevel, a second sheet or a pressed shape";
  if (kinds.some((kind) => kind !== "plane" && kind !== "cylinder")) return `a pressed, rounded or free-form shape (${[...new Set(kinds)].join(", ")})`;
  return "round faces that are neither a bend of this thickness nor a hole through the sheet, such as a stud, a thread, a bead or a rounded edge";
}
