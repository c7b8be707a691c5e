import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { mm } from "../core/units";
import { FORCE_V_RANGE } from "../handbook/airBendForce";
import { naturalRadius } from "../handbook/naturalRadius";
import { vOpeningRule } from "../handbook/vOpeningRule";
import { buildPart } from "../part/buildPart";
import type { PartModel } from "../part/partModel";
import type { PlanRequest } from "./planRequest";

/** One flat pattern to plan: where the radius follows from the die, the V that it follows from. */
export interface PartVariant {
  readonly part: PartModel;
  readonly vOpening: number | null;
  /** The V that is looked for first. */
  readonly wantedV: number;
}

/**
 * The flat patterns worth planning. When the document gives every inside radius there is one; else one for each
 * V in service that suits the thickness, the nearest to the usual one first.
 */
export function partVariants(request: PlanRequest): Result<readonly PartVariant[], readonly FieldProblem[]> {
  const { document, materials, tools } = request;
  const plain = buildPart(document, { materials });
  if (!plain.ok) return plain;
  const part = plain.value;
  const usual = vOpeningRule(part.thickness);
  if (part.bends.every((bend) => bend.radiusSource === "document" || bend.hem !== null)) {
    return ok([{ part, vOpening: null, wantedV: wantedByRadius(part) ?? usual }]);
  }
  const suits = (v: number) => v >= FORCE_V_RANGE[0] * part.thickness - 1e-9 && v <= FORCE_V_RANGE[1] * part.thickness + 1e-9;
  const openings = [...new Set(tools.flatMap((tool) => (tool.kind === "die" && suits(tool.vOpening) ? [tool.vOpening] : [])))]
    .sort((a, b) => Math.abs(Math.log(a / usual)) - Math.abs(Math.log(b / usual)));
  const variants: PartVariant[] = [];
  const problems: FieldProblem[] = [];
  for (const v of openings) {
    const built = buildPart(document, { materials, radiusOf: () => ({ radius: naturalRadius(part.material, v), source: `natural radius of a V ${v} mm die` }) });
    if (built.ok) variants.push({ part: built.value, vOpening: v, wantedV: v });
    else problems.push(...built.error);
  }
  if (variants.length > 0) return ok(variants);
  return openings.length > 0 ? fail(problems) : ok([{ part, vOpening: null, wantedV: usual }]);
}

/** The V whose natural radius is the middle one of those that the document asks for. */
function wantedByRadius(part: PartModel): number | null {
  const radii = part.bends.map((bend) => bend.insideRadius as number).sort((a, b) => a - b);
  const middle = radii[Math.floor(radii.length / 2)];
  return middle === undefined || middle <= 0 ? null : mm(middle / part.material.naturalRadiusRatio);
}
