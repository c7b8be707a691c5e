import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { mm, rad } from "../../core/units";
import { runsFor } from "../../setup/runsFor";
import type { MachineSettings } from "../../tooling/machine";
import type { ToolPiece } from "../../tooling/tool";
import { missingLengths } from "./missingLengths";

const settings: MachineSettings = { clearance: mm(1), maxSectionGap: mm(5), maxUncoveredEnd: mm(5), angleRepeat: rad(0.005), gaugeRepeat: mm(0.1) };
const piece = (length: number, k: number): ToolPiece => ({ id: `p${k}`, length: mm(length), horn: null, rack: null });
const covers = (stock: readonly ToolPiece[], line: number) => runsFor(stock, line, new Set(), settings).length > 0;

describe("lengths of a piece that could be missing", () => {
  it("hold the least one that makes a run for the line, and no run comes of a little less", () => {
    fc.assert(fc.property(fc.array(fc.integer({ min: 10, max: 120 }), { maxLength: 5 }), fc.integer({ min: 60, max: 400 }), (lengths, line) => {
      const stock = lengths.map(piece);
      fc.pre(!covers(stock, line));
      const found = missingLengths([line], stock, settings).find((length) => covers([...stock, piece(length, 99)], line));
      expect(found).toBeDefined();
      if (found !== undefined && found > 5.5) expect(covers([...stock, piece(found - 0.5, 99)], line)).toBe(false);
    }), { numRuns: 300 });
  });
});
