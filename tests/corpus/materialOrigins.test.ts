import { readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { materialById } from "@/bending";
import type { Corpus } from "./handbookCase";

const { cases } = JSON.parse(readFileSync(join(import.meta.dirname, "handbook", "material-values.json"), "utf8")) as Corpus;
const fieldOf = (value: string) => (value.startsWith("tensile") ? "tensile" : value) as "tensile" | "yield" | "modulus" | "density";

test("a built-in value says that it is published exactly when it was seen in a text", () => {
  for (const { input, mark } of cases) {
    const origin = materialById(String(input.material))?.origins[fieldOf(String(input.value))];
    expect([input, origin?.kind]).toEqual([input, mark === "V" ? "published" : "memory"]);
  }
});
