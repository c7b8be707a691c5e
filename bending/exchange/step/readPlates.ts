import { bendWindows, type BendWindows } from "./bendWindows";
import { bridged } from "./bridged";
import type { PlateRim } from "./chainRims";
import type { FlatLoop } from "./flattenLoop";
import type { GrownBend, GrownPlate } from "./growTree";
import { outlineArea } from "./outlineArea";
import { plateHoles } from "./plateHoles";
import { plateShape } from "./plateShape";
import { pulledIn } from "./pulledIn";
import { readHole } from "./readHole";
import type { OutlineVertex, RecognisedBend, RecognisedPlate } from "./recognisedPart";
import type { Solid } from "./solid";
import type { BendSide } from "./unrollBend";

export interface ReadPlate {
  readonly plate: RecognisedPlate;
  /** For each edge of the outline the solid's edge. */
  readonly edges: readonly number[];
  readonly widenedHoles: number;
  /** Its sides differ in size by this part: its rims are not square. */
  readonly uneven: number;
  /** For each bend on it what is cut out of its edge there. */
  readonly cutOuts: ReadonlyMap<GrownBend, readonly (readonly OutlineVertex[])[]>;
  /** Curves that became chords are in it. */
  readonly chords: boolean;
}

/** A plate's outline and holes in its own coordinates, seen from the base's top. */
export function readPlate(solid: Solid, { top, bottom, frame }: GrownPlate, bends: readonly GrownBend[]): ReadPlate | null {
  const [shape, below] = [plateShape(solid, top, frame), plateShape(solid, bottom, frame)];
  if (!shape) return null;
  const cutOuts = new Map<GrownBend, readonly (readonly OutlineVertex[])[]>();
  const whole = bends.reduce((loop, bend) => {
    const drawn = bridged(loop, loop.edges.some((edge) => bend.parentEdges.includes(edge)) ? bend.parentEdges : bend.childEdges);
    cutOuts.set(bend, drawn.cutOuts);
    return drawn.outline;
  }, shape.outline);
  const outline = withoutOverrun(whole, bends);
  const holes = plateHoles(shape.holes, below?.holes ?? []);
  const area = outlineArea(shape.outline.vertices);
  return {
    plate: { faces: [top, bottom], frame, outline, holes: holes.outlines.map(readHole) },
    edges: whole.edges,
    cutOuts,
    widenedHoles: holes.widened,
    uneven: bends.some(({ joint }) => joint.overrun > 0) ? 0 : Math.abs(outlineArea(below?.outline.vertices ?? []) - area) / area,
    chords: shape.outline.chords || shape.holes.some(({ chords }) => chords),
  };
}

/** At a sharp outside corner the face is drawn on to the corner; the plate ends where a round bend would begin. */
function withoutOverrun({ vertices, edges }: FlatLoop, bends: readonly GrownBend[]): readonly OutlineVertex[] {
  return bends.filter(({ overrun }) => overrun > 0).reduce((outline, { parentEdges, childEdges, overrun }) => {
    const at = edges.findIndex((edge) => parentEdges.includes(edge) || childEdges.includes(edge));
    return at < 0 ? outline : pulledIn(outline, at, overrun);
  }, vertices);
}

export interface ReadBend {
  readonly bend: RecognisedBend;
  readonly cutOuts: BendWindows;
}

export function readBend(solid: Solid, bend: GrownBend, parent: ReadPlate, child: ReadPlate): ReadBend {
  const { direction, joint, start, length, parentEdges, childEdges } = bend;
  const { outline } = parent.plate;
  const parentEdge = parent.edges.findIndex((edge) => parentEdges.includes(edge));
  const [from, to] = [outline[parentEdge], outline[(parentEdge + 1) % outline.length]];
  const run = from && to ? Math.hypot(to[0] - from[0], to[1] - from[1]) : 0;
  const alongParent = ([x, y]: OutlineVertex) => (from && to ? ((x - from[0]) * (to[0] - from[0]) + (y - from[1]) * (to[1] - from[1])) / run - start : 0);
  const rimsOn = (on: BendSide, cutOuts: readonly (readonly OutlineVertex[])[], along: (p: OutlineVertex) => number) => cutOuts.flatMap((rim): readonly PlateRim[] => {
    const [first, last] = [rim[0], rim[rim.length - 1]];
    return first && last ? [{ on, rim, from: along(first), to: along(last) }] : [];
  });
  const rims = [...rimsOn("parent", parent.cutOuts.get(bend) ?? [], alongParent), ...rimsOn("child", child.cutOuts.get(bend) ?? [], ([x]) => x)];
  const cutOuts = bendWindows(solid, bend, child.plate.frame, rims);
  return {
    bend: {
      parent: bend.parent, child: bend.child, direction, angle: joint.angle, insideRadius: joint.insideRadius, start, length, faces: joint.faces,
      parentEdge, childEdge: child.edges.findIndex((edge) => childEdges.includes(edge)), windows: cutOuts.windows,
    },
    cutOuts,
  };
}
