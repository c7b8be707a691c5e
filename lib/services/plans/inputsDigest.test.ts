import { expect, it } from "vitest";
import { builtInMaterials, materialById } from "@/bending/handbook/materials";
import { shopTable } from "@/bending/shopTable/shopTable";
import { valuesOf } from "@/bending/shopTable/valuesOf";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import type { PlanTask } from "@/lib/jobs/planTask";
import { bracketDocument } from "@/tests/integration/shop/bracketDocument";
import { bracketMachine } from "@/tests/integration/shop/bracketMachine";
import { bracketPunch } from "@/tests/integration/shop/bracketTools";
import { inputsDigest } from "./inputsDigest";

const machine = readMachineDocument(bracketMachine);
if (!machine.ok) throw new Error("the machine can be read");
const task: PlanTask = {
  document: bracketDocument, material: builtInMaterials[0]!, tools: [bracketPunch], machine: machine.value, batch: 10, alternatives: 3, limitMs: 1000,
};
const digest = (changes: Partial<PlanTask>, engine = "1") => inputsDigest(engine, { ...task, ...changes });
const table = (blankLength: number) => valuesOf(shopTable([{
  id: "T-1", units: "mm", material: "S235", batch: "", thickness: 2, vOpening: 12, punchRadius: 0.8, angle: 90, flanges: [60, 40], blankLength, measuredOn: "2026-11-30",
  instruments: { length: { uncertainty: 0.03, resolution: 0.01 }, angle: { uncertainty: 0.1, resolution: 0 } },
}], materialById), "S235");
const pieces = (change: object) => ({ tools: [{ ...bracketPunch, pieces: bracketPunch.pieces.map((piece) => ({ ...piece, ...change })) }] });

it("is the same for the same inputs, in whatever order their keys stand", () => {
  const turned = Object.fromEntries(Object.entries(bracketDocument).reverse()) as unknown as PlanTask["document"];
  expect(digest({ document: turned })).toBe(digest({}));
  expect(digest(pieces({ rack: "elsewhere" }))).toBe(digest({}));
  expect(digest({ limitMs: 2000 })).toBe(digest({}));
});

it("is another one for every change that a plan follows from", () => {
  const all = [
    digest({}), digest({}, "2"), digest({ batch: 11 }), digest({ document: { ...bracketDocument, thickness: 3 } }), digest({ tools: [] }),
    digest(pieces({ length: 150 })), digest({ machine: { ...machine.value, fingers: 1 } as PlanTask["machine"] }), digest({ material: builtInMaterials[1]! }), digest({ shopTable: table(96.3) }), digest({ shopTable: table(96.2) }),
    digest({ airForceFactor: 1.1 }), digest({ alternatives: 4 }), digest({ order: ["a", "b"] }), digest({ order: ["b", "a"] }), digest({ wishes: [{ bend: "a", front: "f" }] }),
    digest({ machine: { ...machine.value, settings: { ...machine.value.settings, clearance: 2 } } as PlanTask["machine"] }), digest({ machine: { ...machine.value, times: { ...machine.value.times, flip: 99 } } }),
  ];
  expect(new Set(all).size).toBe(all.length);
});
