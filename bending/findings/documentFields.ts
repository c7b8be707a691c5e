import { documentInUnits } from "../part/documentInUnits";
import type { DocumentHole, PartDocument, ReliefEntry } from "../part/partDocument";
import { partSource } from "../part/partSource";

/** Where the document says what a bend and the face that it carries are. */
export interface BendFields {
  /** Of the bend: `flanges[2]`, `profile.bends[0]`, `flat.bends[1]`. */
  readonly path: string;
  /** Of the one number that is the face's length, and that length in mm; null when an outline gives it. */
  readonly length: { readonly path: string; readonly mm: number } | null;
  /** Of the field that decides the inside radius: the bend's own, else the part's. */
  readonly radiusPath: string;
  readonly holes: HoleFields | null;
  /** The flange's own, else the part's. */
  readonly relief: { readonly path: string; readonly kind: ReliefEntry["kind"]; readonly width: number | null } | null;
  /** May a relief be given here? */
  readonly takesRelief: boolean;
}

export interface HoleFields {
  readonly path: string;
  /** In mm. */
  readonly holes: readonly DocumentHole[];
}

export interface DocumentFields {
  readonly inMm: PartDocument;
  readonly ofBend: ReadonlyMap<string, BendFields>;
  /** The length of the base where one number gives it: a profile's first leg. */
  readonly baseLength: { readonly path: string; readonly mm: number } | null;
  /** Holes that are drawn in the sheet's own frame: the base's, or those of a flat. */
  readonly sheetHoles: HoleFields;
}

export function documentFields(document: PartDocument): DocumentFields {
  const inMm = documentInUnits(document, "mm");
  if (inMm.flat) {
    return {
      inMm,
      baseLength: null,
      sheetHoles: { path: "flat.holes", holes: inMm.flat.holes ?? [] },
      ofBend: new Map(inMm.flat.bends.map((bend, i): [string, BendFields] => [bend.id, {
        path: `flat.bends[${i}]`, length: null, radiusPath: radiusPath(bend, `flat.bends[${i}]`), holes: null, relief: null, takesRelief: false,
      }])),
    };
  }
  const source = partSource(inMm);
  return {
    inMm,
    baseLength: inMm.profile ? { path: source.basePath, mm: inMm.profile.legs[0] ?? 0 } : null,
    sheetHoles: { path: "base.holes", holes: source.base.holes ?? [] },
    ofBend: new Map(source.flanges.map(({ entry, path, lengthPath }): [string, BendFields] => [entry.id, {
      path,
      length: entry.length === undefined ? null : { path: lengthPath, mm: entry.length },
      radiusPath: radiusPath(entry, path),
      holes: inMm.profile ? null : { path: `${path}.holes`, holes: entry.holes ?? [] },
      relief: reliefOf(entry.relief, `${path}.relief`) ?? reliefOf(inMm.relief, "relief"),
      takesRelief: !inMm.profile,
    }])),
  };
}

const reliefOf = (relief: ReliefEntry | undefined, path: string): BendFields["relief"] => (relief ? { path, kind: relief.kind, width: relief.width ?? null } : null);

const radiusPath = (own: { readonly insideRadius?: number }, path: string): string =>
  (own.insideRadius === undefined ? "insideRadius" : `${path}.insideRadius`);
