import { applyFrame } from "../geometry/applyFrame";
import type { Frame } from "../geometry/frame";
import type { PartModel } from "../part/partModel";
import { SQUARE_SINE, type Contact } from "./edgeContacts";

/** mm. Least height of plane face that a finger needs to find the same place again. Common practice, no source. */
const LEAST_HOLD_MM = 2;

/**
 * The outside of a flange that stands square to the sheet and along the bend line: the finger touches its
 * plane part, as near to the sheet's level as it can.
 */
export function uprightContact(part: PartModel, face: number, frame: Frame, fingerHeight: number): Contact | null {
  if (Math.hypot(frame.z[1], frame.z[2]) > SQUARE_SINE) return null;
  const outline = (part.faces[face]?.outline ?? []).map((p) => applyFrame(frame, [p[0], p[1], 0]));
  if (outline.length === 0) return null;
  const [low, high] = [Math.min(...outline.map((p) => p[1])), Math.max(...outline.map((p) => p[1]))];
  const band = Math.min(fingerHeight, high - low);
  if (band < LEAST_HOLD_MM) return null;
  // A flange that hangs is touched from its bend down; of a short one the finger reaches beyond the end.
  const r = low >= 0 ? low : high - fingerHeight;
  const at = low >= 0 ? low + band / 2 : high - band / 2;
  const cuts = outline.flatMap((p, i) => {
    const q = outline[(i + 1) % outline.length] ?? p;
    if (p[1] > at === q[1] > at) return [];
    return [p[2] + ((at - p[1]) / (q[1] - p[1])) * (q[2] - p[2])];
  });
  if (cuts.length < 2) return null;
  const x = Math.max(frame.o[0], frame.o[0] + part.thickness * frame.z[0]);
  return { x, slope: 0, r, on: "face", face, edge: 0, z: [Math.min(...cuts), Math.max(...cuts)] };
}
