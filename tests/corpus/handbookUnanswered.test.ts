import { readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { materialById } from "@/bending";
import { aluminiumRadii } from "@/bending/handbook/aluminiumMinimumRadius";
import type { Mark } from "./handbookCase";

/** A published value that the product has no place for. */
interface Unanswered {
  readonly id: string;
  readonly published: number;
  readonly unit: string;
  readonly mark: Mark;
  readonly source: string;
}

const { values, fields } = JSON.parse(readFileSync(join(import.meta.dirname, "handbook/unanswered/materials.json"), "utf8")) as {
  readonly values: readonly Unanswered[];
  readonly fields: readonly (Unanswered & { readonly field: string })[];
};

test.each(values)("[$mark] $id, $published $unit: no such material is built in; when it is, its value becomes a case", ({ id, source }) => {
  expect(source).not.toBe("");
  expect([id, materialById(id), Object.keys(aluminiumRadii).includes(id)]).toEqual([id, undefined, false]);
});

test.each(fields)("[$mark] $id, $field $published $unit: a material has no such value", ({ id, field, source }) => {
  expect(source).not.toBe("");
  expect(Object.keys(materialById(id) ?? {})).toEqual(expect.arrayContaining(["tensile", "yield"]));
  expect(Object.keys(materialById(id) ?? {})).not.toContain(field);
});
