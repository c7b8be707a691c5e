import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { builtInMaterials } from "@/bending/handbook/materials";
import { convertTrialDraft } from "./convertTrialDraft";
import { headProblems } from "./headProblems";
import { newTrialId } from "./newTrialId";
import { nextLine } from "./nextLine";
import { pastedLines } from "./pastedLines";
import { readRow, type RowContext } from "./readRow";
import { refusedLines } from "./refusedLines";
import { standingNominal } from "./standingNominal";
import { lineFields, type LineField, type TrialDraft, type TrialLine } from "./trialDraft";

const line = (texts: Partial<Record<LineField, string>>, id = "a"): TrialLine => ({ ...nextLine(id), ...texts });
const full = line({ material: "s235", batch: "R-1", thickness: "1.98", vOpening: "16", punchRadius: "0.8", angle: "90", blank: "100", flangeA: "51.96", flangeB: "51.98" });
const draft: TrialDraft = {
  units: "mm", angles: "turned", measuredOn: "2025-03-01", measuredBy: "Greta", lengthInstrument: "c", thicknessInstrument: "", angleInstrument: "p", radiusInstrument: "", lines: [full],
};
const instruments: RowContext["instruments"] = (id) => ({ c: { uncertainty: 0.03, resolution: 0.01 }, p: { uncertainty: 0.1, resolution: 0.1 } })[id];
const contextOf = (head: TrialDraft): RowContext => ({ head, materials: builtInMaterials, instruments });
const read = (of: TrialDraft) => readRow(of.lines[0]!, contextOf(of));

describe("a line of the notebook", () => {
  it("gives its numbers as soon as it is complete, beside the handbook's", () => {
    const { result, problems, entry } = read(draft);
    expect(problems).toEqual({});
    expect(result?.result.deduction.value).toBeCloseTo(3.94, 9);
    expect(result?.result.deduction.expanded).toBeGreaterThan(0.03);
    expect(result?.handbook).toBeCloseTo(3.99, 1);
    expect(entry).toMatchObject({ material: "S235", blank: 100, insideRadius: null, radiusInstrument: null, thicknessInstrument: null });
  });

  it("says the same in inches, with included angles, filed under the same sheet", () => {
    const turned = convertTrialDraft(draft, { units: "in", angles: "included" }, builtInMaterials);
    expect(turned.lines[0]).toMatchObject({ angle: "90", blank: "3.93701", nominal: "0.07874" });
    const [there, here] = [read(turned).result?.result, read(draft).result?.result];
    expect(there?.deduction.value).toBeCloseTo(here?.deduction.value ?? 0, 2);
    expect(there?.thicknessClass).toBe(here?.thicknessClass);
    const back = convertTrialDraft(turned, { units: "mm", angles: "turned" }, builtInMaterials);
    for (const field of ["thickness", "vOpening", "punchRadius", "angle", "blank", "flangeA", "flangeB"] as const) expect(Number(back.lines[0]?.[field])).toBeCloseTo(Number(full[field]), 3);
    expect(back.lines[0]?.nominal).toBe("2");
  });

  it.each<[Partial<Record<LineField, string>>, LineField, RegExp]>([
    [{ material: "" }, "material", /type its short name/], [{ material: "cheese" }, "material", /"cheese" is none of this shop's/], [{ thickness: "0" }, "thickness", /more than 0 mm/],
    [{ vOpening: "x" }, "vOpening", /V opening: "x" is not/], [{ angle: "180" }, "angle", /less than 180/], [{ blank: "" }, "blank", /Blank: Type a length in mm/],
    [{ flangeA: "8" }, "blank", /would be right/], [{ nominal: "3" }, "thickness", /Thickness is 1.98 mm, but the sheet is named 3 mm/], [{ note: "n".repeat(501) }, "note", /at most 500/],
  ])("with %j names the field %s", (change, field, words) => {
    const { problems, entry } = readRow(line({ ...full, ...change }), contextOf(draft));
    expect(problems[field]).toMatch(words);
    expect(entry).toBeNull();
  });

  it("with nothing measured on it yet is no mistake and is not saved", () => {
    expect(readRow(nextLine("b", full), contextOf(draft))).toEqual({ blank: true, problems: {}, result: null, entry: null });
  });

  it("reads a gauge for the thickness by the material's own table, and says which sheet it takes", () => {
    expect(standingNominal(line({ material: "1.4301", thickness: "1.47" }), "mm", builtInMaterials)).toBe("1.5");
    expect(standingNominal(line({ material: "1.4301", thickness: "?" }), "mm", builtInMaterials)).toBeNull();
    expect(standingNominal(line({ material: "S235", thickness: "16 ga" }), "in", builtInMaterials)).toBe("0.0598");
  });
});

describe("the notebook", () => {
  it("copies what stays the same into the next line, and nothing that was measured", () => {
    const next = nextLine("b", { ...full, nominal: "2", note: "n" });
    expect(lineFields.filter((field) => next[field] !== "")).toEqual(["material", "batch", "nominal", "thickness", "vOpening", "punchRadius"]);
    expect(next.id).toBe("b");
  });

  it("lays cells of a spreadsheet over lines from where they are pasted, and adds lines", () => {
    let made = 0;
    const laid = pastedLines([full], "91\t100.1\r\n92\t100.2\r\n", { line: 0, field: "angle" }, () => `new ${(made += 1)}`);
    expect(laid?.map(({ id, material, angle, blank, flangeA }) => [id, material, angle, blank, flangeA])).toEqual([["a", "s235", "91", "100.1", "51.96"], ["new 1", "s235", "92", "100.2", ""]]);
    expect(pastedLines([full], "just a word", { line: 0, field: "note" }, () => "x")).toBeNull();
    expect(pastedLines([full], "a\tb", { line: 0, field: "note" }, () => "x")?.[0]?.note).toBe("a");
  });

  it("asks for a radius instrument only when a radius is there", () => {
    const known = { today: "2025-03-01", inUse: (id: string) => instruments(id) !== undefined };
    expect(headProblems(draft, known)).toEqual({});
    expect(Object.keys(headProblems({ ...draft, measuredOn: "2025-03-02", thicknessInstrument: "gone" }, known)).sort()).toEqual(["measuredOn", "thicknessInstrument"]);
    expect(Object.keys(headProblems({ ...draft, measuredBy: " ", measuredOn: "", angleInstrument: "", lines: [{ ...full, insideRadius: "2" }] }, known)).sort()).toEqual(["angleInstrument", "measuredBy", "measuredOn", "radiusInstrument"]);
  });

  it("puts what the server says at its line and field", () => {
    const said = refusedLines([{ path: "lines[1].blank", message: "is too short" }, { path: "lines[1].measuredOn", message: "is still to come" }, { path: "lines[9].blank", message: "x" }], ["a", "b"]);
    expect([...said]).toEqual([["b", { blank: "Blank is too short.", material: "measuredOn is still to come." }]]);
  });

  it("makes ids that are UUIDs of version 4, each another", () => {
    const ids = Array.from({ length: 50 }, newTrialId);
    expect(new Set(ids).size).toBe(50);
    fc.assert(fc.property(fc.constantFrom(...ids), (id) => /^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/.test(id)));
  });
});
