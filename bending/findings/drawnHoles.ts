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
  const sheetOutlines = new Map(onSheet.map((entry) => [entry, holeAsChords(entry.hole)]));
  const byPath = new Map(onSheet.map((entry) => [entry.path, entry]));
  const within = part.faces.flatMap((face, index) => {
    const bend = face.bend === null ? undefined : part.bends[face.bend];
    const own = bend === undefined ? null : (fields.ofBend.get(bend.id)?.holes ?? null);
    const entries = bend && own ? entriesOf(own, axesOf(bend)) : [];
    for (const entry of entries) byPath.set(entry.path, entry);
    const left = entries.filter(({ path }) => !across.has(path));
    return face.holes.map((outline, i): DrawnHole => ({
      face: index,
      bends: bendsOn[index] ?? [],
      outline,
      circle: circleOf(face.holeContours[i]),
      entry: onSheet.find((entry) => sameOutline(sheetOutlines.get(entry) ?? [], outline)) ?? (left.length === face.holes.length ? (left[i] ?? null) : null),
    }));
  });
  return [...within, ...part.holesAcross.map(({ path, outline, contour, bends }): DrawnHole => {
    const bend = part.bends[bends[0] ?? -1];
    const onChild = bend && toChild(bend, outline);
    return { face: bend ? (onChild ? bend.child : bend.parent) : 0, bends, outline, circle: circleOf(contour), entry: byPath.get(path) ?? null };
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

/** The same corners, whichever comes first. */
const sameOutline = (a: readonly Vec2[], b: readonly Vec2[]) =>
  a.length === b.length && a.every(([x, y]) => b.some(([u, v]) => Math.abs(x - u) < 1e-6 && Math.abs(y - v) < 1e-6));
