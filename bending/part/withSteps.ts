import type { FieldProblem } from "../core/problem";
import { formatLength } from "../core/formatLength";
import type { LengthUnit, Mm } from "../core/units";
import { stepOf } from "./stepOf";
import type { FlangeEntry } from "./partDocument";
import type { SourceFlange } from "./partSource";

/** Plane length that the step must keep between its two bends (mm): enough to be a face at all. */
const LEAST_PLANE_MM = 0.01;

/**
 * Offset flanges as two: the step with the first bend, and the flange that runs on beside the parent with the second, turned
 * back by the same angle. The surfaces stand `height` apart: height = (r + t + r)(1 - cos a) + p sin a, with p the plane
 * length of the step (the geometry of two opposite arcs and their common tangent).
 */
export function withSteps(
  flanges: readonly SourceFlange[], radiusOf: (entry: FlangeEntry) => Mm, thickness: Mm, units: LengthUnit,
): { readonly flanges: readonly SourceFlange[]; readonly problems: readonly FieldProblem[] } {
  const problems: FieldProblem[] = [];
  const split = flanges.flatMap((flange): readonly SourceFlange[] => {
    const { offset, ...entry } = flange.entry;
    if (!offset) return [flange];
    const angle = (entry.angle * Math.PI) / 180;
    const radii = 2 * radiusOf(entry) + thickness;
    const plane = (offset.height - radii * (1 - Math.cos(angle))) / Math.sin(angle);
    if (plane < LEAST_PLANE_MM) problems.push({ path: `${flange.path}.offset.height`, message: tooLow(offset.height, radii, entry.angle, units) });
    const { id, on, edge, start, end, relief, length, startAngle, endAngle, holes, toleranceLength, ...bend } = entry;
    const step: FlangeEntry = { ...bend, ...given({ start, end, relief }), id: stepOf(id), on, edge, length: plane, dimension: "tangent", corner: { kind: "open" } };
    const far: FlangeEntry = {
      ...bend, ...given({ length, startAngle, endAngle, holes, toleranceLength }), id, on: step.id, edge: 2,
      direction: entry.direction === "up" ? "down" : "up", strokeWith: step.id, corner: { kind: "open" },
    };
    return [{ entry: step, path: flange.path, lengthPath: `${flange.path}.offset.height` }, { ...flange, entry: far }];
  });
  return { flanges: split, problems };
}

/** What is there of a set of optional fields. */
function given<T extends object>(fields: T): { [K in keyof T]?: Exclude<T[K], undefined> } {
  return Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== undefined)) as { [K in keyof T]?: Exclude<T[K], undefined> };
}

function tooLow(height: number, radii: number, angle: number, units: LengthUnit): string {
  const least = radii * (1 - Math.cos((angle * Math.PI) / 180));
  const flatter = (Math.acos(Math.max(-1, 1 - height / radii)) * 180) / Math.PI;
  return `${formatLength(height, units)} is too low for two bends of ${angle} degrees, which take ${formatLength(least, units)}; make the offset higher or its angle less than ${Math.floor(flatter * 10) / 10} degrees`;
}
