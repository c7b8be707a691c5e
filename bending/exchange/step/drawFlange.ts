import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { DocumentVertex } from "../../part/partDocument";
import type { OutlineVertex, RecognisedBend, RecognisedPlate } from "./recognisedPart";
import { tidy } from "./tidy";

/** Where the edges of a plate's outline are in its document. */
export interface DrawnPlate {
  readonly edges: readonly {
    /** Of the plate's outline. */
    readonly edge: number;
    /** In the document. */
    readonly number: number;
    /** How much earlier it begins there, running counter-clockwise. */
    readonly extended: number;
  }[];
}

/**
 * A plate as a flange's own outline: first axis along the bend, second away from it, edge 0 on the bend's outside line, which lies
 * one setback before the plate. Seen that way the plate is turned over, so its edges come in the opposite order.
 */
export function drawFlange({ outline }: RecognisedPlate, { childEdge, length }: RecognisedBend, setback: number): { readonly outline: readonly DocumentVertex[]; readonly plate: DrawnPlate } {
  const n = outline.length;
  const at = (i: number): OutlineVertex => outline[((i % n) + n) % n] ?? [0, 0, 0];
  const edges: { edge: number; number: number; extended: number }[] = [];
  const vertices: DocumentVertex[] = [[0, 0]];
  const width = tidy(length);
  const endsSquare = straightOn(at(childEdge), at(childEdge - 1), length, at(childEdge - 1)[2]);
  const startsSquare = straightOn(at(childEdge + 1), at(childEdge + 2), 0, at(childEdge + 1)[2]);
  // From the bend's end round the plate to its start; on a square side the corner on the tangent line is left out.
  vertices.push([width, 0]);
  const placed = (vertex: OutlineVertex, bulge: number) => onFlange(vertex, setback, width, bulge);
  if (!endsSquare) vertices.push(placed(at(childEdge), at(childEdge - 1)[2]));
  for (let i = childEdge - 1; i > childEdge - n; i -= 1) {
    const last = i === childEdge - n + 1;
    edges.push({ edge: ((i % n) + n) % n, number: vertices.length - 1, extended: last && startsSquare ? setback : 0 });
    if (last && startsSquare) break;
    vertices.push(placed(at(i), last ? 0 : at(i - 1)[2]));
  }
  return { outline: vertices, plate: { edges } };
}

/**
 * Turned over, and with the edge that starts there when run the other way round: twice a change of sign, so the bulge stays. What is on the
 * tangent line or beside the bend's ends by the solid's exactness is so exactly.
 */
function onFlange([x, y]: OutlineVertex, setback: number, width: number, bulge: number): DocumentVertex {
  const near = (a: number, b: number) => Math.abs(a - b) <= SOLID_MATCH_MM;
  const along = near(x, 0) ? 0 : near(x, width) ? width : tidy(x);
  const away = near(y, 0) ? setback : tidy(setback - y);
  return bulge === 0 ? [along, away] : [along, away, bulge];
}

/** Whether the plate's side runs on from the bend's end square to it. */
function straightOn([x, y]: OutlineVertex, [nextX, nextY]: OutlineVertex, wanted: number, bulge: number): boolean {
  return bulge === 0 && Math.abs(x - wanted) <= SOLID_MATCH_MM && Math.abs(nextX - wanted) <= SOLID_MATCH_MM && nextY < y;
}
