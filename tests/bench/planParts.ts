import { materialById } from "@/bending/handbook/materials";
import type { FlangeEntry, PartDocument } from "@/bending/part/partDocument";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import { mustRead } from "@/seeds/mustRead";
import { largeBrake } from "@/seeds/shop/machines";
import { tooling } from "@/seeds/shop/tools";
import { pieceStates } from "@/seeds/shop/tools/pieceStates";

const head = { format: "part/1", units: "mm", material: "S235", thickness: 1.5, insideRadius: 1.5 } as const;

/** Waves of 45 degrees with equal legs: nearly every order can be made, and many are alike. */
function corrugated(bends: number): PartDocument {
  return {
    ...head, name: `Corrugated sheet with ${bends} bends`,
    profile: { width: 300, legs: Array.from({ length: bends + 1 }, () => 45), bends: Array.from({ length: bends }, (_, i) => ({ angle: 45, direction: i % 4 === 0 || i % 4 === 3 ? "up" : "down" })) },
  };
}

/** Hats side by side, 90 degrees, no two legs of one length. */
function hats(bends: number): PartDocument {
  return {
    ...head, name: `Hat profile with ${bends} bends`,
    profile: {
      width: 400,
      legs: Array.from({ length: bends + 1 }, (_, i) => (i % 2 === 0 ? 40 + 3 * ((i * 7) % 11) : 22 + 2 * ((i * 5) % 7))),
      bends: Array.from({ length: bends }, (_, i) => ({ angle: 90, direction: i % 4 === 0 || i % 4 === 3 ? "up" : "down" })),
    },
  };
}

/** A tray whose walls carry rims turned outwards: one to three returns on each side. */
function tray(bends: number): PartDocument {
  const [wall, ...returns] = [40, 24, 16, 12].slice(0, bends / 4);
  const flanges = [0, 1, 2, 3].flatMap((edge): readonly FlangeEntry[] => [
    { id: `wall${edge}`, on: "base", edge, length: wall ?? 40, angle: 90, direction: "up", start: 2, end: 2 },
    ...returns.map((length, i): FlangeEntry => ({ id: `rim${edge}${i}`, on: i === 0 ? `wall${edge}` : `rim${edge}${i - 1}`, edge: 2, length, angle: i < 2 ? 90 : 45, direction: "down", start: 1, end: 1 })),
  ]);
  return { ...head, name: `Tray with ${bends} bends`, base: { outline: [[0, 0], [360, 0], [360, 240], [0, 240]] }, flanges };
}

export const planParts = { corrugated, hats, tray } as const;

/** A whole plan on the invented shop's larger brake with what its toolroom has in service. */
export function planRequestFor(document: PartDocument): PlanRequest {
  const tools = mustRead("tooling", readToolingDocument(tooling)).map((tool) => ({
    ...tool, pieces: tool.pieces.filter((piece) => (pieceStates[piece.id]?.state ?? "at brake") === "at brake"),
  }));
  return { document, materials: materialById, tools, machine: mustRead("brake", readMachineDocument(largeBrake)), batch: 20 };
}
