import { applyFrame } from "../geometry/applyFrame";
import type { Frame } from "../geometry/frame";
import { bendFacets } from "../part/bendFacets";
import type { PartModel } from "../part/partModel";
import { SQUARE_SINE, type Contact } from "./edgeContacts";

/** A finger may rest on the fold of a hem: finer than for clearance, so that it touches where the fold really is. */
const FACETS_OF_A_FOLD = 24;

/**
 * The fold of a closed hem on a level face, where it looks to the back of the machine: as good as an edge to a finger. `frame`: the parent's.
 * It is cut into plates round the arc, so the place is at most 0.2 % of the radius too far out.
 */
export function foldContact(part: PartModel, index: number, frame: Frame): Contact | null {
  const bend = part.bends[index];
  if (bend === undefined || bend.hem === null || Math.hypot(frame.z[0], frame.z[2]) > SQUARE_SINE) return null;
  const [a, b] = bend.line.map((p) => applyFrame(frame, [p[0], p[1], 0]));
  if (a === undefined || b === undefined || Math.abs(b[0] - a[0]) > SQUARE_SINE * Math.abs(b[2] - a[2])) return null;
  const fold = bendFacets(part, index, bend.angle, FACETS_OF_A_FOLD).flatMap(({ outside }) => outside.map((p) => applyFrame(frame, p)));
  const x = Math.max(...fold.map((p) => p[0]));
  const looksBack = x > Math.max(a[0], b[0]);
  if (!looksBack) return null;
  return { x, slope: 0, r: Math.min(...fold.map((p) => p[1])), on: "face", face: bend.child, edge: 0, z: [Math.min(a[2], b[2]), Math.max(a[2], b[2])] };
}
