/** The usual lengths in which the invented shop buys its tools, mm; L and R are horns, cut away at that end. */
const split = ["200", "100", "100", "100L", "100R", "50", "40", "20", "15", "10"] as const;

export const sectionSets = {
  /** Three metres in long pieces, and one piece's length in a split set. */
  bed: ["835", "835", "835", "300", ...split],
  long: ["835", "835", "835"],
  split: ["415", ...split],
  pair: ["835", "415"],
  short: ["415", "200", "100", "50"],
} as const satisfies Readonly<Record<string, readonly string[]>>;

export type SectionSet = keyof typeof sectionSets;
