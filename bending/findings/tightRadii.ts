import { minimumRadius } from "../handbook/minimumRadius";
import type { Bend } from "../part/partModel";
import { bendLines } from "./bendLines";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { lengthCure } from "./lengthCure";
import { named } from "./named";
import { shownLength } from "./shownLength";

/**
 * Bends tighter than the material bears with its grain as drawn: along the grain when the bend line lies nearer to it than
 * 45 degrees (common practice, no source), across it else. Without a grain direction bends are judged as across. Bends that
 * one field decides and that lack the same make one finding.
 */
export function tightRadii(context: FindingsContext): readonly Finding[] {
  const { part, fields } = context;
  const groups = new Map<string, { readonly bends: Bend[]; readonly path: string; readonly least: number; readonly source: string; readonly along: boolean }>();
  for (const bend of part.bends) {
    if (bend.hem !== null) continue;
    const along = liesAlongGrain(bend, fields.inMm.grain);
    // A table that does not tell the two ways apart holds for both.
    const least = minimumRadius(part.material, part.thickness, bend.angle, along) ?? minimumRadius(part.material, part.thickness, bend.angle);
    if (!least || bend.insideRadius >= least.radius - 1e-6) continue;
    const path = fields.ofBend.get(bend.id)?.radiusPath ?? "insideRadius";
    const key = `${path} ${bend.insideRadius} ${least.radius} ${least.source}`;
    const group = groups.get(key) ?? { bends: [], path, least: least.radius, source: least.source, along };
    groups.set(key, group);
    group.bends.push(bend);
  }
  return [...groups.values()].map(({ bends, path, least, source, along }): Finding => {
    const radius = bends[0]?.insideRadius ?? 0;
    const ids = bends.map(({ id }) => id);
    const grain = fields.inMm.grain === undefined ? " The grain is not given; along it the radius must be larger still." : along ? " The bend line lies along the grain." : "";
    const from = bends[0]?.radiusSource === "document" ? "" : ` (${bends[0]?.radiusSource ?? ""})`;
    const floor = shownLength(least, context.units);
    return {
      key: `radius ${path} ${source} ${ids[0] ?? ""}`,
      rule: "radius",
      severity: "caution",
      title: "Radius under the material’s minimum",
      message: `${named("Bend", ids)} ${ids.length > 1 ? "have" : "has"} an inside radius of ${shownLength(radius, context.units)}${from}; ${part.material.id} may crack under ${floor}.${fields.inMm.grain === undefined && part.material.group !== "steel" ? "" : grain}`,
      source,
      faces: [],
      bends: ids,
      paths: [path],
      marks: bendLines(bends),
      measure: { value: radius, wanted: least, unit: "mm" },
      cure: lengthCure(path, least, "up", context.units),
    };
  });
}

function liesAlongGrain({ line: [[ax, ay], [bx, by]] }: Bend, grain: "x" | "y" | number | undefined): boolean {
  if (grain === undefined) return false;
  const direction = grain === "x" ? 0 : grain === "y" ? Math.PI / 2 : (grain * Math.PI) / 180;
  const apart = Math.abs(Math.sin(Math.atan2(by - ay, bx - ax) - direction));
  return apart < Math.SQRT1_2 - 1e-9;
}
