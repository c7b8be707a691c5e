import type { SectionEntry } from "@/bending/tooling/toolingDocument";
import { sectionSets, type SectionSet } from "./sectionSets";

const horns = { L: "left", R: "right" } as const;

/** One entry for each physical piece, with the shop's mark on it and its place: drawer, and slot by size. */
export function sectionsOf(tool: string, set: SectionSet, drawer: string): readonly SectionEntry[] {
  const seen = new Map<string, number>();
  return sectionSets[set].map((size) => {
    const count = (seen.get(size) ?? 0) + 1;
    seen.set(size, count);
    const end = size.slice(-1);
    const length = Number.parseInt(size, 10);
    return {
      length,
      ...(end === "L" || end === "R" ? { horn: horns[end] } : {}),
      pieces: [`${tool}/${size}-${count}`],
      rack: `${drawer}-${length >= 415 ? 1 : length >= 100 ? 2 : 3}`,
    };
  });
}
