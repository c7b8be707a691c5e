import { expect, it } from "vitest";
import { kgPerCubicMetre, mm, mpa } from "../core/units";
import type { MaterialFacts } from "./material";
import { materialProblems } from "./materialProblems";
import { builtInMaterials, materialById } from "./materials";

const steel = materialById("S235")!;
const problems = (change: Partial<MaterialFacts>) => materialProblems({ ...steel, ...change }).map(({ path, message }) => `${path} ${message}`);
const radii = (rows: readonly (readonly [number, number, number | null])[], as: "mm" | "thickness" = "mm") => ({ minimumRadii: { as, rows: rows.map(([upTo, across, along]) => ({ upTo: mm(upTo), across, along })) } });

it("finds nothing wrong with the built-in ones", () => {
  for (const material of builtInMaterials) expect([material.id, materialProblems(material)]).toEqual([material.id, []]);
});

it.each([
  [{ tensile: [mpa(510), mpa(360)] as const }, "tensile[1] must be at least the lowest, 510 MPa"],
  [{ tensile: [mpa(0.36), mpa(510)] as const }, "tensile[0] must be 20 to 3000 MPa"],
  [{ yield: mpa(511) }, "yield must be at most the highest tensile strength, 510 MPa"],
  [{ modulus: mpa(210) }, "modulus must be 10 to 500 GPa"],
  [{ modulus: mpa(210_000_000) }, "modulus must be 10 to 500 GPa; 210000 looks like MPa, which is 210 GPa"],
  [{ density: kgPerCubicMetre(2.7) }, "density must be 500 to 25000 kg/m³; 2.7 looks like g/cm³, which is 2700 kg/m³"],
  [{ naturalRadiusRatio: 6 }, "naturalRadiusRatio must be 0.02 to 0.6 of the V opening"],
  [{ allowance: { rule: "k", k: 1.2 } as const }, "allowance.k must be over 0 and at most 1"],
  [radii([[2, 1, null], [1, 1, null]]), "minimumRadii.rows[1].upTo must be over 2 mm, the row before"],
  [radii([[2, -1, 40]], "thickness"), "minimumRadii.rows[0].across must be 0 to 30 times the thickness"],
  [radii([]), "minimumRadii.rows must have a row; without a table no smallest radius is known"],
  [{ origins: { ...steel.origins, yield: { kind: "shop", text: " " } as const } }, "origins.yield must say where the value is from"],
])("%j", (change, words) => { expect(problems(change)).toContain(words); });

it("lets no number through that is none", () => {
  for (const change of [{ yield: mpa(NaN) }, { modulus: mpa(NaN) }, { density: kgPerCubicMetre(Infinity) }, { tensile: [mpa(NaN), mpa(500)] as const }, { naturalRadiusRatio: NaN }, radii([[NaN, 1, 1]]), radii([[1, NaN, 1]])]) {
    expect(problems(change).length).toBeGreaterThan(0);
  }
});
