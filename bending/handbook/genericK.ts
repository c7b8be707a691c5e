import type { Mm } from "../core/units";

/** K for soft, medium and hard material, air bending, by radius over thickness. */
const ROWS: readonly (readonly [upTo: number, k: Readonly<Record<"soft" | "medium" | "hard", number>>])[] = [
  [1, { soft: 0.33, medium: 0.38, hard: 0.4 }],
  [3, { soft: 0.4, medium: 0.43, hard: 0.45 }],
  [Infinity, { soft: 0.5, medium: 0.5, hard: 0.5 }],
];

/** Generic K for air bending (encyclopaedia article on bending of metal): R up to T, up to 3 T, over 3 T. It jumps between its rows. */
export function genericK(hardness: "soft" | "medium" | "hard", insideRadius: Mm, thickness: Mm): number {
  const row = ROWS.find(([upTo]) => insideRadius <= upTo * thickness);
  return row?.[1][hardness] ?? 0.5;
}
