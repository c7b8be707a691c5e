import type { Figure } from "./answer";

const of = (kind: Figure["kind"]) => (value: number): Figure => ({ value, kind });

/** Makers of figures by what they measure: `figures.length(2)` is 2 mm. */
export const figures = {
  length: of("length"), angle: of("angle"), force: of("force"), stress: of("stress"), mass: of("mass"), density: of("density"), ratio: of("ratio"), count: of("count"),
} as const;
