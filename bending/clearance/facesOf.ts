import type { FaceState, HalfState } from "./half";

/** The faces of a state, near ones first. */
export function facesOf(state: HalfState): readonly FaceState[] {
  const faces: FaceState[] = [];
  for (let at: HalfState | null = state; at; at = at.before) faces.push(at.last);
  return faces.reverse();
}
