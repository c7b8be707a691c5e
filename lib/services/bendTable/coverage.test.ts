import { describe, expect, it } from "vitest";
import { materialById } from "@/bending/handbook/materials";
import { invariant } from "@/bending/core/invariant";
import type { BendTrial } from "@/bending/shopTable/bendTrial";
import { shopTable } from "@/bending/shopTable/shopTable";
import { trialsOf } from "@/seeds/shop/bendTrialsOf";
import { coverageRows } from "./coverageRows";
import { suggestTrials } from "./suggestTrials";

const material = materialById("S235");
invariant(material !== undefined, "S235 is built in");

const bent = (thickness: number, vOpening: number, count: number): readonly BendTrial[] =>
  trialsOf({ material, thickness, vOpening, angle: 90, count, batch: "", day: "2025-01-01", by: "", seed: thickness * 100 + vOpening }).map((trial, index) => ({
    ...trial, id: `${thickness} ${vOpening} ${index}`, units: "mm", nominalThickness: trial.nominal, blankLength: trial.blank,
    instruments: { length: { uncertainty: 0.03, resolution: 0.01 }, angle: { uncertainty: 0.1, resolution: 0 }, radius: { uncertainty: 0.1, resolution: 0 } },
  }));
const openings = [6, 8, 10, 12, 16, 20].map((vOpeningMm) => ({ vOpeningMm, inService: vOpeningMm !== 10 }));
const uses = [{ thicknessMm: 2, bends: 4 }, { thicknessMm: 2, bends: 2 }];
const rows = (...trials: readonly (readonly BendTrial[])[]) => coverageRows({ material: "S235", table: shopTable(trials.flat(), materialById), thicknesses: [1, 2], openings, uses });

describe("coverage", () => {
  it("tells measured, bridged, open and unusual places apart", () => {
    const [thin, thick] = rows(bent(2, 8, 3), bent(2, 16, 4));
    expect(thick?.cells.map(({ kind }) => kind)).toEqual(["unusual", "measured", "between", "between", "measured", "open"]);
    expect(thin?.cells.map(({ kind }) => kind)).toEqual(["open", "open", "open", "open", "unusual", "unusual"]);
    expect([thick?.bends, thick?.parts, thin?.bends]).toEqual([6, 2, 0]);
    const [low, middle, high] = [1, 3, 4].map((index) => thick?.cells[index]?.deductionMm ?? 0);
    expect(middle).toBeGreaterThan(low ?? 0);
    expect(middle).toBeLessThan(high ?? 0);
    expect(thick?.cells[1]).toMatchObject({ trials: 3, anglesDeg: [90], valueKeys: ["S235 2 V8 R0.8 90deg"] });
  });

  it("marks the V nearest to the rule of those in service, one for each sheet", () => {
    expect(rows().map(({ cells }) => cells.filter(({ byRule }) => byRule).map(({ vOpeningMm }) => vOpeningMm))).toEqual([[6], [12]]);
  });
});

describe("what to bend next", () => {
  const suggested = (...trials: readonly (readonly BendTrial[])[]) => suggestTrials(rows(...trials), material).map(({ thicknessMm, vOpeningMm, pieces }) => [thicknessMm, vOpeningMm, pieces]);

  it("is the sheet that parts are made of, then the others; nothing once three are bent", () => {
    expect(suggested()).toEqual([[2, 12, 3], [1, 6, 3]]);
    expect(suggested(bent(2, 8, 3), bent(2, 16, 3))).toEqual([[2, 12, 3], [1, 6, 3]]);
    expect(suggested(bent(2, 12, 2), bent(1, 6, 3))).toEqual([[2, 12, 1]]);
    expect(suggested(bent(2, 12, 3), bent(1, 6, 3))).toEqual([]);
  });

  it("names a strip whose flanges the V takes, also a wide one", () => {
    const wide = coverageRows({ material: "S235", table: shopTable([], materialById), thicknesses: [10], openings: [{ vOpeningMm: 100, inService: true }], uses: [] });
    for (const trial of [...suggestTrials(rows(), material), ...suggestTrials(wide, material)]) {
      expect(trial.blankMm).toBeGreaterThanOrEqual(100);
      expect(trial.flangeMm).toBeGreaterThan(trial.leastFlangeMm);
      expect(2 * trial.flangeMm).toBeGreaterThan(trial.blankMm);
    }
  });
});
