import { mm, type Mm } from "../core/units";

/** Smallest inside radius over thickness, soft and hard condition; Kalpakjian, from memory. */
export const softHardRadii = {
  "aluminium alloys": [0, 6],
  "low-leaded brass": [0, 2],
  "austenitic stainless": [0.5, 6],
  "low-carbon steel": [0.5, 4],
  titanium: [0.7, 3],
  "titanium alloys": [2.6, 4],
} as const satisfies Record<string, readonly [number, number]>;

/** Rough smallest inside radius of a family of metals (Kalpakjian, from memory); a standard's table goes before it. */
export function softHardRadius(family: keyof typeof softHardRadii, condition: "soft" | "hard", thickness: Mm): Mm {
  const [soft, hard] = softHardRadii[family];
  return mm((condition === "soft" ? soft : hard) * thickness);
}
