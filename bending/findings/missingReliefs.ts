import type { Vec2 } from "../geometry/vec2";
import { polygonBounds } from "../geometry/polygonBounds";
import { polygonContains } from "../geometry/polygonContains";
import { reliefSize } from "../handbook/reliefSize";
import { bendDirections } from "../part/bendDirections";
import type { Bend } from "../part/partModel";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { lengthCure } from "./lengthCure";
import { shownLength } from "./shownLength";

/** mm past the end of a bend where it is asked whether sheet lies there: over rounding, far under any relief. */
const BESIDE_MM = 0.02;
/** Shares of the way across the bend zone at which it is asked. */
const ACROSS = [0.05, 0.25, 0.5, 0.75, 0.95] as const;
const SOURCE = "relief one thickness wide, and as deep as radius and thickness (from memory)";

/** Bends that end next to sheet which stays as it is, without a relief or with one that is too narrow. */
export function missingReliefs(context: FindingsContext): readonly Finding[] {
  const { part, fields } = context;
  return part.bends.flatMap((bend): readonly Finding[] => {
    const own = fields.ofBend.get(bend.id);
    const { width: [least] } = reliefSize(part.thickness, bend.insideRadius);
    const relief = own?.relief;
    if (relief && (relief.kind === "rectangular" || relief.kind === "round")) return relief.width !== null && relief.width < least - 1e-9 ? [narrow(context, bend, relief.path, relief.width, least)] : [];
    const held = relief?.kind === "tear" ? [] : heldEnds(context, bend);
    return held.length === 0 ? [] : [{
      key: `relief ${bend.id}`,
      rule: "relief",
      severity: "caution",
      title: "No relief",
      message: `Bend ${bend.id} ends next to sheet that stays flat, ${held.length === 2 ? "on both sides" : "on one side"}; it tears there as it forms. A relief ${shownLength(least, context.units)} wide or more frees it, or choose to let it tear.`,
      source: SOURCE,
      faces: [part.faces[bend.parent]?.id ?? "", part.faces[bend.child]?.id ?? ""],
      bends: [bend.id],
      paths: own ? [`${own.path}.relief`] : [],
      marks: held.flatMap(([from, to]) => [{ kind: "line" as const, from, to }, { kind: "point" as const, at: from }]),
      measure: null,
      cure: own?.takesRelief ? { path: `${own.path}.relief`, value: { kind: "rectangular" }, says: "a rectangular relief" } : null,
    }];
  });
}

function narrow(context: FindingsContext, bend: Bend, path: string, width: number, least: number): Finding {
  const at = [bend.zone[0], bend.zone[3]];
  return {
    key: `relief-width ${bend.id}`,
    rule: "relief-width",
    severity: "caution",
    title: "Relief too narrow",
    message: `The relief of bend ${bend.id} is ${shownLength(width, context.units)} wide; ${shownLength(least, context.units)}, the thickness, is the least that cuts and bends clean.`,
    source: SOURCE,
    faces: [],
    bends: [bend.id],
    paths: [`${path}.width`],
    marks: at.map((point) => ({ kind: "point", at: point })),
    measure: { value: width, wanted: least, unit: "mm" },
    cure: lengthCure(`${path}.width`, least, "up", context.units),
  };
}

/** The ends of the bend zone with sheet beside them, as lines across the zone. */
function heldEnds({ part }: FindingsContext, bend: Bend): readonly (readonly [Vec2, Vec2])[] {
  const { along } = bendDirections(bend);
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  const { outline } = part.faces[bend.parent] ?? { outline: [] };
  const { min, max } = polygonBounds(outline);
  const sheetBeside = ([from, to]: readonly [Vec2, Vec2], way: number) => ACROSS.some((share) => {
    const p: Vec2 = [from[0] + (to[0] - from[0]) * share + along[0] * BESIDE_MM * way, from[1] + (to[1] - from[1]) * share + along[1] * BESIDE_MM * way];
    return p[0] > min[0] && p[0] < max[0] && p[1] > min[1] && p[1] < max[1] && polygonContains(outline, p);
  });
  const ends = [{ line: [parentStart, childStart] as const, way: -1 }, { line: [parentEnd, childEnd] as const, way: 1 }];
  return ends.filter(({ line, way }) => sheetBeside(line, way)).map(({ line }) => line);
}
