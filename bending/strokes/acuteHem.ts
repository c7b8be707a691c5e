import { invariant } from "../core/invariant";
import { deg, mm, toRad, type Mm } from "../core/units";
import type { FlatPoint } from "../geometry/vec2";
import { bendAllowance } from "../handbook/bendAllowance";
import { hemSteps } from "../handbook/hemSteps";
import { naturalRadius } from "../handbook/naturalRadius";
import { bendDirections } from "../part/bendDirections";
import type { Bend, Face, PartModel } from "../part/partModel";
import { narrowed } from "./narrowed";

/** Turned through by the first of a hem's two strokes. */
const ACUTE = toRad(deg(180 - hemSteps(mm(1)).preBendOpening[1]));

/**
 * A hem in its first stage: bent acutely over a V, with the radius that this V gives, about the same middle line. An acute bend takes up more sheet
 * than the finished hem.
 */
export function acuteStage({ material, thickness }: PartModel, bend: Bend, vOpening: Mm): Bend {
  const insideRadius = naturalRadius(material, vOpening);
  const allowance = bendAllowance(ACUTE, insideRadius, bend.k, thickness);
  const { outward } = bendDirections(bend);
  const by = (allowance - bend.allowance) / 2;
  const moved = (p: FlatPoint, off: number): FlatPoint => [p[0] + outward[0] * off, p[1] + outward[1] * off];
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  const zone = [moved(parentStart, -by), moved(childStart, by), moved(childEnd, by), moved(parentEnd, -by)] as const;
  return { ...bend, angle: ACUTE, hem: null, insideRadius, allowance, zone, region: null, radiusSource: "acute stage of a hem" };
}

/** The part with one hem in its first stage; the plane parts beside it are shorter by what that takes, the blank is the same. */
export function acuteHem(part: PartModel, hem: number, vOpening: Mm): PartModel {
  const bend = part.bends[hem];
  invariant(bend, "a hem is a bend of the part");
  const acute = acuteStage(part, bend, vOpening);
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  const { zone } = acute;
  const shorter = (face: Face, from: FlatPoint, to: FlatPoint, from2: FlatPoint, to2: FlatPoint): Face =>
    ({ ...face, outline: narrowed(face.outline, from, to, from2, to2) ?? face.outline });
  return {
    ...part,
    bends: part.bends.map((one, index) => (index === hem ? acute : one)),
    faces: part.faces.map((face, index) =>
      index === bend.parent ? shorter(face, parentStart, parentEnd, zone[0], zone[3])
        : index === bend.child ? shorter(face, childEnd, childStart, zone[2], zone[1]) : face),
  };
}
