import type { FieldProblem } from "../core/problem";
import { SAME_POINT_MM } from "../core/tolerance";
import type { Mm } from "../core/units";
import type { Vec2 } from "../geometry/vec2";
import { outsideSetback } from "../handbook/outsideSetback";
import type { DrawnEdge, DrawnFace } from "./drawnFace";
import { edgeAxes, fromEdge } from "./edgeCut";
import type { FlangeWork } from "./faceWork";
import { hingeFrame, type HingeFrame } from "./hingeFrame";
import { mitreLines, type MitreSide, type SideLine } from "./mitreLines";
import type { CornerEntry, DimensionKind } from "./partDocument";
import { setback } from "./setback";

/** How a flange's sides are trimmed; along the edge that the chain of flanges stands on, not along the parent's own when that is a far edge. */
export interface CornerTrims {
  readonly start: SideLine | null;
  readonly end: SideLine | null;
}

export interface CornerQuestion {
  readonly face: DrawnFace;
  /** The flanges on the face. */
  readonly flanges: readonly FlangeWork[];
  readonly childrenOf: (id: string) => readonly FlangeWork[];
  readonly dimension: DimensionKind;
  readonly corner: CornerEntry | undefined;
  readonly thickness: Mm;
}

interface Hinged {
  readonly flange: FlangeWork;
  readonly edge: DrawnEdge;
  readonly frame: HingeFrame;
  /** The same with every bend flat. */
  readonly flat: HingeFrame;
  /** Plane length. */
  readonly reach: number;
}

/** The mitres at the corners of a face: of the flanges on it, and of the flanges on their far edges in turn. */
export function cornerTrims(question: CornerQuestion): { readonly trims: ReadonlyMap<string, CornerTrims>; readonly problems: readonly FieldProblem[] } {
  const trims = new Map<string, CornerTrims>();
  const problems: FieldProblem[] = [];
  const hinged = question.flanges.flatMap((flange): readonly Hinged[] => {
    const edge = question.face.edges[flange.entry.edge];
    return edge ? [onFace(flange, edge, question)] : [];
  });
  for (const first of hinged) {
    const second = hinged.find((other) => other !== first && same(first.edge.to, other.edge.from) && reachesCorner(first, other, question) );
    if (!second) continue;
    for (let pair: readonly [Hinged, Hinged] | null = [first, second]; pair; pair = onFarEdges(pair, question)) {
      const problem = trimPair(pair[0], pair[1], question, trims);
      if (problem) problems.push(problem);
    }
  }
  return { trims, problems };
}

function trimPair(a: Hinged, b: Hinged, { corner, thickness }: CornerQuestion, trims: Map<string, CornerTrims>): FieldProblem | null {
  const [own, other] = [a.flange.entry.corner, b.flange.entry.corner];
  if (own && other && JSON.stringify(own) !== JSON.stringify(other)) {
    return { path: `${b.flange.path}.corner`, message: `disagrees with the corner of "${a.flange.entry.id}", which meets "${b.flange.entry.id}" there; give one of the two, or both the same` };
  }
  const wanted = own ?? other ?? corner;
  if (wanted?.kind !== "mitre" || a.flange.entry.outline || b.flange.entry.outline) return null;
  const side = (one: Hinged, flat: boolean): MitreSide => ({
    frame: flat ? one.flat : one.frame,
    reference: flat ? -one.flange.bend.allowance : -outsideSetback(one.flange.bend.angle, one.flange.bend.insideRadius, thickness),
    edgeLength: edgeAxes(one.edge).length,
  });
  const folded = mitreLines(side(a, false), side(b, false), thickness, wanted.gap);
  // At a re-entrant corner the two stand in one another's way in the sheet as well.
  const sheet = reentrant(a.edge, b.edge) ? mitreLines(side(a, true), side(b, true), 0, wanted.gap) : null;
  if (!folded) return null;
  const set = (one: Hinged, at: "start" | "end", line: SideLine) => trims.set(one.flange.entry.id, { ...(trims.get(one.flange.entry.id) ?? { start: null, end: null }), [at]: line });
  if (a.flange.entry.endAngle === undefined) set(a, "end", strictest(folded.first, sheet?.first, a.reach, Math.min));
  if (b.flange.entry.startAngle === undefined) set(b, "start", strictest(folded.second, sheet?.second, b.reach, Math.max));
  return null;
}

