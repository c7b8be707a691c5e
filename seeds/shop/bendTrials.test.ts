import { describe, expect, it } from "vitest";
import { materialById } from "@/bending/handbook/materials";
import type { BendTrial } from "@/bending/shopTable/bendTrial";
import { shopTable } from "@/bending/shopTable/shopTable";
import { bendTrials } from "./bendTrials";
import { tooling } from "./tools";

const trials = bendTrials.map((trial, index): BendTrial => ({
  ...trial, id: String(index), units: "mm", nominalThickness: trial.nominal, blankLength: trial.blank,
  instruments: {
    length: { uncertainty: 0.03, resolution: 0.01 }, thickness: { uncertainty: 0.005, resolution: 0.001 },
    angle: { uncertainty: 1 / 12, resolution: 1 / 12 }, radius: { uncertainty: 0.125, resolution: 0.25 },
  },
}));
const { cells, refused } = shopTable(trials, materialById);

describe("the demonstration's trials", () => {
  it("are such as the library takes, every one", () => {
    expect(refused).toEqual([]);
    expect(trials.length).toBeGreaterThanOrEqual(60);
    expect(trials.length).toBeLessThanOrEqual(100);
    expect(cells).toHaveLength(16);
  });

  it("have exactly two that lie apart and one value of a single strip", () => {
    expect(cells.flatMap((cell) => cell.trials.filter(({ outlier }) => outlier).map(({ id }) => bendTrials[Number(id)]?.material)).sort()).toEqual(["1.4301", "S235"]);
    expect(cells.filter(({ value }) => value?.count === 1).map(({ key }) => key)).toEqual(["1.4301 1.5 V10 R0.8 90deg"]);
  });

  it("were bent with dies and punches that the shop has", () => {
    const openings = tooling.tools.flatMap((tool) => (tool.kind === "die" ? [tool.vOpening] : []));
    const radii = tooling.tools.flatMap((tool) => (tool.kind === "punch" ? [tool.tipRadius] : []));
    expect(bendTrials.filter(({ vOpening, punchRadius }) => !openings.includes(vOpening) || !radii.includes(punchRadius))).toEqual([]);
  });
});
