import type { Frame } from "@/bending/geometry/frame";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { Vec3 } from "@/bending/geometry/vec3";
import type { FormedAngles, PartModel } from "@/bending/part/partModel";
import { bendPrisms } from "./bendPrisms";
import { convexHull } from "@/bending/geometry/convexHull";

/** Every bend zone as it is seen in a drawing, slab by slab. */
export function bendOutlines(part: PartModel, frames: readonly Frame[], angles: FormedAngles, look: (point: Vec3) => Vec2): readonly (readonly Vec2[])[] {
  return part.bends.flatMap((bend, index) => {
    const frame = frames[bend.parent];
    if (!frame) return [];
    return bendPrisms(bend, index, part.thickness, angles[index] ?? 0, frame, 6).map((prism) => convexHull([...prism.lower, ...prism.upper].map(look)));
  });
}
