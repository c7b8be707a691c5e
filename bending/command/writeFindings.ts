import { mmPer, type LengthUnit } from "../core/units";
import type { Finding, FindingMark } from "../findings/finding";
import type { Findings } from "../findings/findingsOf";
import type { FlatPoint } from "../geometry/vec2";
import { rounded } from "../plan/rounded";

/** Findings as the command line gives them: lengths in the document's unit, marks in the frame of the flat. */
export function writeFindings({ list, leftOut }: Findings, units: LengthUnit): { readonly findings: readonly unknown[]; readonly findingsLeftOut: readonly string[] } {
  return { findings: list.map((finding) => written(finding, units)), findingsLeftOut: leftOut };
}

function written({ rule, severity, title, message, source, faces, bends, paths, measure, cure, marks }: Finding, units: LengthUnit) {
  const point = (p: FlatPoint) => [rounded(p[0] / mmPer(units)), rounded(p[1] / mmPer(units))];
  const scale = measure?.unit === "mm" ? mmPer(units) : 1;
  return {
    rule, severity, title, message, source, faces, bends, paths,
    ...(measure ? { value: rounded(measure.value / scale), wanted: rounded(measure.wanted / scale), unit: measure.unit === "mm" ? units : measure.unit } : {}),
    ...(cure ? { cure: { path: cure.path, value: cure.value } } : {}),
    marks: marks.map((mark) => writtenMark(mark, point)),
  };
}

function writtenMark(mark: FindingMark, point: (p: FlatPoint) => readonly number[]) {
  switch (mark.kind) {
    case "region": return { region: mark.outline.map(point) };
    case "line": return { line: [point(mark.from), point(mark.to)] };
    case "point": return { point: point(mark.at) };
    default: return mark satisfies never;
  }
}
