import { expect, test } from "vitest";
import { partOf } from "../clearance/trial/trialParts";
import { straightPunch, trialMachine, vDie } from "../clearance/trial/trialTools";
import { mm } from "../core/units";
import { collectMoves } from "../order/collectMoves";
import { gaugeOptions } from "../setup/gaugeOptions";
import { gaugePatterns } from "./gaugePatterns";

const head = { format: "part/1", units: "mm", material: "S235", thickness: 1, insideRadius: 1.5 } as const;

const parts = [
  partOf({
    ...head, name: "Two hems",
    profile: { width: 200, legs: [10, 80, 40, 12], bends: [{ angle: 180, direction: "up", hem: "closed" }, { angle: 90, direction: "up" }, { angle: 180, direction: "down", hem: "closed" }] },
  }),
  partOf({
    ...head, name: "Slanted edge", base: { outline: [[0, 0], [200, 0], [200, 100], [0, 60]] },
    flanges: [{ id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up" }, { id: "side", on: "base", edge: 1, length: 30, angle: 90, direction: "down" }],
  }),
];

test.each([800, 75])("whatever a step can be gauged from stands among the places that were told beforehand, also folds and edges partly in reach (X to %i)", (reach) => {
  const machine = { ...trialMachine, gauge: { ...trialMachine.gauge, x: [mm(8), mm(reach)] as const } };
  for (const part of parts) {
    const moves = collectMoves(part);
    const patterns = gaugePatterns({ part, machine, moves, pairs: [{ index: 0, punch: straightPunch("P88"), die: vDie("V16") }] }, 16);
    let options = 0;
    moves.forEach(({ bends, front, mask }, move) => {
      for (let formed = 0; formed < 1 << part.bends.length; formed += 1) {
        if (formed & mask) continue;
        for (const option of gaugeOptions(part, { bends, front, formed }, machine)) {
          options += 1;
          const told = patterns(move).some(({ mask: bits, value, contact }) => (formed & bits) === value
            && (contact === null || Math.hypot(contact.x - option.x, contact.r - option.r, contact.slope - option.slope) < 1e-4));
          expect(told, `${part.name}, move ${move}, formed ${formed}: ${JSON.stringify(option)}`).toBe(true);
        }
      }
    });
    expect(options).toBeGreaterThan(5);
  }
});
