import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { LengthUnit, Mm } from "../core/units";
import type { Interval } from "../geometry/interval";
import type { FlatPoint } from "../geometry/vec2";
import { outsideSetback } from "../handbook/outsideSetback";
import type { DrawnFace } from "./drawnFace";
import { drawnFlange, drawnFromOwnOutline } from "./drawnFlange";
import { edgeAxes, fromEdge, type EdgeAxes } from "./edgeCut";
import { edgeCutsOf } from "./edgeCutsOf";
import { edgeRange } from "./edgeRange";
import type { FaceWork, FlangeWork } from "./faceWork";
import { formatLength } from "../core/formatLength";
import type { CornerTrims } from "./cornerTrims";
import type { SideLine } from "./mitreLines";
import type { DimensionKind, ReliefEntry } from "./partDocument";
import { reliefCircles } from "./reliefCircles";
import type { Bend } from "./partModel";
import { placeOnSheet, turnOnSheet } from "./sheetPlacement";
import { planeOutline } from "./planeOutline";
import { setback } from "./setback";

export interface PlaceFlangeQuestion {
  readonly parent: FaceWork;
  readonly flange: FlangeWork;
  /** The flanges on this one. */
  readonly children: readonly FlangeWork[];
  readonly dimension: DimensionKind;
  readonly thickness: Mm;
  readonly units: LengthUnit;
  readonly index: number;
  /** The part's own, for flanges that say nothing. */
  readonly relief: ReliefEntry | undefined;
  /** How a mitre trims the sides, along the chain's edge. */
  readonly trims: CornerTrims;
}

/** One flange with its bend, laid into the unfolded sheet beside its parent. */
export function placeFlange(question: PlaceFlangeQuestion): Result<{ readonly face: FaceWork; readonly bend: Bend }, FieldProblem> {
  const { parent, flange, children, thickness, units, index } = question;
  const { entry, bend, path } = flange;
  const edge = parent.drawn.edges[entry.edge];
  if (!edge) return fail({ path: `${path}.edge`, message: `"${entry.on}" has no edge ${entry.edge}` });
  const axes = edgeAxes(edge);
  const parentDepth = setback(parent.drawn.dimension, bend.angle, bend.insideRadius, thickness);
  const inset = entry.start ?? 0;
  // Where the bend takes nothing of the parent, the edge is the edge as drawn, and another one in line with it is not meant.
  const ownOutline: Interval = parentDepth === 0 ? [0, axes.length] : [-Infinity, Infinity];
  const wanted: Interval = entry.outline ? ownOutline : [inset, axes.length - (entry.end ?? 0)];
  if (wanted[1] - wanted[0] <= 0) {
    return fail({ path: `${path}.${entry.start ? "start" : "end"}`, message: `the insets leave nothing of edge ${entry.edge} of "${entry.on}", which is ${formatLength(axes.length, units)} long` });
  }
  const range = edgeRange(parent.plane, axes, parentDepth, wanted);
  if (!range) return fail({ path: `${path}.edge`, message: `edge ${entry.edge} of "${entry.on}" is too short for this bend: the bends on the edges beside it leave nothing straight of it` });

  const own = outsideSetback(bend.angle, bend.insideRadius, thickness);
  const chain = parent.drawn.chainEdge === entry.edge ? parent.alongChain + edge.from[0] : 0;
  const trims = { start: shifted(question.trims.start, chain), end: shifted(question.trims.end, chain) };
  const bent: Interval = [Math.max(range[0], trims.start?.at ?? -Infinity), Math.min(range[1], trims.end?.at ?? Infinity)];
  if (bent[1] - bent[0] <= 0) return fail({ path: `${path}.edge`, message: `edge ${entry.edge} of "${entry.on}" is too short for this bend: the mitres at its ends leave nothing of it` });
  const drawn = draw(question, bent, trims, own);
  if (!drawn) return fail({ path: `${path}.${entry.startAngle ? "startAngle" : "endAngle"}`, message: "the sides meet before the far edge; make the flange shorter or the angles nearer to 90" });
  const ownEdge = drawn.edges[0];
  if (!ownEdge) return fail({ path: `${path}.outline`, message: "needs an edge 0 on the bend's outside line" });
  const cuts = edgeCutsOf(drawn, children, thickness, question.relief);
  const plane = planeOutline(drawn, [{ edge: ownEdge, depth: own, start: 0, end: 0, relief: null }, ...cuts]);
  const ownAxes = edgeAxes(ownEdge);
  const ownRange = plane && edgeRange(plane, ownAxes, own, [-Infinity, Infinity]);
  if (!plane || !ownRange) return fail({ path: flange.lengthPath, message: `its bends leave nothing of "${entry.id}", or cut it in pieces; its own bend takes ${formatLength(own, units)}` });

  // Along the bend from the flange's start; counter-clockwise, its own edge 0 runs from end to start.
  const whole: Interval = [ownEdge.from[0] - ownRange[1], ownEdge.from[0] - ownRange[0]];
  const zone: Interval = entry.outline ? whole : [Math.max(whole[0], 0), Math.min(whole[1], bent[1] - bent[0])];
  const originAlong = entry.outline ? inset : bent[0];
  if (originAlong + zone[0] < range[0] - FITS_MM || originAlong + zone[1] > range[1] + FITS_MM) {
    return fail({ path: `${path}.outline`, message: `is wider at the bend than the straight part of edge ${entry.edge} of "${entry.on}": it runs from ${formatLength(originAlong + zone[0], units)} to ${formatLength(originAlong + zone[1], units)} along the edge, which is straight there from ${formatLength(range[0], units)} to ${formatLength(range[1], units)}` });
  }
  const at = sheetPointBeside(parent, axes, originAlong, parentDepth);
  return ok({
    face: {
      id: entry.id, index, drawn, plane, reliefs: reliefCircles(drawn, cuts), alongChain: chain + originAlong,
      placement: { origin: at(0, bend.allowance - own), along: turnOnSheet(parent.placement, axes.along) },
    },
    bend: bendBetween(bend, parent.index, index, zone, at),
  });
}

