import { applyFrame } from "../geometry/applyFrame";
import { convexPieces } from "../geometry/convexPieces";
import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import { foldFrames } from "../part/foldFrames";
import type { PartModel } from "../part/partModel";
import { zonePlates } from "./zonePlates";

/** A face or a bend of the finished part as convex plates in the part's frame. */
export interface FoldedBody {
  readonly of: "face" | "bend";
  /** Index of the face, or of the bend. */
  readonly index: number;
  readonly plates: readonly FoldedPlate[];
}

/** `count` corners on one side, then `count` on the other; three numbers each. */
export interface FoldedPlate {
  readonly count: number;
  readonly points: Float64Array;
  /** Min x, y, z, max x, y, z. */
  readonly box: Float64Array;
}

export function foldedBodies(part: PartModel): readonly FoldedBody[] {
  const angles = part.bends.map(({ angle }) => angle);
  const frames = foldFrames(part, angles);
  const t = part.thickness;
  const faces = part.faces.map((face, index): FoldedBody => ({
    of: "face",
    index,
    plates: convexPieces(face.outline, face.holes).map((piece) =>
      plate(frames[index], piece.map(([x, y]): Vec3 => [x, y, 0]), piece.map(([x, y]): Vec3 => [x, y, t]))),
  }));
  const bends = part.bends.map((bend, index): FoldedBody => ({
    of: "bend",
    index,
    plates: zonePlates(part, index).map(({ inside, outside }) => plate(frames[bend.parent], outside, inside)),
  }));
  return [...faces, ...bends];
}

function plate(frame: Frame | undefined, one: readonly Vec3[], other: readonly Vec3[]): FoldedPlate {
  const points = new Float64Array(6 * one.length);
  const box = Float64Array.of(Infinity, Infinity, Infinity, -Infinity, -Infinity, -Infinity);
  [...one, ...other].forEach((corner, i) => {
    const placed = frame ? applyFrame(frame, corner) : corner;
    placed.forEach((value, axis) => {
      points[3 * i + axis] = value;
      box[axis] = Math.min(box[axis] as number, value);
      box[3 + axis] = Math.max(box[3 + axis] as number, value);
    });
  });
  return { count: one.length, points, box };
}
