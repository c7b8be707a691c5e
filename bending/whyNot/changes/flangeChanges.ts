import { applyCure } from "../../findings/applyCure";
import type { PartDocument } from "../../part/partDocument";
import type { PlanChange } from "../../plan/planChange";
import { leastAmount } from "../leastAmount";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { lengthField } from "./lengthField";

/** Steps of the length, in the document's unit. */
const STEP = { mm: 0.5, in: 0.02 } as const;
/** What is taken off, or added, as a part of the length, tried in turn. */
const SHORTER = [0.06, 0.12, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8];
const LONGER = [0.05, 0.1, 0.2, 0.4, 0.8, 1.6];
/** Faces whose length is tried: the first of those that stand in the way. */
const MOST_FACES = 5;

/** Each face that takes part in what stands in the way: shorter by as little as will do, or longer by as little. */
export function flangeChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds, faces } = facts;
  const room = kinds.has("clearance") || kinds.has("self-collision") || kinds.has("throat");
  if (!room && !kinds.has("minimum-flange")) return [];
  attempts.doing("Looking whether another length of a flange would do");
  return faces.slice(0, MOST_FACES).flatMap((face) => {
    const field = lengthField(attempts.request.document, face);
    if (field === null) return [];
    return [...(room ? [ofLength(facts, face, field, "shorter")] : []), ofLength(facts, face, field, "longer")].flatMap((change) => change ?? []);
  });
}

function ofLength({ attempts }: WhyFacts, face: string, { path, length }: { readonly path: string; readonly length: number }, way: "shorter" | "longer"): PlanChange | null {
  const { document } = attempts.request;
  const before = attempts.plans();
  const step = STEP[document.units];
  const onGrid = (value: number) => Number(((way === "shorter" ? Math.floor(value / step + 1e-9) : Math.ceil(value / step - 1e-9)) * step).toFixed(6));
  const found = leastAmount({
    attempts, from: length, asItIs: true, resolution: step,
    ladder: way === "shorter" ? SHORTER.map((part) => onGrid(length * (1 - part))).filter((value) => value > 0) : LONGER.map((part) => onGrid(length * (1 + part))),
    change: (value) => ({ document: applyCure<PartDocument>(document, { path, value, says: "" }) }),
  });
  if (found === null) return null;
  const off = Number(Math.abs(length - found.value).toFixed(6));
  return offeredChange(attempts, before, { ...found, resolution: step }, {
    kind: way === "shorter" ? "shorter-flange" : "longer-flange", group: "part", what: { faces: [face], path },
    amount: { name: "length", value: found.value, unit: document.units, from: length }, with: [],
    message: `With ${face} ${off} ${document.units} ${way}, ${found.value} ${document.units} in place of ${length}, there would be a plan.`,
  });
}
