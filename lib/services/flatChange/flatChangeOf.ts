import type { ShopNow } from "./loadShopNow";
import { whyChanged } from "./whyChanged";
import { FLAT_CHANGE_MM } from "@/bending/core/tolerance";
import type { BendContext } from "@/bending/part/bendContext";
import { buildPart } from "@/bending/part/buildPart";
import { flatPattern } from "@/bending/part/flatPattern";
import type { PartDocument } from "@/bending/part/partDocument";
import type { FlatChange } from "@/lib/schemas/views";

export interface FlatThen {
  readonly document: PartDocument;
  /** Width and depth in mm, as stored. */
  readonly size: readonly [number, number];
  /** What was measured or changed later may be why the flat is another one now. */
  readonly since: Date;
  /** The V of each bend's die, where a plan has chosen it. */
  readonly context?: Pick<BendContext, "openingOf" | "radiusOf">;
}

/**
 * How a flat that was computed before would come out now, and what changed; null when it would be the same, or when nothing that it follows
 * from can have changed, or when the part cannot be built any more (its own page says so).
 */
export function flatChangeOf(then: FlatThen, shop: ShopNow): FlatChange | null {
  const { document, size, since } = then;
  const material = shop.materials.get(document.material);
  if (!material) return null;
  const measured = shop.table.cells.some((cell) => cell.material === material.id) || [...shop.trialsOf.values()].some((trials) => trials[0]?.material_id === material.id);
  if (!measured && material.changed_at <= since) return null;
  const built = buildPart(document, { materials: shop.lookup, shopTable: shop.table, ...then.context });
  if (!built.ok) return null;
  const { width, depth } = flatPattern(built.value);
  if (Math.abs(width - size[0]) < FLAT_CHANGE_MM && Math.abs(depth - size[1]) < FLAT_CHANGE_MM) return null;
  return { units: document.units, thenMm: size, nowMm: [width, depth], why: whyChanged(built.value, material, shop, { since, units: document.units }) };
}
