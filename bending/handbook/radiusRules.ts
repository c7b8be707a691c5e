export interface RadiusRule {
  readonly id: string;
  readonly material: string;
  /** Natural inside radius over V, lowest and highest. */
  readonly ratio: readonly [number, number];
  readonly source: string;
  /** Seen in a text, or recalled from memory. */
  readonly seen: boolean;
}

/** Published rules for the natural inside radius of an air bend. They part by some 10 %, and measured radii by more. */
export const radiusRules: readonly RadiusRule[] = [
  { id: "sixth", material: "mild steel", ratio: [1 / 6, 1 / 6], source: "trade chart, mild steel 60 ksi, 88 degree dies", seen: true },
  { id: "0.16", material: "steel 420 MPa", ratio: [0.16, 0.16], source: "trade chart, base 420 MPa", seen: true },
  { id: "5/32", material: "mild steel", ratio: [5 / 32, 5 / 32], source: "trade rule, R = 5 V / 32", seen: true },
  { id: "A36", material: "A36 steel", ratio: [0.15, 0.15], source: "trade magazine, 15 % of the V", seen: true },
  { id: "5052-H32", material: "aluminium 5052-H32", ratio: [0.13, 0.15], source: "trade magazine, 13 to 15 % of the V", seen: true },
  { id: "304", material: "stainless 304", ratio: [0.2, 0.22], source: "trade practice, from memory", seen: false },
  { id: "mild", material: "mild steel", ratio: [0.15, 0.17], source: "trade practice, from memory", seen: false },
];
