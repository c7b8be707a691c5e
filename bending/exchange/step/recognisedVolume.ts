import type { DocumentHole } from "../../part/partDocument";
import { outlineArea } from "./outlineArea";
import type { OutlineVertex, RecognisedBend, RecognisedPlate } from "./recognisedPart";
import { windowHole } from "./windowHole";

/** mm³ of plates and bends: plate area times thickness; a bend is a sector of a ring, angle x ((r + t)² - r²) / 2 times its length. */
export function recognisedVolume(plates: readonly RecognisedPlate[], bends: readonly RecognisedBend[], thickness: number): number {
  const flat = plates.reduce((sum, { outline, holes }) => sum + outlineArea(outline) - holes.reduce((holed, hole) => holed + holeArea(hole), 0), 0);
  return bends.reduce((sum, bend) => {
    const { onPlates, inBend } = cutOut(bend, plates[bend.parent]?.outline ?? []);
    return sum + (bend.angle * (bend.length - inBend) * ((bend.insideRadius + thickness) ** 2 - bend.insideRadius ** 2)) / 2 - onPlates * thickness;
  }, flat * thickness);
}

/** What a bend's cut-outs take off: mm² of the plates, and mm of the bend's length. Laid with an allowance of 0 a cut-out is on the plates alone; each mm of allowance adds its mean length. */
function cutOut(bend: RecognisedBend, outline: readonly OutlineVertex[]): { readonly onPlates: number; readonly inBend: number } {
  const area = (allowance: number) => bend.windows.reduce((sum, window) => sum + Math.abs(outlineArea(windowHole(window, bend, outline, allowance))), 0);
  const onPlates = area(0);
  return { onPlates, inBend: area(1) - onPlates };
}

function holeArea(hole: DocumentHole): number {
  if ("circle" in hole) return (Math.PI * hole.diameter ** 2) / 4;
  if ("slot" in hole) {
    const [[ax, ay], [bx, by]] = hole.slot;
    return (Math.PI * hole.width ** 2) / 4 + Math.hypot(bx - ax, by - ay) * hole.width;
  }
  return Math.abs(outlineArea(hole.polygon.map(([x, y, bulge]) => [x, y, bulge ?? 0])));
}
