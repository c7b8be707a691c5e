import { findingsOf } from "@/bending/findings/findingsOf";
import { trialShop } from "@/bending/findings/trial/trialShop";
import { materialById } from "@/bending/handbook/materials";
import { buildPart } from "@/bending/part/buildPart";
import type { FlangeEntry, PartDocument } from "@/bending/part/partDocument";

const common = { format: "part/1", units: "mm", material: "S235", thickness: 1.5, insideRadius: 2 } as const;

/** A corrugated sheet, every wall a little too short for its V. */
function corrugated(bends: number): PartDocument {
  return {
    ...common, name: `Corrugated ${bends}`,
    profile: { width: 400, legs: Array.from({ length: bends + 1 }, (_, i) => (i % 2 === 0 ? 30 : 9)), bends: Array.from({ length: bends }, (_, i) => ({ angle: 90, direction: i % 4 < 2 ? "up" : "down" })) },
  };
}

/** A long plate with a tab out of each tooth of its edge, and a hole beside every tab. */
function comb(bends: number): PartDocument {
  const outline: [number, number][] = [[0, 0]];
  const flanges = Array.from({ length: bends }, (_, i): FlangeEntry => {
    const x = i * 40;
    outline.push([x + 30, 0]);
    if (i < bends - 1) outline.push([x + 30, 8], [x + 40, 8], [x + 40, 0]);
    return { id: `tab${i}`, on: "base", edge: i * 4, length: 6 + (i % 20), angle: 60 + (i % 60), direction: i % 2 === 0 ? "up" : "down" };
  });
  outline.push([bends * 40 - 10, 100], [0, 100]);
  return { ...common, name: `Comb ${bends}`, base: { outline, holes: flanges.map((_, i) => ({ circle: [i * 40 + 15, 7 + (i % 10)], diameter: 5 })) }, flanges };
}

export const findingParts = { corrugated, comb } as const;

/** What is measured: a part of the document, and its findings. */
export function partOf(document: PartDocument) {
  const built = buildPart(document, { materials: materialById });
  if (!built.ok) throw new Error(JSON.stringify(built.error.slice(0, 3)));
  return built.value;
}

export function judged(document: PartDocument, part: ReturnType<typeof partOf>): readonly string[] {
  return findingsOf({ part, document, shop: trialShop }).list.map(({ key, severity }) => `${severity} ${key}`);
}
