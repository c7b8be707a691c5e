import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";

/** A piece of the folded body, drawn in a plane (u, v) at `origin` and drawn out along w: a polygon, or a part of a ring. */
export interface SolidPiece {
  readonly polygon?: readonly (readonly [number, number])[];
  /** Degrees; `turn` is signed. */
  readonly arc?: { readonly centre: readonly [number, number]; readonly inner: number; readonly outer: number; readonly start: number; readonly turn: number };
  readonly origin: readonly [number, number, number];
  readonly u: readonly [number, number, number];
  readonly v: readonly [number, number, number];
  readonly w: readonly [number, number, number];
  readonly from: number;
  readonly to: number;
}

/** One part: its document, and what it has to come to, worked out by hand (`derivation`); lengths in the document's units. */
export interface PartCase {
  readonly name: string;
  readonly title: string;
  readonly derivation: readonly string[];
  readonly document: { readonly units: "mm" | "in"; readonly thickness: number };
  readonly expected: {
    readonly width?: number;
    readonly depth?: number;
    readonly area: number;
    /** Ends of bend lines in the sheet. */
    readonly bends?: Readonly<Record<string, readonly [readonly [number, number], readonly [number, number]]>>;
    /** Size of the plane parts of the folded body along x, y, z. */
    readonly folded?: readonly [number, number, number];
    /** The folded body, built by hand out of plates and rings. */
    readonly solid?: readonly SolidPiece[];
    /** Least distances between faces of the folded body. */
    readonly gaps?: readonly (readonly [string, string, number])[];
    /** Holes over bends, and the bends. */
    readonly across?: readonly (readonly [string, readonly string[]])[];
  };
}

/** The parts of the corpus, by file name. */
export function partCorpus(): readonly PartCase[] {
  const folder = join(import.meta.dirname, "parts");
  return readdirSync(folder).filter((file) => file.endsWith(".json")).sort().map((file): PartCase => ({
    name: file.replace(".json", ""),
    ...(JSON.parse(readFileSync(join(folder, file), "utf8")) as Omit<PartCase, "name">),
  }));
}
