import { expect, it } from "vitest";
import { materialById } from "@/bending/handbook/materials";
import { planPart } from "@/bending/plan/planPart";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import machineDocument from "../corpus/plans/machine.json";
import toolingDocument from "../corpus/plans/tooling.json";

it("says that the bed is too short, not that some die makes another radius", () => {
  const [machine, tools] = [readMachineDocument(machineDocument), readToolingDocument(toolingDocument)];
  if (!machine.ok || !tools.ok) throw new Error("the corpus is read");
  const width = machine.value.bedLength + 200;
  const plan = planPart({
    document: { format: "part/1", name: "Long angle", units: "mm", material: "S235", thickness: 2, profile: { width, legs: [40, 60], bends: [{ angle: 90, direction: "up" }] } },
    materials: materialById, tools: tools.value, machine: machine.value, batch: 1,
  });
  expect(plan.status).toBe("infeasible");
  expect(plan.reasons.map(({ kind }) => kind)).toEqual(["bed"]);
  expect(plan.reasons[0]?.message).toBe(`bend b1 is ${width} mm long; the bed of ${machine.value.name} is ${machine.value.bedLength} mm`);
});
