import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { Joint, JointSide } from "./joint";

/** A bend that a cut-out has parted in several, as one joint: between the same two faces, with the same radius. */
export function mergedJoints(joints: readonly Joint[]): readonly Joint[] {
  const merged: Joint[] = [];
  for (const joint of joints) {
    const at = merged.findIndex((known) => Math.abs(known.insideRadius - joint.insideRadius) <= SOLID_MATCH_MM
      && known.inner.every(({ face }) => joint.inner.some((side) => side.face === face)));
    const known = merged[at];
    if (!known) merged.push(joint);
    else merged[at] = { ...known, inner: both(known.inner, joint.inner), outer: both(known.outer, joint.outer), faces: [...new Set([...known.faces, ...joint.faces])] };
  }
  return merged;
}

function both(a: Joint["inner"], b: Joint["inner"]): Joint["inner"] {
  const joined = (side: JointSide): JointSide => ({ face: side.face, edges: [...new Set([...side.edges, ...(b.find(({ face }) => face === side.face)?.edges ?? [])])] });
  return [joined(a[0]), joined(a[1])];
}
