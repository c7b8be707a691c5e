import type { Interval } from "../../geometry/interval";
import type { PlanSection } from "../planDocument";

/** Where the pieces of a station's run stand, z from the middle of the bed in the document's unit; `from` is the station's left end. */
export function stationSpans(from: number, sections: readonly PlanSection[]): readonly Interval[] {
  let at = from;
  return sections.flatMap((section): readonly Interval[] => {
    const left = at;
    at += section.length ?? section.gap;
    return section.length === undefined ? [] : [[left, at]];
  });
}
