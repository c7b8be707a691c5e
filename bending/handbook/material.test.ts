import { expect, it } from "vitest";
import { mm, mpa, rad } from "../core/units";
import { completeMaterial, type RecordedMaterial } from "./completeMaterial";
import { builtInMaterials, materialById } from "./materials";
import { minimumRadius } from "./minimumRadius";
import { resolveAllowance } from "./resolveAllowance";
import { springback } from "./springback";
import { steelRadiusTable } from "./steelRadiusTable";
import { springbackTable, type SpringbackMaterial } from "./springbackFactor";

/** As a material was recorded before it had a rule, radii and origins of its own. */
const old = (id: string): RecordedMaterial => {
  const { designation, allowance, minimumRadii, springbackRow, origins, ...early } = materialById(id)!;
  expect([designation, allowance, minimumRadii, springbackRow, origins]).not.toContain(undefined);
  return { ...early, source: "a table" };
};

it("changes nothing of a whole record", () => {
  for (const material of builtInMaterials) expect(completeMaterial(material)).toEqual(material);
});

it("gives an old record the numbers of its days", () => {
  for (const { id, group, minimumRadii, allowance, springbackRow } of builtInMaterials) {
    const whole = completeMaterial(old(id));
    expect([whole.allowance, whole.springbackRow]).toEqual([allowance, springbackRow]);
    // In those days S355 went by its 470 MPa.
    expect(whole.minimumRadii).toEqual(group !== "steel" ? null : id === "S355" ? steelRadiusTable(mpa(470)) : minimumRadii);
    expect(whole.origins.tensile).toEqual(materialById(id)?.origins.tensile);
    expect(completeMaterial({ ...old(id), yield: mpa(77) }).origins.yield).toEqual({ kind: "memory", text: "a table" });
  }
  expect(minimumRadius(completeMaterial(old("S355")), mm(2), rad(Math.PI / 2))).toEqual({ radius: 3, source: "DIN 6935 (1975-10), across the rolling direction" });
  expect(minimumRadius(completeMaterial(old("S235")), mm(1.5), rad(Math.PI / 2))).toEqual({ radius: 1.6, source: "DIN 6935 (1975-10), across the rolling direction" });
});

it("takes springback from the row of the kR table that a material names, and from elastic recovery beyond its columns", () => {
  const steel = materialById("DC01")!;
  const right = rad(Math.PI / 2);
  for (const row of Object.keys(springbackTable) as SpringbackMaterial[]) {
    const taken = springback(right, mm(10), mm(1), { ...steel, springbackRow: row });
    const factor = right / taken.angle;
    expect(factor).toBeCloseTo(springbackTable[row][5], 12);
    expect(taken.radius).toBeCloseTo(factor * 10.5 - 0.5, 12);
    expect(springback(right, mm(0.5), mm(1), { ...steel, springbackRow: row })).toEqual(springback(right, mm(0.5), mm(1), steel));
  }
});

it("unfolds by the rule that a material names, a K of its own included", () => {
  const steel = materialById("S235")!;
  const question = { thickness: mm(2), insideRadius: mm(2), angle: rad(Math.PI / 2) };
  expect(resolveAllowance({ ...question, material: steel }).source).toBe("DIN 6935");
  expect(resolveAllowance({ ...question, material: { ...steel, allowance: { rule: "faa" } } }).source).toBe("FAA-H-8083-31");
  expect(resolveAllowance({ ...question, material: { ...steel, allowance: { rule: "k", k: 0.41 } } })).toMatchObject({ k: expect.closeTo(0.41, 12), source: "K 0.41 of S235" });
  expect(resolveAllowance({ ...question, material: { ...steel, allowance: { rule: "k", k: 0.41 } }, rule: "din6935" }).source).toBe("DIN 6935");
});
