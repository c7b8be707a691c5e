import { buildPart, flatDocument, flatPattern, invariant, materialById, type FlangeEntry, type PartDocument, type PartModel } from "@/bending";

const head = { format: "part/1", name: "bench", units: "mm", material: "S235", thickness: 1, insideRadius: 1 } as const;
const up = { angle: 90, direction: "up" } as const;

/** A chain of so many bends, up and down by turns. */
export function corrugated(bends: number): PartDocument {
  return { ...head, profile: { width: 300, legs: Array.from({ length: bends + 1 }, () => 20), bends: Array.from({ length: bends }, (_, i) => ({ angle: 60, direction: i % 2 === 0 ? "up" : "down" })) } };
}

/** A comb: half as many tabs on one long edge, each with a return and a hole across its bend, reliefs between them. */
export function comb(bends: number): PartDocument {
  const tabs = Math.floor(bends / 2);
  const flanges = Array.from({ length: tabs }, (_, i): readonly FlangeEntry[] => [
    { id: `tab${i}`, on: "base", edge: 0, length: 25, ...up, start: 10 + 40 * i, end: 10 + 40 * (tabs - 1 - i), holes: [{ circle: [10, 1], diameter: 5 }] },
    { id: `lip${i}`, on: `tab${i}`, edge: 2, length: 10, ...up },
  ]).flat();
  return { ...head, relief: { kind: "rectangular" }, base: { outline: [[0, 0], [40 * tabs, 0], [40 * tabs, 100], [0, 100]] }, flanges };
}

export function build(document: PartDocument): PartModel {
  const built = buildPart(document, { materials: materialById });
  invariant(built.ok, built.ok ? "" : JSON.stringify(built.error[0]));
  return built.value;
}

/** Everything that the editor asks of a part at each key: the model and its flat. */
export function unfold(document: PartDocument): number {
  return Math.round(flatPattern(build(document)).area * 1000);
}

/** The same part given as a flat with its bend lines. */
export const asFlat = (document: PartDocument): PartDocument => flatDocument(build(document), "mm");
