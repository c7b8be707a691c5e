import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { mm } from "../core/units";
import { FORCE_V_RANGE } from "../handbook/airBendForce";
import { naturalRadius } from "../handbook/naturalRadius";
import { vOpeningRule } from "../handbook/vOpeningRule";
import { buildPart } from "../part/buildPart";
import type { Bend, PartModel } from "../part/partModel";
import type { PlanRequest } from "./planRequest";
import { withStrokes, type StruckPart } from "./withStrokes";

/** One flat pattern to plan: where the radius or the shop's value follows from the die, the V that it follows from. */
export interface PartVariant extends StruckPart {
  readonly vOpening: number | null;
  /** Every bend is made on that V, also one whose radius the document gives. */
  readonly everyBend: boolean;
  /** The V that is looked for first. */
  readonly wantedV: number;
}

/**
 * The flat patterns worth planning. When the document gives every inside radius there is one; else one for each
 * V in service that suits the thickness, the nearest to the usual one first. Where the shop has measured bends of a given radius, the
 * deduction is another on each V: then a flat for each V with every bend on it comes first, and what takes several V's last.
 */
export function partVariants(request: PlanRequest): Result<readonly PartVariant[], readonly FieldProblem[]> {
  const { document, materials, shopTable } = request;
  const plain = buildPart(document, { materials });
  if (!plain.ok) return plain;
  const part = plain.value;
  const given = part.bends.every(hasOwnRadius);
  const usual = vOpeningRule(part.thickness);
  const wanted = (given ? wantedByRadius(withStrokes(part, request).part) : null) ?? usual;
  const openings = openingsInService(request, part.thickness, wanted);
  const flats = given && !shopTable ? [] : openings.map((v) => ({ v, built: flatForOpening(request, part, v) }));
  const measured = flats.some(({ built }) => built.ok && built.value.bends.some((bend) => hasOwnRadius(bend) && bend.allowanceBasis?.shop));
  const onEach = (everyBend: boolean) => flats.flatMap(({ v, built }): PartVariant[] => (built.ok ? [{ ...withStrokes(built.value, request), vOpening: v, everyBend, wantedV: v }] : []));
  const strict = measured ? onEach(true) : [];
  if (given) {
    return ok([...strict, { ...withStrokes(ofSeveralOpenings(request, part, measured), request), vOpening: null, everyBend: false, wantedV: wanted }]);
  }
  const variants = [...strict, ...onEach(false)];
  if (variants.length > 0) return ok(variants);
  const problems = flats.flatMap(({ built }) => (built.ok ? [] : built.error));
  return openings.length > 0 ? fail(problems) : ok([{ ...withStrokes(part, request), vOpening: null, everyBend: false, wantedV: usual }]);
}

/**
 * The flat when each bend is made on the V that pleases: the shop's values of the V that a radius stands for, where a die in service has
 * been measured at all; else the handbook's.
 */
function ofSeveralOpenings({ document, materials, shopTable }: PlanRequest, plain: PartModel, measured: boolean): PartModel {
  const built = shopTable ? buildPart(document, { materials, shopTable }) : null;
  return built?.ok && (measured || built.value.bends.every((bend) => !bend.allowanceBasis?.shop)) ? built.value : plain;
}

const hasOwnRadius = (bend: Bend): boolean => bend.radiusSource === "document" || bend.hem !== null;

/** V openings that suit the thickness, the nearest to the wanted one first. */
function openingsInService({ tools }: PlanRequest, thickness: number, wanted: number): readonly number[] {
  const suits = (v: number) => v >= FORCE_V_RANGE[0] * thickness - 1e-9 && v <= FORCE_V_RANGE[1] * thickness + 1e-9;
  return [...new Set(tools.flatMap((tool) => (tool.kind === "die" && suits(tool.vOpening) ? [tool.vOpening] : [])))]
    .sort((a, b) => Math.abs(Math.log(a / wanted)) - Math.abs(Math.log(b / wanted)));
}

/** Every bend on one V: the radius that it gives where the document gives none, and the shop's value for it. */
function flatForOpening({ document, materials, shopTable }: PlanRequest, part: PartModel, v: number): Result<PartModel, readonly FieldProblem[]> {
  return buildPart(document, { materials, shopTable, openingOf: () => mm(v), radiusOf: () => ({ radius: naturalRadius(part.material, mm(v)), source: `natural radius of a V ${v} mm die` }) });
}

/** The V whose natural radius is the middle one of those that the document asks for. */
function wantedByRadius(part: PartModel): number | null {
  const radii = part.bends.map((bend) => bend.insideRadius as number).sort((a, b) => a - b);
  const middle = radii[Math.floor(radii.length / 2)];
  return middle === undefined || middle <= 0 ? null : mm(middle / part.material.naturalRadiusRatio);
}
