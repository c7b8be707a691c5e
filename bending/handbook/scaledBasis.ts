import type { Plain } from "../core/plain";
import type { AllowanceBasis, AllowanceSaid, ShopBasis } from "./allowanceBasis";

/** A basis with its lengths times a factor: into a document's unit, or back into mm. */
export function scaledBasis(basis: Plain<AllowanceBasis>, factor: number, round: (value: number) => number = (value) => value): Plain<AllowanceBasis> {
  const length = (value: number) => round(value * factor);
  return { ...saidScaled(basis, length), k: round(basis.k), next: basis.next && { ...saidScaled(basis.next, length), k: round(basis.next.k) } };
}

type Length = (value: number) => number;

const saidScaled = <T extends Plain<AllowanceSaid>>(said: T, length: Length): T =>
  ({ ...said, allowance: length(said.allowance), deduction: length(said.deduction), shop: said.shop && shopScaled(said.shop, length) });

const shopScaled = (shop: Plain<ShopBasis>, length: Length): Plain<ShopBasis> => ({
  ...shop,
  spread: shop.spread === null ? null : length(shop.spread),
  expanded: length(shop.expanded),
  vOpening: length(shop.vOpening),
  places: shop.places.map((place) => ({ ...place, thickness: length(place.thickness), vOpening: length(place.vOpening), punchRadii: place.punchRadii.map(length) })),
});
