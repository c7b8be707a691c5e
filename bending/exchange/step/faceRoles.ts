import { SOLID_PARALLEL_RAD } from "../../core/tolerance";
import { crossProduct } from "../../geometry/crossProduct";
import { dotProduct } from "../../geometry/dotProduct";
import type { GrownTree } from "./growTree";
import type { FaceRole } from "./recognisedPart";
import type { Solid } from "./solid";
import type { SolidTopology } from "./solidTopology";

/** What each face of the solid is in the sheet: one of its two sides, a bend, a cut edge square to it, or not understood. */
export function faceRoles(solid: Solid, topology: SolidTopology, tree: GrownTree): readonly FaceRole[] {
  const roles = solid.faces.map((): FaceRole => "left out");
  const [top, under] = [new Set<number>(), new Set<number>()];
  for (const plate of tree.plates) {
    top.add(plate.top);
    under.add(plate.bottom);
  }
  for (const { joint, direction } of tree.bends) {
    for (const face of joint.faces) {
      const surface = solid.faces[face]?.surface;
      const outside = surface?.kind === "cylinder" && surface.convex;
      (outside === (direction === "down") ? top : under).add(face);
    }
  }
  const plates = new Set(tree.plates.flatMap((plate) => [plate.top, plate.bottom]));
  solid.faces.forEach((_, face) => {
    if (plates.has(face)) roles[face] = "sheet";
    else if (top.has(face) || under.has(face)) roles[face] = "bend";
    else if (isCutEdge(solid, topology, face, top, under, plates)) roles[face] = "edge";
  });
  return roles;
}

/** It runs from one side of the sheet to the other, square to the plates that it borders. */
function isCutEdge(solid: Solid, topology: SolidTopology, face: number, top: ReadonlySet<number>, under: ReadonlySet<number>, plates: ReadonlySet<number>): boolean {
  const neighbours = new Set((topology.around[face] ?? []).flatMap(({ edge }) => (topology.facesOf[edge] ?? []).filter((other) => other !== face)));
  if (![...neighbours].some((other) => top.has(other)) || ![...neighbours].some((other) => under.has(other))) return false;
  const surface = solid.faces[face]?.surface;
  return [...neighbours].filter((other) => plates.has(other)).every((other) => {
    const plate = solid.faces[other]?.surface;
    if (plate?.kind !== "plane" || !surface) return true;
    if (surface.kind === "plane") return Math.abs(dotProduct(surface.normal, plate.normal)) <= SQUARE_RAD;
    if (surface.kind === "cylinder") return Math.hypot(...crossProduct(surface.axis, plate.normal)) <= SQUARE_RAD;
    return surface.name === "extruded curve";
  });
}

/** Cut edges count as square to the sheet when they lean by less. */
const SQUARE_RAD = 10 * SOLID_PARALLEL_RAD;
