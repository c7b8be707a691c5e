import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { lengthCure } from "./lengthCure";
import type { StockSheet } from "./shopLimits";
import { shownLength } from "./shownLength";

/** A blank that no stock sheet holds, turned by 90 degrees or not. With a grain along x or y the grain must lie along the sheet's length (common practice, no source). */
export function largeBlank({ shop, flat, units, fields }: FindingsContext): readonly Finding[] {
  if (!shop || shop.stock.length === 0) return [];
  const { grain } = fields.inMm;
  const ways = grain === "x" ? [[flat.width, flat.depth]] : grain === "y" ? [[flat.depth, flat.width]] : [[flat.width, flat.depth], [flat.depth, flat.width]];
  const fits = ({ length, width }: StockSheet) => ways.some(([long = 0, across = 0]) => long <= length + 1e-6 && across <= width + 1e-6);
  if (shop.stock.some(fits)) return [];
  const largest = shop.stock.reduce((best, one) => (one.length * one.width > best.length * best.width ? one : best));
  const size = (a: number, b: number) => `${shownLength(a, units).replace(/ .*/, "")} × ${shownLength(b, units)}`;
  // A profile's width runs along its bends: what is left for it beside the developed length.
  const room = fields.inMm.profile
    ? Math.max(...shop.stock.map(({ length, width }) => Math.max(grain !== "y" && flat.width <= length + 1e-6 ? width : 0, grain !== "x" && flat.width <= width + 1e-6 ? length : 0)))
    : 0;
  return [{
    key: "blank",
    rule: "blank",
    severity: "stop",
    title: "Larger than the stock sheet",
    message: `The blank is ${size(flat.width, flat.depth)}; the largest sheet in stock is ${size(largest.length, largest.width)}${grain === undefined ? "" : ", with the grain along its length"}. Make the part smaller or join it from two.`,
    source: "the shop’s stock sheets",
    faces: [],
    bends: [],
    paths: fields.inMm.profile ? ["profile.width"] : [],
    marks: [{ kind: "region", outline: flat.outline }],
    measure: null,
    cure: room > 0 ? lengthCure("profile.width", room, "down", units) : null,
  }];
}
