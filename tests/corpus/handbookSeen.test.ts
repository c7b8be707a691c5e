import { readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, test } from "vitest";
import { mm } from "@/bending";
import { forceForms } from "@/bending/handbook/forceForms";
import { publishedMethodFactors } from "@/bending/handbook/forceMethods";
import { generalAngleTolerance } from "@/bending/handbook/generalAngleTolerance";
import { generalLengthTolerance } from "@/bending/handbook/generalLengthTolerance";
import type { ToleranceClass } from "@/bending/handbook/generalTolerance";
import { radiusRules } from "@/bending/handbook/radiusRules";
import type { CaseInput, Corpus } from "./handbookCase";

const seenByInput: readonly (readonly [file: string, seen: (input: CaseInput) => boolean | undefined])[] = [
  ["radius-by-rule", ({ rule }) => radiusRules.find(({ id }) => id === rule)?.seen],
  ["force-factor", ({ form }) => forceForms.find(({ id }) => id === form)?.seen],
  ["published-method-factor", (i) => publishedMethodFactors.find(({ method, over, source }) => method === i.method && over === i.over && source.startsWith(String(i.source)))?.seen],
  ["general-length-tolerance", (i) => generalLengthTolerance(i.class as ToleranceClass, mm(Number(i.size)))?.seen],
  ["general-angle-tolerance", (i) => generalAngleTolerance(i.class as ToleranceClass, mm(Number(i.side)))?.seen],
];

test.each(seenByInput)("%s: the product says that a text was seen exactly where the case does", (file, seen) => {
  const { cases } = JSON.parse(readFileSync(join(import.meta.dirname, "handbook", `${file}.json`), "utf8")) as Corpus;
  const published = cases.filter(({ mark }) => mark !== "C");
  expect(published.length).toBeGreaterThan(0);
  for (const { input, mark } of published) expect([input, seen(input)]).toEqual([input, mark === "V"]);
});
