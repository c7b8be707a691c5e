import type { Frame } from "../geometry/frame";
import { applyFrame } from "../geometry/applyFrame";
import type { Interval } from "../geometry/interval";
import { onStretch } from "../geometry/onStretch";
import type { Vec2 } from "../geometry/vec2";
import type { PartModel } from "../part/partModel";
import type { GaugeOption } from "./gaugeOption";

/** A place that a finger can touch, before anything in its way is looked at. */
export type Contact = Omit<GaugeOption, "free"> & { readonly z: Interval };

/** Sine of the angle up to which a face counts as level (or upright) and an edge as parallel: a tenth of a degree. */
export const SQUARE_SINE = 0.0018;
/** Steepest slanted edge that fingers hold: 45 degrees. Common practice, no source. */
const MAX_SLOPE = 1;
/** mm. */
const ON_BEND_MM = 1e-3;

/** The straight edges of a level face that look to the back of the machine and carry no bend. */
export function edgeContacts(part: PartModel, face: number, frame: Frame, slanted: boolean): readonly Contact[] {
  if (Math.hypot(frame.z[0], frame.z[2]) > SQUARE_SINE) return [];
  const outline = part.faces[face]?.outline ?? [];
  const r = Math.min(frame.o[1], frame.o[1] + part.thickness * frame.z[1]);
  return outline.flatMap((p, edge): readonly Contact[] => {
    const q = outline[(edge + 1) % outline.length];
    if (q === undefined || onBend(part, face, p, q)) return [];
    const [a, b] = [applyFrame(frame, [p[0], p[1], 0]), applyFrame(frame, [q[0], q[1], 0])];
    const [dx, dz] = [b[0] - a[0], b[2] - a[2]];
    // The outline is counter-clockwise from the sheet's top, so the outside is on the right: towards +x when the run along z has the top's sign.
    const looksBack = dz * (frame.z[1] > 0 ? 1 : -1) < 0;
    const slope = dx / dz;
    if (!looksBack || !Number.isFinite(slope) || Math.abs(slope) > MAX_SLOPE) return [];
    const z: Interval = [Math.min(a[2], b[2]), Math.max(a[2], b[2])];
    if (Math.abs(slope) <= SQUARE_SINE) return [{ x: Math.max(a[0], b[0]), slope: 0, r, on: "edge", face, edge, z }];
    return slanted ? [{ x: a[0] - slope * a[2], slope, r, on: "edge", face, edge, z }] : [];
  });
}

/** Does the edge lie along the tangent of a bend of this face, so that the sheet goes on behind it? */
function onBend(part: PartModel, face: number, p: Vec2, q: Vec2): boolean {
  const middle: Vec2 = [(p[0] + q[0]) / 2, (p[1] + q[1]) / 2];
  return part.bends.some((bend) => {
    if (bend.parent !== face && bend.child !== face) return false;
    const [a, b] = bend.parent === face ? [bend.zone[0], bend.zone[3]] : [bend.zone[1], bend.zone[2]];
    return onStretch(a, b, middle, ON_BEND_MM);
  });
}
