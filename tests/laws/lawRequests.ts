import fc from "fast-check";
import { mm } from "@/bending/core/units";
import type { FlangeEntry, PartDocument } from "@/bending/part/partDocument";
import type { PlanRequest } from "@/bending/plan/planRequest";
import type { Tool } from "@/bending/tooling/tool";
import { planCorpus } from "../corpus/planCorpus";

export interface LawRequest { readonly name: string; readonly request: PlanRequest }

const TOOLS = ["P88", "P88-relieved", "V12", "V16"];

export const withLengths = (tool: Tool, lengths: readonly number[]): Tool =>
  ({ ...tool, pieces: [...lengths].sort((a, b) => b - a).map((length, i) => ({ id: `${tool.id}/${i}`, length: mm(length), horn: null, rack: null })) });

/** Few tools in few pieces, so that what stands where matters. */
const stocked = (request: PlanRequest, lengths: readonly number[]): PlanRequest => ({ ...request, tools: request.tools.filter(({ id }) => TOOLS.includes(id)).map((tool) => withLengths(tool, lengths)) });

const direction = fc.constantFrom("up" as const, "up" as const, "down" as const);
const chain = fc.record({
  first: fc.integer({ min: 15, max: 60 }),
  rest: fc.array(fc.record({ leg: fc.integer({ min: 20, max: 70 }), angle: fc.constantFrom(90, 90, 60, 30), direction }), { minLength: 2, maxLength: 4 }),
});
const tree = fc.record({
  width: fc.integer({ min: 90, max: 180 }), depth: fc.integer({ min: 60, max: 120 }),
  sides: fc.array(fc.record({ edge: fc.integer({ min: 0, max: 3 }), length: fc.integer({ min: 18, max: 45 }), angle: fc.constantFrom(90, 90, 45), direction, start: fc.constantFrom(0, 8), rim: fc.option(fc.record({ length: fc.integer({ min: 14, max: 22 }), direction }), { nil: null }) }), { minLength: 2, maxLength: 3 }),
});

/** Parts of the corpus, and as many drawn at random (the same ones every time): chains and bases with flanges. */
export function lawRequests(random: number): readonly LawRequest[] {
  const base = planCorpus("u");
  const common = { format: "part/1", units: "mm", material: "S235", thickness: 2, insideRadius: 2 } as const;
  const chains = fc.sample(chain, { numRuns: random, seed: 11 }).map(({ first, rest }, i): PartDocument => ({
    ...common, name: `chain ${i}`, profile: { width: 150, legs: [first, ...rest.map(({ leg }) => leg)], bends: rest.map(({ angle, direction: way }) => ({ angle, direction: way })) },
  }));
  const trees = fc.sample(tree, { numRuns: random, seed: 12 }).map(({ width, depth, sides }, i): PartDocument => ({
    ...common, name: `tree ${i}`, base: { outline: [[0, 0], [width, 0], [width, depth], [0, depth]] },
    flanges: sides.filter(({ edge }, at) => sides.findIndex((one) => one.edge === edge) === at).flatMap(({ edge, length, angle, direction: way, start, rim }): readonly FlangeEntry[] => [
      { id: `side${edge}`, on: "base", edge, length, angle, direction: way, start },
      ...(rim ? [{ id: `rim${edge}`, on: `side${edge}`, edge: 2, length: rim.length, angle: 90, direction: rim.direction }] : []),
    ]),
  }));
  const known = ([["hat", [300, 200]], ["tray", [220, 140]], ["small/bracket", [110, 75, 20]], ["small/z-tabs", [150, 60]], ["small/batch", [120, 60]]] as const)
    .map(([name, lengths]): LawRequest => ({ name, request: stocked(planCorpus(name), lengths) }));
  return [...known, ...[...chains, ...trees].map((document): LawRequest => ({ name: document.name, request: stocked({ ...base, document }, [150, 80, 50]) }))];
}
