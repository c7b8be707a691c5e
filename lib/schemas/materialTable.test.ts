import { expect, it } from "vitest";
import { builtInMaterials, materialById } from "@/bending/handbook/materials";
import { readCsv } from "@/lib/csv/readCsv";
import { writeCsv } from "@/lib/csv/writeCsv";
import { formatMinimumRadii } from "./formatMinimumRadii";
import { materialChanges } from "./materialChanges";
import { materialCsvColumns, type MaterialCsvRow } from "./materialCsvColumns";
import { materialFactsSchema } from "./materialInputs";
import { materialOfCsv } from "./materialOfCsv";
import { materialToCsv } from "./materialToCsv";
import { parseMinimumRadii } from "./parseMinimumRadii";

const unsaid = { kind: "shop", text: "unsaid" } as const;

it.each([",", ";"] as const)("every built-in material comes back from a table parted by %s with nothing changed", (separator) => {
  const table = readCsv(writeCsv(materialCsvColumns, builtInMaterials.map(materialToCsv), separator), materialCsvColumns);
  if (!table.ok) throw new Error(table.error.message);
  const back = table.value.lines.map(({ values, problems }) => { expect(problems).toEqual([]); return materialOfCsv(values as MaterialCsvRow, unsaid); });
  expect(back.map(({ id }) => id)).toEqual(builtInMaterials.map(({ id }) => id));
  back.forEach((facts, index) => {
    expect(materialChanges(builtInMaterials[index]!, facts)).toEqual([]);
    expect(materialFactsSchema.safeParse(facts).error).toBeUndefined();
  });
});

it("reads the radii that it writes, and radii as people type them", () => {
  for (const { minimumRadii } of builtInMaterials) {
    if (minimumRadii !== null) expect(parseMinimumRadii(formatMinimumRadii(minimumRadii))).toEqual({ ok: true, value: minimumRadii });
  }
  expect(parseMinimumRadii("1: 1/1,6; ≤1,5 mm : 1.6 / 2.5 ;")).toEqual({ ok: true, value: { as: "mm", rows: [{ upTo: 1, across: 1, along: 1.6 }, { upTo: 1.5, across: 1.6, along: 2.5 }] } });
  for (const wrong of ["", "1", "1: x", "1: 1t / 2", "1: 1t; 2: 2"]) expect(parseMinimumRadii(wrong).ok).toBe(false);
});

it("tells what differs in the units of the table, and leaves names and sources out of what calculations use", () => {
  const steel = materialById("S235")!;
  const other = { ...steel, name: "Other", modulus: materialById("AW-5052-H32")!.modulus, minimumRadii: null, origins: { ...steel.origins, modulus: unsaid } };
  expect(materialChanges(steel, other).map(({ field }) => field)).toEqual(["name", "modulus (GPa)", "smallest inside radii", "modulus source"]);
  expect(materialChanges(steel, other, false)).toEqual([{ field: "modulus (GPa)", from: "210", to: "70" }, { field: "smallest inside radii", from: formatMinimumRadii(steel.minimumRadii), to: "" }]);
});
