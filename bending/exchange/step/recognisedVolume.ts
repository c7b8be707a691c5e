import type { DocumentHole } from "../../part/partDocument";
import { outlineArea } from "./outlineArea";
import type { OutlineVertex, RecognisedBend, RecognisedPlate } from "./recognisedPart";

/** mm³ of plates and bends: plate area times thickness; a bend is a sector of a ring, angle x ((r + t)² - r²) / 2 times its length. */
export function recognisedVolume(plates: readonly RecognisedPlate[], bends: readonly RecognisedBend[], thickness: number): number {
  const flat = plates.reduce((sum, { outline, holes }) => sum + outlineArea(outline) - holes.reduce((holed, hole) => holed + holeArea(hole), 0), 0);
  return bends.reduce((sum, { angle, insideRadius, length, windows }) => sum + (angle * (length - open(windows)) * ((insideRadius + thickness) ** 2 - insideRadius ** 2)) / 2, (flat - bends.reduce((sum, { windows }) => sum + windows.reduce((cut, { onParent, onChild }) => cut + Math.abs(outlineArea(onParent)) + Math.abs(outlineArea(onChild)), 0), 0)) * thickness);
}

/** How much of a bend's length is cut out: the mean of what is at its two sides. */
function open(windows: RecognisedBend["windows"]): number {
  const wide = (rim: readonly OutlineVertex[]) => Math.hypot((rim[0]?.[0] ?? 0) - (rim[rim.length - 1]?.[0] ?? 0), (rim[0]?.[1] ?? 0) - (rim[rim.length - 1]?.[1] ?? 0));
  return windows.reduce((sum, { onParent, onChild }) => sum + (wide(onParent) + wide(onChild)) / 2, 0);
}

function holeArea(hole: DocumentHole): number {
  if ("circle" in hole) return (Math.PI * hole.diameter ** 2) / 4;
  if ("slot" in hole) {
    const [[ax, ay], [bx, by]] = hole.slot;
    return (Math.PI * hole.width ** 2) / 4 + Math.hypot(bx - ax, by - ay) * hole.width;
  }
  return Math.abs(outlineArea(hole.polygon.map(([x, y, bulge]) => [x, y, bulge ?? 0])));
}