type SheetPointBeside = (along: number, across: number) => FlatPoint;

/** Points of the sheet by distance along the bend from the flange's start, and across it from the parent's tangent. */
function sheetPointBeside(parent: FaceWork, axes: EdgeAxes, originAlong: number, depth: number): SheetPointBeside {
  return (along, across) => placeOnSheet(parent.placement, fromEdge(axes, [originAlong + along, depth - across]));
}

function bendBetween({ source, basis, ...bend }: FlangeWork["bend"], parent: number, child: number, [from, to]: Interval, at: SheetPointBeside): Bend {
  return {
    ...bend,
    allowanceSource: source,
    allowanceBasis: basis,
    parent,
    child,
    line: [at(from, bend.allowance / 2), at(to, bend.allowance / 2)],
    zone: [at(from, 0), at(from, bend.allowance), at(to, bend.allowance), at(to, 0)],
    region: null,
    strokeWith: null,
  };
}

/** An own outline may stand over the free edge by rounding alone (mm). */
const FITS_MM = 1e-4;

function draw({ flange, dimension, thickness }: PlaceFlangeQuestion, bent: Interval, trims: CornerTrims, own: number): DrawnFace | null {
  const { entry, bend } = flange;
  if (entry.outline) return drawnFromOwnOutline(entry.outline, dimension);
  const lean = (degrees: number) => (degrees === 90 ? 0 : 1 / Math.tan((degrees * Math.PI) / 180));
  return drawnFlange({
    reach: (entry.length ?? 0) - setback(dimension, bend.angle, bend.insideRadius, thickness),
    setback: own,
    start: shifted(trims.start, bent[0]) ?? { at: 0, lean: lean(entry.startAngle ?? 90) },
    end: shifted(trims.end, bent[0]) ?? { at: bent[1] - bent[0], lean: -lean(entry.endAngle ?? 90) },
    dimension,
  });
}

const shifted = (line: SideLine | null, by: number): SideLine | null => line && { at: line.at - by, lean: line.lean };
