import { deg, mm, toRad, type Mm, type Rad } from "../core/units";
import type { MaterialFacts } from "../handbook/material";
import { resolveAllowance, type ResolvedAllowance } from "../handbook/resolveAllowance";
import type { BendDirection, HemKind, PartDocument } from "./partDocument";

export interface BendEntry {
  readonly id: string;
  readonly angle: number;
  readonly direction: BendDirection;
  readonly hem?: HemKind;
  readonly gap?: number;
  readonly insideRadius?: number;
  readonly kFactor?: number;
  readonly toleranceAngle?: number;
}

export interface ResolvedBend extends ResolvedAllowance {
  readonly id: string;
  readonly angle: Rad;
  readonly direction: BendDirection;
  readonly hem: HemKind | null;
  readonly insideRadius: Mm;
  readonly radiusSource: string;
  readonly toleranceAngle: Rad | null;
}

export type RadiusOf = (bendId: string) => { readonly radius: Mm; readonly source: string } | null;

/** Radius, allowance and setback of one bend; the document and the entry are in mm. */
export function resolveBend(entry: BendEntry, document: PartDocument, material: MaterialFacts, radiusOf: RadiusOf | undefined): ResolvedBend {
  const angle = toRad(deg(entry.angle));
  const { radius, source } = insideRadius(entry, document, material, radiusOf);
  const tolerance = entry.toleranceAngle ?? document.toleranceAngle;
  return {
    ...resolveAllowance({
      rule: document.rule,
      kOverride: entry.kFactor ?? document.kFactor,
      material,
      thickness: mm(document.thickness),
      insideRadius: radius,
      angle,
      closedHem: entry.hem === "closed",
    }),
    id: entry.id,
    angle,
    direction: entry.direction,
    hem: entry.hem ?? null,
    insideRadius: radius,
    radiusSource: source,
    toleranceAngle: tolerance === undefined ? null : toRad(deg(tolerance)),
  };
}

/** The hem's gap, else the bend's own radius, the part's, the die's, the material's; the first that is given. */
function insideRadius(entry: BendEntry, document: PartDocument, material: MaterialFacts, radiusOf: RadiusOf | undefined): { radius: Mm; source: string } {
  if (entry.hem === "closed") return { radius: mm(0), source: "closed hem" };
  if (entry.hem && entry.gap !== undefined) return { radius: mm(entry.gap / 2), source: "half the hem's gap" };
  if (entry.insideRadius !== undefined) return { radius: mm(entry.insideRadius), source: "document" };
  if (document.insideRadius !== undefined) return { radius: mm(document.insideRadius), source: "document" };
  return radiusOf?.(entry.id) ?? {
    radius: mm(material.defaultRadiusPerThickness * document.thickness),
    source: `default of ${material.id}: ${material.defaultRadiusPerThickness} x thickness`,
  };
}
