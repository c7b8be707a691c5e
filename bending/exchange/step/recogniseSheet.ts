import { fail, ok, type Result } from "../../core/result";
import { PART_LIMITS } from "../../part/partLimits";
import { describeLeftOut } from "./describeLeftOut";
import { faceRoles } from "./faceRoles";
import { facingPlanes } from "./facingPlanes";
import { findJoints } from "./findJoints";
import { findThickness } from "./findThickness";
import { growTree, type GrownTree } from "./growTree";
import type { Joint } from "./joint";
import { pairPlates } from "./pairPlates";
import { readBend, readPlate } from "./readPlates";
import { recognisedVolume } from "./recognisedVolume";
import type { RecognisedPart } from "./recognisedPart";
import { recognitionNotes } from "./recognitionNotes";
import type { Solid } from "./solid";
import { solidTopology, type SolidTopology } from "./solidTopology";

/** The largest plate must be this many squares of the thickness, or it is a block. */
const LEAST_THICKNESS_SQUARES = 4;
/** Part of the solid that plates and bends must make up, for the rest to count as detail. */
const LEAST_UNDERSTOOD = 0.5;
const MOST_UNDERSTOOD = 1.2;

/** The sheet-metal part that a solid is, or why it is none, in plain words. */
export function recogniseSheet(solid: Solid): Result<RecognisedPart, string> {
  const planes = facingPlanes(solid);
  const thickness = findThickness(solid, planes);
  if (thickness === null) return fail("This is not a sheet-metal part: no two of its faces lie back to back, so it has no thickness.");
  const topology = solidTopology(solid);
  const other = pairPlates(planes, thickness);
  const joints = findJoints(solid, topology, other, thickness);
  const base = baseTop(solid, other, joints);
  if (base === null || (solid.faces[base]?.area ?? 0) < LEAST_THICKNESS_SQUARES * thickness ** 2) {
    return fail(`This is not a sheet-metal part: the faces that lie back to back are ${inMm(thickness)} apart, and none of them is much larger than that.`);
  }
  const tree = growTree(solid, topology, other, joints, thickness, base);
  if (tree.bends.length > PART_LIMITS.bends) return fail(`The part has ${tree.bends.length} bends; at most ${PART_LIMITS.bends} are read.`);
  return assemble(solid, topology, tree, thickness);
}

function assemble(solid: Solid, topology: SolidTopology, tree: GrownTree, thickness: number): Result<RecognisedPart, string> {
  const read = tree.plates.map((plate, i) => readPlate(solid, plate, tree.bends.filter(({ parent, child }) => parent === i || child === i)));
  const plates = read.flatMap((plate) => (plate ? [plate.plate] : []));
  const readBends = tree.bends.flatMap((bend) => {
    const [parent, child] = [read[bend.parent], read[bend.child]];
    return parent && child ? [readBend(solid, bend, parent, child)] : [];
  });
  const bends = readBends.map(({ bend }) => bend);
  if (plates.length !== tree.plates.length) return fail("This is not a sheet-metal part that can be read: one of its plates has no outline.");
  const volume = recognisedVolume(plates, bends, thickness);
  const part = volume / solid.volume;
  if (part < LEAST_UNDERSTOOD || part > MOST_UNDERSTOOD) {
    return fail(`This is not a sheet-metal part that can be read: plates of ${inMm(thickness)} and their bends make up ${Math.round(part * 100)} % of the solid. Is it one sheet of one thickness, with round bends?`);
  }
  const roles = faceRoles(solid, topology, tree);
  return ok({
    thickness, plates, bends, roles, leftOut: describeLeftOut(solid, topology, roles),
    notes: recognitionNotes(tree, read.flatMap((plate) => (plate ? [plate] : [])), readBends), solidVolume: solid.volume, volume,
  });
}

/** The largest plate; of its two sides the one towards which more bends turn. */
function baseTop(solid: Solid, other: ReadonlyMap<number, number>, joints: readonly Joint[]): number | null {
  let best: number | null = null;
  const area = (face: number) => Math.min(solid.faces[face]?.area ?? 0, solid.faces[other.get(face) ?? -1]?.area ?? 0);
  for (const face of other.keys()) if (best === null || area(face) > area(best) * (1 + 1e-9)) best = face;
  const opposite = best === null ? undefined : other.get(best);
  if (best === null || opposite === undefined) return best;
  const turning = (face: number) => joints.filter(({ inner }) => inner.some((side) => side.face === face)).length;
  if (turning(best) !== turning(opposite)) return turning(best) > turning(opposite) ? best : opposite;
  const up = (face: number) => {
    const surface = solid.faces[face]?.surface;
    return surface?.kind === "plane" ? surface.normal[2] + surface.normal[1] / 16 + surface.normal[0] / 256 : 0;
  };
  return up(best) >= up(opposite) ? best : opposite;
}

const inMm = (value: number) => `${Number(value.toFixed(3))} mm`;
