import { mm, type Mm } from "../core/units";
import { SAME_POINT_MM } from "../core/tolerance";
import type { Vec2 } from "../geometry/vec2";
import { holeToBend, type PiercedFeature } from "../handbook/holeToBend";
import { bendDirections } from "../part/bendDirections";
import type { Bend } from "../part/partModel";
import type { FindingsContext } from "./context";
import type { DrawnHole } from "./drawnHoles";

/** What a hole needs to the zone of a bend: by the guides, and to stay off the V's opening. */
export function holeNeeds({ part, toolsOf }: FindingsContext, hole: DrawnHole, bend: Bend): { readonly guide: Mm; readonly opening: Mm; readonly vOpening: Mm; readonly source: string } {
  const feature = featureOf(hole, bend);
  const { least, source } = holeToBend(feature, part.thickness, bend.insideRadius);
  const { nearest, usual } = toolsOf(bend);
  const vOpening = nearest?.vOpening ?? usual;
  return { guide: mm(least - bend.insideRadius), opening: mm(vOpening / 2 - bend.allowance / 2), vOpening, source };
}

/** A slot or a window counts by its length along the bend when it is longer that way; else its end is round enough. */
function featureOf({ outline, entry }: DrawnHole, bend: Bend): PiercedFeature {
  if (entry && "circle" in entry.hole) return { kind: "round" };
  const { along, outward } = bendDirections(bend);
  const extent = (axis: Vec2) => {
    const values = outline.map(([x, y]) => x * axis[0] + y * axis[1]);
    return Math.max(...values) - Math.min(...values);
  };
  const length = extent(along);
  return length > extent(outward) + SAME_POINT_MM ? { kind: "slot", length: mm(length) } : { kind: "round" };
}