/** Where both the folded part and the sheet have a say, the straight side that keeps both at its ends. */
function strictest(folded: SideLine, sheet: SideLine | undefined, reach: number, pick: (a: number, b: number) => number): SideLine {
  if (!sheet || reach <= 0) return folded;
  const at = pick(folded.at, sheet.at);
  return { at, lean: (pick(folded.at + folded.lean * reach, sheet.at + sheet.lean * reach) - at) / reach };
}

function onFace(flange: FlangeWork, edge: DrawnEdge, { face, dimension, thickness }: CornerQuestion): Hinged {
  const axes = edgeAxes(edge);
  const depth = setback(face.dimension, flange.bend.angle, flange.bend.insideRadius, thickness);
  const [x, y] = fromEdge(axes, [0, depth]);
  const ground: HingeFrame = { origin: [x, y, 0], along: [axes.along[0], axes.along[1], 0], away: [-axes.inward[0], -axes.inward[1], 0], normal: [0, 0, 1] };
  return hung(flange, edge, ground, ground, 0, dimension, thickness);
}

function hung(flange: FlangeWork, edge: DrawnEdge, frame: HingeFrame, flat: HingeFrame, distance: number, dimension: DimensionKind, thickness: Mm): Hinged {
  const { bend, entry } = flange;
  return {
    flange,
    edge,
    frame: hingeFrame(frame, distance, bend, bend.angle, thickness),
    flat: hingeFrame(flat, distance, bend, 0, thickness),
    reach: (entry.length ?? 0) - setback(entry.dimension ?? dimension, bend.angle, bend.insideRadius, thickness),
  };
}

/** The flanges on the far edges of two that meet: they meet as well, if both run to the corner. */
function onFarEdges([a, b]: readonly [Hinged, Hinged], { childrenOf, dimension, thickness }: CornerQuestion): readonly [Hinged, Hinged] | null {
  if (a.flange.entry.outline || b.flange.entry.outline) return null;
  const far = (one: Hinged, inset: "start" | "end") => {
    const child = childrenOf(one.flange.entry.id).find(({ entry }) => entry.edge === 2 && (entry[inset] ?? 0) === 0);
    if (!child) return null;
    const depth = setback(one.flange.entry.dimension ?? dimension, child.bend.angle, child.bend.insideRadius, thickness);
    return hung(child, one.edge, one.frame, one.flat, one.reach - depth, dimension, thickness);
  };
  const [c, d] = [far(a, "end"), far(b, "start")];
  return c && d ? [c, d] : null;
}

/** Neither leaves the corner of the face standing. */
function reachesCorner(a: Hinged, b: Hinged, { face, thickness }: CornerQuestion): boolean {
  const depth = ({ flange: { bend } }: Hinged) => setback(face.dimension, bend.angle, bend.insideRadius, thickness);
  return (a.flange.entry.end ?? 0) <= depth(b) + SAME_POINT_MM && (b.flange.entry.start ?? 0) <= depth(a) + SAME_POINT_MM;
}

function reentrant(a: DrawnEdge, b: DrawnEdge): boolean {
  const [p, q] = [edgeAxes(a).along, edgeAxes(b).along];
  return p[0] * q[1] - p[1] * q[0] < -SAME_POINT_MM;
}

const same = (a: Vec2, b: Vec2) => Math.hypot(a[0] - b[0], a[1] - b[1]) <= SAME_POINT_MM;
