import type { BaseShape, FlangeEntry, FlatShape, PartDocument } from "./partDocument";

/** A part as base and flanges, whatever shape the document has, with where each thing stands in the document. */
export interface PartSource {
  readonly base: BaseShape;
  readonly basePath: string;
  readonly flanges: readonly SourceFlange[];
}

export interface SourceFlange {
  readonly entry: FlangeEntry;
  /** Of the bend, e.g. `flanges[2]` or `profile.bends[0]`. */
  readonly path: string;
  /** Of the length, e.g. `flanges[2].length` or `profile.legs[1]`. */
  readonly lengthPath: string;
}

/**
 * A profile is a chain of full-width flanges: the first leg is the base, x runs along the legs and y along
 * the bends. Documents in mm.
 */
export function partSource(document: Exclude<PartDocument, { readonly flat: FlatShape }>): PartSource {
  if (document.base) {
    return {
      base: document.base,
      basePath: "base.outline",
      flanges: (document.flanges ?? []).map((entry, i) => ({ entry, path: `flanges[${i}]`, lengthPath: entry.outline ? `flanges[${i}].outline` : `flanges[${i}].length` })),
    };
  }
  const { width, legs, bends } = document.profile;
  const first = legs[0] ?? 0;
  return {
    base: { outline: [[0, 0], [first, 0], [first, width], [0, width]] },
    basePath: "profile.legs[0]",
    flanges: bends.map((bend, i) => ({
      entry: { id: `b${i + 1}`, on: i === 0 ? "base" : `b${i}`, edge: i === 0 ? 1 : 2, length: legs[i + 1] ?? 0, ...bend },
      path: `profile.bends[${i}]`,
      lengthPath: `profile.legs[${i + 1}]`,
    })),
  };
}
