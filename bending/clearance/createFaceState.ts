import { composeFrames } from "../geometry/composeFrames";
import type { Frame } from "../geometry/frame";
import type { Vec2 } from "../geometry/vec2";
import type { Vec3 } from "../geometry/vec3";
import type { PartModel } from "../part/partModel";
import { boundsOf } from "./boundsOf";
import type { FacePath } from "./facePath";
import type { Bounds, FaceState } from "./half";
import { platesOf, type Plates } from "./plates";
import { prismIn } from "./prismIn";
import { wingFrame } from "./wingFrame";
import type { BendShapes } from "./createBendShapes";

export interface FaceFacts {
  readonly part: PartModel;
  readonly path: FacePath;
  readonly state: number;
  readonly before: FaceState | null;
  readonly index: number;
  readonly pieces: readonly (readonly Vec2[])[];
  readonly shapes: BendShapes;
}

/** A face where it stands when the bends on its way are formed as `state` says and flat otherwise; each fact worked out when it is asked for first. */
export function createFaceState({ part, path, state, before, index, pieces, shapes }: FaceFacts): FaceState {
  const t = part.thickness;
  const last = path.bends[path.bends.length - 1];
  const joint = last === undefined ? null : shapes(last, ((state >> last) & 1) === 1);
  const outward = last !== undefined && part.bends[last]?.child === path.face;
  let frame: Frame | null = null;
  let bounds: Bounds | null = null;
  let plates: Plates | null = null;

  const ownFrame = (): Frame => (before && joint ? composeFrames(before.frame(), outward ? joint.step : joint.back) : wingFrame(path, t));
  const frameOf = (): Frame => (frame ??= ownFrame());
  /** The zone lies with the face that is the bend's parent. */
  const zoneFrame = (): Frame => (outward && before ? before.frame() : frameOf());
  const side = (piece: readonly Vec2[], height: number) => piece.map(([x, y]): Vec3 => [x, y, height]);
  const ownPlates = (): Plates => platesOf([
    ...pieces.map((piece) => prismIn("face", t, frameOf(), side(piece, 0), side(piece, t))),
    ...(joint?.facets ?? []).map(({ outside, inside }) => prismIn("zone", t, zoneFrame(), outside, inside)),
  ]);
  const ownBounds = (): Bounds => {
    const outline = part.faces[path.face]?.outline ?? [];
    return boundsOf([{ frame: frameOf(), points: [...side(outline, 0), ...side(outline, t)] }, ...(joint ? [{ frame: zoneFrame(), points: joint.box }] : [])]);
  };
  return {
    path, state, before, index, meetings: [],
    frame: frameOf,
    bounds: () => (bounds ??= ownBounds()),
    plates: () => (plates ??= ownPlates()),
  };
}
