import { deg, mm, rad, toRad, type Mm, type Rad } from "../core/units";
import type { MaterialFacts } from "../handbook/material";
import type { AllowanceBasis } from "../handbook/allowanceBasis";
import { bendDeduction } from "../handbook/bendDeduction";
import { kFromAllowance } from "../handbook/kFromAllowance";
import { resolveAllowance, type AllowanceQuestion, type ResolvedAllowance } from "../handbook/resolveAllowance";
import { vOpeningRule } from "../handbook/vOpeningRule";
import type { BendContext, DecidedAllowance } from "./bendContext";
import type { BendDirection, DimensionKind, DocumentVertex, HemKind, PartDocument } from "./partDocument";
import { setback } from "./setback";

export interface BendEntry {
  readonly id: string;
  readonly angle: number;
  readonly direction: BendDirection;
  readonly hem?: HemKind;
  readonly gap?: number;
  readonly insideRadius?: number;
  readonly kFactor?: number;
  readonly toleranceAngle?: number;
  readonly toleranceLength?: number;
  /** Of the flange that the bend carries, where it has them. */
  readonly length?: number;
  readonly outline?: readonly DocumentVertex[];
  readonly dimension?: DimensionKind;
}

export interface ResolvedBend extends Omit<ResolvedAllowance, "basis"> {
  /** Null when it was decided before, by a plan that keeps no more than its source's name. */
  readonly basis: AllowanceBasis | null;
  readonly id: string;
  readonly angle: Rad;
  readonly direction: BendDirection;
  readonly hem: HemKind | null;
  readonly insideRadius: Mm;
  readonly radiusSource: string;
  readonly toleranceAngle: Rad | null;
  readonly toleranceLength: Mm | null;
}

/** Radius, allowance and setback of one bend; the document and the entry are in mm. */
export function resolveBend(entry: BendEntry, document: PartDocument, material: MaterialFacts, context: BendContext): ResolvedBend {
  const { radius, source } = insideRadius(entry, document, material, context);
  const angle = entry.hem === "teardrop" && entry.angle <= 180 ? closingAngle(entry, document, radius) : toRad(deg(entry.angle));
  const tolerance = entry.toleranceAngle ?? document.toleranceAngle;
  const toleranceLength = entry.toleranceLength ?? document.toleranceLength;
  const thickness = mm(document.thickness);
  const decided = context.decidedOf?.(entry.id);
  return {
    ...(decided ? takenOver(decided, angle, radius, thickness) : resolveAllowance({
      rule: document.rule,
      kOverride: entry.kFactor ?? document.kFactor,
      material,
      thickness,
      insideRadius: radius,
      angle,
      closedHem: entry.hem === "closed",
      shop: entry.hem === undefined ? shopFor(entry.id, { radius, source, thickness, material }, context) : undefined,
    })),
    id: entry.id,
    angle,
    direction: entry.direction,
    hem: entry.hem ?? null,
    insideRadius: radius,
    radiusSource: source,
    toleranceAngle: tolerance === undefined ? null : toRad(deg(tolerance)),
    toleranceLength: toleranceLength === undefined ? null : mm(toleranceLength),
  };
}

/**
 * How far the loop of a teardrop hem turns: on past half a turn until the end of its leg rests on the sheet. Both tangents
 * from there to the loop are as long as the leg, so the rest is 2 atan(r / leg); three quarters of a turn at most.
 */
function closingAngle(entry: BendEntry, document: PartDocument, radius: Mm): Rad {
  const kind = entry.dimension ?? document.dimension ?? "outside";
  const drawn = entry.outline ? Math.max(...entry.outline.map(([, y]) => y)) : entry.length;
  if (drawn === undefined || radius === 0) return rad(Math.PI);
  const leg = drawn - setback(entry.outline ? "outside" : kind, rad(Math.PI), radius, mm(document.thickness));
  return rad(Math.PI + 2 * Math.atan(radius / Math.max(leg, radius)));
}

function takenOver({ allowance, source, basis }: DecidedAllowance, angle: Rad, radius: Mm, thickness: Mm): Omit<ResolvedAllowance, "basis"> & { readonly basis: AllowanceBasis | null } {
  return { allowance, deduction: bendDeduction(angle, radius, thickness, allowance), k: kFromAllowance(allowance, angle, radius, thickness), source, basis };
}

/** The shop's table, and the V to ask it for: the die's, else the one whose natural radius the bend has, else the usual one. */
function shopFor(id: string, bend: { readonly radius: Mm; readonly source: string; readonly thickness: Mm; readonly material: MaterialFacts }, { shopTable, openingOf, radiusOf }: BendContext): AllowanceQuestion["shop"] {
  if (!shopTable || shopTable.cells.length === 0) return undefined;
  const ofDie = openingOf?.(id);
  if (ofDie) return { table: shopTable, vOpening: ofDie, openingFrom: "die" };
  const given = bend.source === "document" || radiusOf?.(id);
  return given
    ? { table: shopTable, vOpening: mm(bend.radius / bend.material.naturalRadiusRatio), openingFrom: "radius" }
    : { table: shopTable, vOpening: vOpeningRule(bend.thickness), openingFrom: "usual" };
}

/** The hem's gap, else the bend's own radius, the part's, the die's, the material's; the first that is given. */
function insideRadius(entry: BendEntry, document: PartDocument, material: MaterialFacts, { radiusOf }: BendContext): { radius: Mm; source: string } {
  if (entry.hem === "closed") return { radius: mm(0), source: "closed hem" };
  if (entry.hem && entry.gap !== undefined) return { radius: mm(entry.gap / 2), source: "half the hem's gap" };
  if (entry.insideRadius !== undefined) return { radius: mm(entry.insideRadius), source: "document" };
  if (document.insideRadius !== undefined) return { radius: mm(document.insideRadius), source: "document" };
  return radiusOf?.(entry.id) ?? {
    radius: mm(material.defaultRadiusPerThickness * document.thickness),
    source: `default of ${material.id}: ${material.defaultRadiusPerThickness} x thickness`,
  };
}
