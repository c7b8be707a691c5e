import { edgeAxes, type EdgeCut } from "./edgeCut";
import type { DrawnFace } from "./drawnFace";
import { drawnFromOwnOutline } from "./drawnFlange";
import { edgeRange } from "./edgeRange";
import type { FlangeWork } from "./faceWork";
import { setback } from "./setback";
import { outsideSetback } from "../handbook/outsideSetback";
import { mm, type Mm } from "../core/units";
import type { Interval } from "../geometry/interval";
import { reliefSize } from "../handbook/reliefSize";
import type { ReliefEntry } from "./partDocument";
import { planeOutline } from "./planeOutline";

/** Relief that is left open by the document: one thickness wide and half a millimetre deeper than the bend; common practice, no source. */
const RELIEF_BEYOND_BEND_MM = 0.5;

/** What the flanges on a face take off it; `relief` is the part's own, for flanges that say nothing. */
export function edgeCutsOf(face: DrawnFace, children: readonly FlangeWork[], thickness: Mm, relief: ReliefEntry | undefined): readonly EdgeCut[] {
  return children.flatMap(({ entry, bend }): readonly EdgeCut[] => {
    const edge = face.edges[entry.edge];
    if (!edge) return [];
    const depth = setback(face.dimension, bend.angle, bend.insideRadius, thickness);
    const { length } = edgeAxes(edge);
    const own = entry.outline ? ownRange(entry.outline, bend, thickness) : null;
    const start = (entry.start ?? 0) + (own ? own[0] : 0);
    const end = own ? length - (entry.start ?? 0) - own[1] : entry.end ?? 0;
    const usual = reliefSize(thickness, bend.insideRadius);
    return [{
      edge, depth, start, end,
      relief: sized(entry.relief, thickness, depth + RELIEF_BEYOND_BEND_MM) ?? (entry.relief ? null : sized(relief, usual.width[0], Math.max(usual.depth[1], depth))),
    }];
  });
}

function sized(relief: ReliefEntry | undefined, width: number, depth: number): EdgeCut["relief"] {
  return relief && relief.kind !== "none" ? { kind: relief.kind, width: relief.width ?? width, depth: relief.depth ?? depth } : null;
}

/** Along the bend, what an outline of its own leaves of itself where the bend ends. */
function ownRange(outline: NonNullable<FlangeWork["entry"]["outline"]>, bend: FlangeWork["bend"], thickness: Mm): Interval | null {
  const drawn = drawnFromOwnOutline(outline, "outside");
  const edge = drawn.edges[0];
  if (!edge) return null;
  const depth = mm(outsideSetback(bend.angle, bend.insideRadius, thickness));
  const plane = planeOutline(drawn, [{ edge, depth, start: 0, end: 0, relief: null }]);
  const axes = edgeAxes(edge);
  const range = plane && edgeRange(plane, axes, depth, [-Infinity, Infinity]);
  // Counter-clockwise, a flange's own edge 0 runs from its end to its start.
  return range && [edge.from[0] - range[1], edge.from[0] - range[0]];
}
