import { SAME_POINT_MM } from "../core/tolerance";
import type { Vec2 } from "../geometry/vec2";
import { cornerReach } from "./cornerReach";
import type { DrawnFace } from "./drawnFace";
import { edgeAxes, type EdgeAxes, type EdgeCut } from "./edgeCut";

/** How a bend's strip ends on the face that it is cut from. */
export interface CutEnd {
  /** Whether it runs on past the flange: no inset, or less than the bent neighbour takes. */
  readonly reaches: boolean;
  /** Along the edge, where the strip ends. */
  readonly at: number;
  /** Width of the relief beside it, if unbent sheet lies there; else 0. */
  readonly relief: number;
}

export interface CutWithEnds {
  readonly cut: EdgeCut;
  readonly axes: EdgeAxes;
  readonly start: CutEnd;
  readonly end: CutEnd;
}

export function cutEnds(face: DrawnFace, cuts: readonly EdgeCut[]): readonly CutWithEnds[] {
  return cuts.map((cut) => {
    const axes = edgeAxes(cut.edge);
    const reach = reaches(cut, cuts);
    const end = (at: "start" | "end"): CutEnd => {
      const isStart = at === "start";
      const inset = isStart ? cut.start : cut.end;
      const beyond = reach[at] ? cornerReach(face.points, axes, cut.depth, at) : -inset;
      const material = !reach[at] || (beyond === 0 && inset <= SAME_POINT_MM);
      const relief = cut.relief && cut.relief.kind !== "tear" && material ? Math.min(cut.relief.width, gapBeside(cut, cuts, axes, isStart)) : 0;
      return { reaches: reach[at], at: isStart ? -beyond : axes.length + beyond, relief };
    };
    return { cut, axes, start: end("start"), end: end("end") };
  });
}

/** Unbent edge between a strip and the next one on the same edge. */
function gapBeside(cut: EdgeCut, cuts: readonly EdgeCut[], { length }: EdgeAxes, atStart: boolean): number {
  const gaps = cuts.filter((other) => other !== cut && other.edge === cut.edge)
    .map((other) => (atStart ? cut.start - (length - other.end) : other.start - (length - cut.end)))
    .filter((gap) => gap > -SAME_POINT_MM);
  return Math.max(0, Math.min(Infinity, ...gaps));
}

function reaches(cut: EdgeCut, cuts: readonly EdgeCut[]): { readonly start: boolean; readonly end: boolean } {
  const neighbourTakes = (corner: Vec2, atStart: boolean) => Math.max(0, ...cuts.filter((other) => other.edge !== cut.edge
    && same(atStart ? other.edge.to : other.edge.from, corner) && (atStart ? other.end : other.start) <= cut.depth + SAME_POINT_MM).map(({ depth }) => depth));
  return {
    start: cut.start <= neighbourTakes(cut.edge.from, true) + SAME_POINT_MM,
    end: cut.end <= neighbourTakes(cut.edge.to, false) + SAME_POINT_MM,
  };
}

const same = (a: Vec2, b: Vec2) => Math.hypot(a[0] - b[0], a[1] - b[1]) <= SAME_POINT_MM;
