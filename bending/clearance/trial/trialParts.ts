import { invariant } from "../../core/invariant";
import { materialById } from "../../handbook/materials";
import { buildPart } from "../../part/buildPart";
import type { FlangeEntry, PartDocument } from "../../part/partDocument";
import type { PartModel } from "../../part/partModel";

/** A small generator of its own (Park and Miller, 1988), so that a case can be made again from its number. */
export function createDice(seed: number): (from: number, to: number) => number {
  let state = (seed * 7919 + 12345) % 2147483647 || 1;
  const next = () => (state = (state * 48271) % 2147483647) / 2147483647;
  next();
  next();
  return (from, to) => from + (to - from) * next();
}

export function partOf(document: PartDocument): PartModel {
  const part = buildPart(document, { materials: materialById });
  invariant(part.ok, part.ok ? "" : JSON.stringify(part.error));
  return part.value;
}

const head = { format: "part/1", units: "mm", material: "S235", thickness: 2, insideRadius: 2.6 } as const;

export function profilePart(legs: readonly number[], turns: readonly number[], width = 200): PartModel {
  return partOf({
    ...head, name: "Section",
    profile: { width, legs, bends: turns.map((turn) => ({ angle: Math.abs(turn), direction: turn > 0 ? "up" as const : "down" as const })) },
  });
}

/** A tray with flanges on all sides, windows in its bottom and returns turned in or out on two of them. */
export function trayPart(depth: number, inward: number, length = 200, across = 140): PartModel {
  const flange = (edge: number): FlangeEntry => ({ id: `side${edge}`, on: "base", edge, length: depth, angle: 90, direction: "up" });
  const back = (edge: number): FlangeEntry => ({ id: `return${edge}`, on: `side${edge}`, edge: 2, length: Math.abs(inward), angle: 90, direction: inward > 0 ? "up" : "down", start: 12, end: 12 });
  return partOf({
    ...head, name: "Tray",
    base: { outline: [[0, 0], [length, 0], [length, across], [0, across]], holes: [{ polygon: [[60, 50], [120, 50], [120, 80], [60, 80]] }] },
    flanges: [...[0, 1, 2, 3].map(flange), ...(inward === 0 ? [] : [back(1), back(3)])],
  });
}

/** A random part of the shop's kinds: L, Z, U, hat, and trays with returns. */
export function randomPart(dice: (from: number, to: number) => number): PartModel {
  const leg = () => Math.round(dice(18, 90));
  const turn = () => Math.round(dice(60, 90));
  const width = Math.round(dice(60, 400));
  const kind = Math.floor(dice(0, 6));
  if (kind === 0) return profilePart([leg(), leg()], [turn()], width);
  if (kind === 1) return profilePart([leg(), leg(), leg()], [turn(), -turn()], width);
  if (kind === 2) return profilePart([leg(), leg(), leg()], [turn(), turn()], width);
  if (kind === 3) return profilePart([leg(), leg(), leg(), leg(), leg()], [turn(), -turn(), -turn(), turn()], width);
  return trayPart(Math.round(dice(18, 60)), kind === 4 ? Math.round(dice(12, 17)) : -Math.round(dice(12, 17)));
}
