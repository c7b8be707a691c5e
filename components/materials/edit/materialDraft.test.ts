import { expect, it } from "vitest";
import { builtInMaterials, materialById } from "@/bending/handbook/materials";
import { changeDraft } from "./changeDraft";
import { emptyMaterialDraft, materialDraft } from "./materialDraft";
import { readMaterialDraft } from "./readMaterialDraft";

const steel = materialById("S235")!;
const base = materialDraft(steel);

it("a draft that nobody touched is the material to the last digit", () => {
  for (const facts of builtInMaterials) expect(readMaterialDraft(materialDraft(facts), facts)).toEqual({ ok: true, value: facts });
});

it("a changed value is the shop's until its source is said; put back, it has its source again", () => {
  const changed = changeDraft(base, "yield", { yield: "240" }, base);
  expect(changed.origins.yield).toEqual({ kind: "shop", text: "" });
  const read = readMaterialDraft(changed, steel);
  expect(read.ok ? [] : read.error).toEqual([{ path: "origins.yield", message: "must say where the value is from" }]);
  expect(changeDraft(changed, "yield", { yield: "235" }, base)).toEqual(base);
  const said = { ...changed, origins: { ...changed.origins, yield: { kind: "published", text: "corrected table" } as const } };
  expect(changeDraft(said, "yield", { yield: "241" }, base).origins.yield.text).toBe("corrected table");
});

it("in a new material the sources of typed values stay to be said, those of standing choices go with the choice", () => {
  const typed = changeDraft(emptyMaterialDraft, "yield", { yield: "240" }, emptyMaterialDraft);
  expect(typed.origins.yield).toEqual(emptyMaterialDraft.origins.yield);
  const chosen = changeDraft(typed, "allowance", { rule: "faa" }, emptyMaterialDraft);
  expect([emptyMaterialDraft.origins.allowance.text, chosen.origins.allowance.text]).toEqual(["DIN 6935", ""]);
});

it("names every field that is empty or no number, with rows of radii", () => {
  const read = readMaterialDraft({ ...emptyMaterialDraft, radiiAs: "mm", radii: [{ upTo: "1", across: "wide", along: "" }] }, null);
  const paths = read.ok ? [] : read.error.map(({ path }) => path);
  expect(paths).toEqual(expect.arrayContaining(["id", "name", "standard", "tensile[0]", "tensile[1]", "yield", "modulus", "density", "naturalRadiusRatio", "minimumRadii.rows[0].across", "origins.tensile"]));
  expect(new Set(paths).size).toBe(paths.length);
});

it("reads decimal commas and a K of its own", () => {
  const read = readMaterialDraft({ ...base, rule: "k", k: "0,42", modulus: "205,5" }, steel);
  expect(read).toMatchObject({ ok: true, value: { allowance: { rule: "k", k: 0.42 }, modulus: 205_500 } });
});
