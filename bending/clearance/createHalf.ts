import { invariant } from "../core/invariant";
import type { Interval } from "../geometry/interval";
import type { Vec2 } from "../geometry/vec2";
import type { PartModel } from "../part/partModel";
import type { BendShapes } from "./createBendShapes";
import { createFaceState } from "./createFaceState";
import type { FacePath } from "./facePath";
import { facePaths } from "./facePath";
import type { FaceState, Half, HalfState } from "./half";

/** A face's convex pieces, by face. */
export type FacePieces = readonly (readonly (readonly Vec2[])[])[];

interface Node extends HalfState {
  /** The next face with its own bend flat and formed. */
  readonly before: Node | null;
  readonly next: [Node | null, Node | null];
}

/** The faces behind the hit's bends when `front` is the face in front. States are made when they are asked for. */
export function createHalf(part: PartModel, bends: readonly number[], front: number, pieces: FacePieces, shapes: BendShapes): Half {
  const bend = part.bends[bends[0] ?? -1];
  invariant(bend, "a hit forms at least one bend of the part");
  const paths = facePaths(part, { bends, front, formed: 0 }).filter(({ inFront }) => !inFront).sort((p, q) => p.bends.length - q.bends.length);
  const places = paths.map((path) => placeOf(part, paths, path));
  let [states, faces, questions] = [0, 0, 0];
  const firsts: [Node | null, Node | null] = [null, null];
  const made = paths.map(() => new Map<number, FaceState>());

  const faceAt = (i: number, node: Node | null, formed: number): FaceState => {
    const path = paths[i] as FacePath;
    const state = formed & path.mask;
    const known = made[i]?.get(state);
    if (known) return known;
    let parent = node;
    const back = places[i]?.back ?? 0;
    for (let k = 1; k < back; k++) parent = parent?.before ?? null;
    const face = createFaceState({ part, path, state, before: back === 0 ? null : parent?.last ?? null, index: faces++, pieces: pieces[path.face] ?? [], shapes });
    made[i]?.set(state, face);
    return face;
  };
  const nodeAfter = (before: Node | null, i: number, formed: number): Node =>
    ({ before, last: faceAt(i, before, formed), index: states++, answers: [], next: [null, null] });
  return {
    bend,
    thickness: part.thickness,
    paths,
    mask: paths.reduce((mask, path) => mask | path.mask, 0),
    lines: bends.flatMap((which) => lineOf(part, paths, which)),
    at: (formed) => {
      let node: Node | null = null;
      for (let i = 0; i < paths.length; i++) {
        const bit = ((formed >> (places[i]?.bend ?? 31)) & 1) as 0 | 1;
        const ways: [Node | null, Node | null] = node ? node.next : firsts;
        node = ways[bit] ??= nodeAfter(node, i, formed);
      }
      invariant(node, "a hit has a face on either side");
      return node;
    },
    nextQuestion: () => questions++,
  };
}

/** How many places before it in `paths` the face stands that it hangs on (0 for a wing), and the bend between the two (31, never formed, for a wing). */
function placeOf(part: PartModel, paths: readonly FacePath[], path: FacePath): { readonly back: number; readonly bend: number } {
  const last = path.bends[path.bends.length - 1];
  const bend = last === undefined ? undefined : part.bends[last];
  if (last === undefined || !bend) return { back: 0, bend: 31 };
  const from = bend.child === path.face ? bend.parent : bend.child;
  return { back: paths.indexOf(path) - paths.findIndex(({ face }) => face === from), bend: last };
}

/** All lines of a hit fall into one line, so that any path of the half tells how they lie. */
function lineOf(part: PartModel, paths: readonly FacePath[], which: number): readonly Interval[] {
  const line = paths[0]?.line;
  const ends = (part.bends[which]?.line ?? []).map(([x, y]) => (line ? line.along[0] * x + line.along[1] * y - line.middle : 0));
  return ends.length ? [[Math.min(...ends), Math.max(...ends)]] : [];
}
