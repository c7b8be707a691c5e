import { Vector3 } from "three";

export type ViewPreset = "3d" | "front" | "side" | "above" | "part";

/** From the middle of things to the eye. In the machine the operator's side is -x and the right end of the bed +z. */
export const viewDirections: Record<ViewPreset, Vector3> = {
  "3d": new Vector3(-1, 0.75, 0.85),
  front: new Vector3(-1, 0.12, 0),
  side: new Vector3(0, 0, 1),
  above: new Vector3(-0.02, 1, 0),
  part: new Vector3(-0.75, 0.75, 1),
};
