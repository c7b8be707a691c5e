import { readFileSync } from "node:fs";
import { materialById } from "@/bending/handbook/materials";
import { readPartDocument } from "@/bending/part/readPartDocument";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";

const json = (name: string): unknown => JSON.parse(readFileSync(new URL(`plans/${name}.json`, import.meta.url), "utf8"));

function read<T>(result: { readonly ok: true; readonly value: T } | { readonly ok: false; readonly error: unknown }): T {
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
}

/** The request to plan a part of the corpus with the corpus's own tools and brake. */
export function planCorpus(name: string, batch = 20): PlanRequest {
  return {
    document: read(readPartDocument(json(name))),
    materials: materialById,
    tools: read(readToolingDocument(json("tooling"))),
    machine: read(readMachineDocument(json("machine"))),
    batch,
  };
}
