import { expect, test } from "vitest";
import { materialById } from "@/bending/handbook/materials";
import { planPart } from "@/bending/plan/planPart";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import { mustRead } from "@/seeds/mustRead";
import { largeBrake } from "@/seeds/shop/machines";
import { parts } from "@/seeds/shop/parts";
import { tooling } from "@/seeds/shop/tools";
import { edgeName } from "./edgeName";
import { planModel } from "./planModel";

test("the fold of a hem at the gauge is called so", () => {
  const document = parts.find(({ number }) => number === "RS-108")?.document;
  const material = document && materialById(document.material);
  if (!document || !material) throw new Error("the demonstration has a hemmed cover");
  const machine = mustRead("brake", readMachineDocument(largeBrake));
  const tools = mustRead("tooling", readToolingDocument(tooling)).filter(({ id }) => ["P26-R0.6-H120", "H8-26-H90", "P88-R0.8-H150", "V6-88-H60"].includes(id));
  const plan = planPart({ document, materials: materialById, tools, machine, batch: 20 });
  const model = planModel({ plan, document, material, machine, tools });
  const names = model.steps.map((step) => [step.step.bends.join(), edgeName(model, step)]);
  expect(names).toContainEqual(["hem", "hem, far edge"]);
  const hem = names.findIndex(([bends]) => bends === "hem");
  expect(names.slice(hem + 1)).toContainEqual(["wall", "hem, fold"]);
});
