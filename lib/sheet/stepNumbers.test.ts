import { expect, it } from "vitest";
import { channelPlan } from "./fixtures/channelPlan";
import { stepNumbers } from "./stepNumbers";

it("writes the depth, which a plan states in mm, in the unit of the sheet", () => {
  const [step] = channelPlan.plan.steps;
  if (!step) throw new Error("the fixture has steps");
  expect(stepNumbers({ ...step, depthMm: 5.08 }, "mm").depth).toBe("5.08 mm");
  expect(stepNumbers({ ...step, depthMm: 5.08 }, "in").depth).toBe("0.200 in");
  expect(stepNumbers({ ...step, insideRadius: 0.1 }, "in").insideRadius).toBe("0.100 in");
});
