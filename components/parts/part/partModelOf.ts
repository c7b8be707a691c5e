import type { FieldProblem } from "@/bending/core/problem";
import { ok, type Result } from "@/bending/core/result";
import type { MaterialFacts } from "@/bending/handbook/material";
import { buildPart } from "@/bending/part/buildPart";
import { flatPattern, type FlatPattern } from "@/bending/part/flatPattern";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";
import type { ShopTable } from "@/bending/shopTable/shopCell";

/** A stored document made ready to draw, with the shop's materials and measured values. */
export function partModelOf(document: PartDocument, materials: readonly MaterialFacts[], shopTable?: ShopTable): Result<{ readonly part: PartModel; readonly flat: FlatPattern }, readonly FieldProblem[]> {
  const built = buildPart(document, { materials: (id) => materials.find((material) => material.id === id), shopTable });
  return built.ok ? ok({ part: built.value, flat: flatPattern(built.value) }) : built;
}
