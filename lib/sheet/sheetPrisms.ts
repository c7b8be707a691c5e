import type { Frame } from "@/bending/geometry/frame";
import { applyFrame } from "@/bending/geometry/applyFrame";
import { convexPieces } from "@/bending/geometry/convexPieces";
import type { FormedAngles, PartModel } from "@/bending/part/partModel";
import { bendPrisms, type SheetPrism } from "./bendPrisms";

/** The whole sheet as convex pieces, faces and bends, in the frame that `frames` leads to. */
export function sheetPrisms(part: PartModel, frames: readonly Frame[], angles: FormedAngles, slabs = 8): readonly SheetPrism[] {
  const faces = part.faces.flatMap((face, index) => {
    const frame = frames[index];
    if (!frame) return [];
    return convexPieces(face.outline, face.holes).map((piece): SheetPrism => ({
      lower: piece.map(([x, y]) => applyFrame(frame, [x, y, 0])),
      upper: piece.map(([x, y]) => applyFrame(frame, [x, y, part.thickness])),
      face: index,
      bend: null,
    }));
  });
  const bends = part.bends.flatMap((bend, index) => {
    const frame = frames[bend.parent];
    return frame ? bendPrisms(bend, index, part.thickness, angles[index] ?? 0, frame, slabs) : [];
  });
  return [...faces, ...bends];
}
