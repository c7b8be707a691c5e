import { mmPer, type LengthUnit } from "@/bending/core/units";
import type { MaterialFacts } from "@/bending/handbook/material";
import { thicknessClass } from "@/bending/shopTable/thicknessClass";
import { formatNumber } from "@/lib/format/formatNumber";
import { parseLength } from "@/lib/format/parseLength";
import type { TrialLine } from "./trialDraft";

/** The nominal thickness that a line is filed under when none is typed, in its units; null until the thickness can be read. */
export function standingNominal(line: TrialLine, units: LengthUnit, materials: readonly MaterialFacts[]): string | null {
  const group = materials.find(({ id }) => id.toLowerCase() === line.material.trim().toLowerCase())?.group;
  const thickness = parseLength(line.thickness, units, { gaugeGroup: group });
  if (group === undefined || !thickness.ok || thickness.value <= 0) return null;
  return formatNumber(thicknessClass({ units, thickness: thickness.value }, group) / mmPer(units), units === "in" ? 4 : 2);
}
