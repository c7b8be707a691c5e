import type { Plain } from "@/bending/core/plain";
import type { LengthUnit } from "@/bending/core/units";
import type { AllowanceSaid, ShopBasis } from "@/bending/handbook/allowanceBasis";
import { fineLength } from "./fineLength";
import { formatAngle } from "./formatAngle";
import { formatLength } from "./formatLength";

/** Where a bend's allowance is from, in a few words: "shop, 5 trials, ±0.04 mm". Lengths of the basis in mm. */
export function allowanceText(said: Plain<AllowanceSaid>, units: LengthUnit): string {
  switch (said.kind) {
    case "override": return "K by hand";
    case "closed hem": return "closed hem, common practice";
    case "handbook": return said.text;
    case "shop":
    case "shop interpolated": return said.shop === null ? said.text : `${shopText(said.shop, said.kind, units)}, ±${fineLength(said.shop.expanded, units)}`;
    default: return said.kind satisfies never;
  }
}

function shopText(shop: Plain<ShopBasis>, kind: "shop" | "shop interpolated", units: LengthUnit): string {
  if (kind === "shop") return `shop, ${shop.count} ${shop.count === 1 ? "trial" : "trials"}`;
  const { places } = shop;
  const ends = [
    between(places.map(({ thickness }) => thickness), (values) => values.map((value) => formatLength(value, units, false)).join(" and ") + ` ${units} thick`),
    between(places.map(({ vOpening }) => vOpening), (values) => `${values.map((value) => `V ${formatLength(value, units, false)}`).join(" and ")} ${units}`),
    between(places.map(({ angle }) => angle), (values) => values.map(formatAngle).join(" and ")),
  ].filter((text) => text !== "");
  return `between shop values ${ends.join(", ")}`;
}

/** Only what differs from place to place is named. */
function between(values: readonly number[], say: (ends: readonly number[]) => string): string {
  const ends = [...new Set([Math.min(...values), Math.max(...values)])];
  return ends.length > 1 ? say(ends) : "";
}
