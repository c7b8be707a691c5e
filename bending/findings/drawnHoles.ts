import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import type { Vec2 } from "../geometry/vec2";
import { bendDirections } from "../part/bendDirections";
import { holeAsChords } from "../part/holeAsChords";
import type { DocumentHole } from "../part/partDocument";
import type { FlatContour, PartModel } from "../part/partModel";
import type { DocumentFields, HoleFields } from "./documentFields";
import { zoneGap } from "./zoneGap";

/** A hole of the part as it lies in the sheet, and where the document says so. */
export interface DrawnHole {
  /** The face that it lies in; for one that reaches into a bend, the face on its side. */
  readonly face: number;
  /** The bends that it is to be judged by. */
  readonly bends: readonly number[];
  /** Arcs as chords. */
  readonly outline: readonly Vec2[];
  readonly box: Bounds2;
  /** A round hole exactly. */
  readonly circle: { readonly centre: Vec2; readonly radius: number } | null;
  /** The entry of the document, in mm, and its path; null for a hole that the document does not name. */
  readonly entry: HoleEntry | null;
}

export interface HoleEntry {
  readonly path: string;
  readonly hole: DocumentHole;
  /** The axes that the entry's coordinates are measured along, in the sheet. */
  readonly axes: readonly [Vec2, Vec2];
}

const SHEET: readonly [Vec2, Vec2] = [[1, 0], [0, 1]];

/** Every hole of the part: those within faces, face by face, then those that reach into bends. */
export function drawnHoles(part: PartModel, fields: DocumentFields, bendsOn: readonly (readonly number[])[]): readonly DrawnHole[] {
  const across = new Set(part.holesAcross.map(({ path }) => path));
  const onSheet = entriesOf(fields.sheetHoles, SHEET);
  const byPlace = new Map(onSheet.map((entry) => [placeOf(polygonBounds(holeAsChords(entry.hole))), entry]));
  const byPath = new Map(onSheet.map((entry) => [entry.path, entry]));
  const within = part.faces.flatMap((face, index) => {
    const bend = face.bend === null ? undefined : part.bends[face.bend];
    const own = bend === undefined ? null : (fields.ofBend.get(bend.id)?.holes ?? null);
    const entries = bend && own ? entriesOf(own, axesOf(bend)) : [];
    for (const entry of entries) byPath.set(entry.path, entry);
    const left = entries.filter(({ path }) => !across.has(path));
    return face.holes.map((outline, i): DrawnHole => {
      const box = polygonBounds(outline);
      return {
        face: index,
        bends: bendsOn[index] ?? [],
        outline,
        box,
        circle: circleOf(face.holeContours[i]),
        entry: byPlace.get(placeOf(box)) ?? (left.length === face.holes.length ? (left[i] ?? null) : null),
      };
    });
  });
  return [...within, ...part.holesAcross.map(({ path, outline, contour, bends }): DrawnHole => {
    const bend = part.bends[bends[0] ?? -1];
    const onChild = bend && toChild(bend, outline);
    return { face: bend ? (onChild ? bend.child : bend.parent) : 0, bends, outline, box: polygonBounds(outline), circle: circleOf(contour), entry: byPath.get(path) ?? null };
  })];
}

const circleOf = (contour: FlatContour | undefined): DrawnHole["circle"] => (contour?.kind === "circle" ? contour : null);

const entriesOf = ({ path, holes }: HoleFields, axes: HoleEntry["axes"]): readonly HoleEntry[] => holes.map((hole, i) => ({ path: `${path}[${i}]`, hole, axes }));

function axesOf(bend: PartModel["bends"][number]): HoleEntry["axes"] {
  const { along, outward } = bendDirections(bend);
  return [along, outward];
}

function toChild(bend: PartModel["bends"][number], outline: readonly Vec2[]): boolean {
  const { away } = zoneGap(outline, bend);
  const { outward } = bendDirections(bend);
  return away[0] * outward[0] + away[1] * outward[1] > 0;
}

/** Holes do not overlap, so the rectangle round one tells it from every other. */
const placeOf = ({ min, max }: Bounds2): string => [min[0] + max[0], min[1] + max[1]].map((value) => Math.round(value * 1e4)).join(" ");
