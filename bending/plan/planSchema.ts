import { z } from "zod";

const number = z.number();
const range = z.tuple([number, number]);
const text = z.string();

const section = z.union([
  z.strictObject({ length: number.positive(), piece: text.optional(), horn: z.enum(["left", "right", "both"]).optional() }),
  z.strictObject({ gap: number.positive() }),
]);

const reason = z.strictObject({
  kind: z.enum(["clearance", "self-collision", "minimum-flange", "no-punch", "no-die", "force", "tool-force", "sections", "bed", "daylight", "gauge", "angle",
    "radius", "lift", "throat", "hem", "order", "budget", "part", "whip-up", "tool-choice", "tolerance"]),
  bends: z.array(text),
  faces: z.array(text),
  tools: z.array(text),
  message: text,
  evidence: z.strictObject({ strokeAngle: number, depth: number, zFrom: number, zTo: number }).optional(),
});

const texts = z.array(text);
const failure = z.strictObject({
  done: texts,
  step: z.int().min(1).nullable(),
  strokes: z.array(z.strictObject({
    bends: texts,
    reasons: z.array(reason.extend({ fronts: texts, pairs: z.array(z.strictObject({ punch: text, die: text })), leastDepth: number.optional() })),
    wouldWork: z.array(z.strictObject({ before: texts, after: texts })),
  })),
  message: text,
});

const amount = z.strictObject({ name: text, value: number, unit: z.enum(["mm", "in", "deg", "kN", "kN/m", "bends", "pieces"]), from: number.optional() });
const change = z.strictObject({
  kind: z.enum(["free-choice", "move-bends", "one-by-one", "section", "punch-relief", "punch-height", "punch-width", "die-opening", "die-height", "die-width", "tool-angle", "tool-rating", "hem-die",
    "daylight", "stroke", "bed-length", "between-frames", "throat", "force", "section-gap", "shorter-flange", "longer-flange", "leave-out", "clearance"]),
  group: z.enum(["order", "stock", "tool", "machine", "part", "setting"]),
  what: z.strictObject({ bends: texts.optional(), faces: texts.optional(), tools: texts.optional(), path: text.optional() }),
  amount: amount.nullable(),
  with: z.array(amount),
  order: texts.optional(),
  message: text,
  plan: z.strictObject({ status: z.enum(["optimal", "feasible"]), cost: number, order: texts }),
  found: z.strictObject({ plans: z.int(), notEnough: number.optional(), resolution: number.optional() }),
});

const tolerance = z.strictObject({
  kind: z.enum(["leg", "hole", "overall"]),
  face: text, from: text, to: text, across: z.literal(true).optional(),
  nominal: number, worstCase: number.nonnegative().nullable(), statistical: number.nonnegative().nullable(), asked: number.positive().optional(),
  shares: z.array(z.strictObject({ step: z.int().min(1), gauge: number.nonnegative(), angle: number.nonnegative() })),
});

const counts = z.strictObject({ flips: number, turns: number, metres: number, strokes: number, gaugeMoves: number, stations: number, pieces: number });
const robustnessEnd = z.strictObject({ seconds: number, factor: number.nullable(), other: z.strictObject({ order: texts, stations: number, counts }), differs: text }).nullable();
const robustness = z.strictObject({
  range,
  settings: z.array(z.strictObject({
    setting: z.enum(["flip", "turn", "walkPerMetre", "stroke", "gaugeMove", "stationSetup", "sectionPlace"]),
    seconds: number, count: number, low: robustnessEnd, high: robustnessEnd, settled: z.boolean(),
  })),
  plans: z.int(),
});

const step = z.strictObject({
  bends: z.array(text).min(1),
  hit: z.strictObject({ number: z.int().min(1), of: z.int().min(2) }).optional(),
  front: text,
  punch: text,
  die: text,
  station: text,
  bendZ: range,
  angle: number.positive().max(270),
  acuteAngle: number.positive().max(180).optional(),
  demandedAngle: number.positive(),
  insideRadius: number.nonnegative(),
  forceKN: number.nonnegative(),
  depthMm: number,
  toolWindow: range,
  room: z.strictObject({ punch: range, die: range, sheet: range }).optional(),
  offCentre: z.strictObject({ z: number, limitKN: number.positive() }).optional(),
  gauge: z.strictObject({
    x: number, r: number, fingers: z.array(z.strictObject({ x: number, r: number, z: number })), face: text, edge: z.int(), on: z.enum(["edge", "face"]).optional(),
  }),
  handling: z.strictObject({ flip: z.boolean(), turn: number.min(0).max(180) }),
});

const said = {
  kind: z.enum(["override", "closed hem", "shop", "shop interpolated", "handbook"]),
  text,
  allowance: number,
  deduction: number,
  k: number,
  shop: z.strictObject({
    count: z.int().min(1), spread: number.nullable(), expanded: number, lastMeasured: text, vOpening: number, openingFrom: z.enum(["die", "radius", "usual"]),
    places: z.array(z.strictObject({ thickness: number, vOpening: number, angle: number, punchRadii: z.array(number), count: z.int().min(1), lastMeasured: text, weight: number })),
  }).nullable(),
};
const basis = z.strictObject({ ...said, next: z.strictObject(said).nullable() });

const flat = z.strictObject({
  width: number, depth: number, area: number, massKg: number,
  bends: z.array(z.strictObject({ id: text, allowance: number, deduction: number, k: number, insideRadius: number, source: text, basis: basis.optional() })),
});

const common = {
  format: z.literal("plan/1"),
  engine: text,
  units: z.enum(["mm", "in"]),
  part: text,
  machine: text,
  batch: z.int().min(1),
  status: z.enum(["optimal", "feasible", "infeasible", "unknown"]),
  gap: number.min(0).max(1),
  flat,
  flatLength: number,
  splits: z.array(z.strictObject({ bend: text, hits: z.int().min(2), allowance: number.positive() })).optional(),
  steps: z.array(step),
  order: z.array(text),
  stations: z.array(z.strictObject({
    id: text, punch: text, die: text, from: number, to: number, punchSections: z.array(section), dieSections: z.array(section),
  })),
  seconds: z.strictObject({ setup: number, perPart: number, total: number }),
  counts: counts.optional(),
  cost: number,
  proof: z.strictObject({ method: text, expanded: z.int(), bound: number }),
  reasons: z.array(reason),
  cautions: z.array(reason),
  tolerances: z.array(tolerance).optional(),
  firstFailure: failure.optional(),
  changes: z.array(change).optional(),
  robustness: robustness.optional(),
  elapsedMs: number,
};

/** The plan document, format `plan/1`; unknown keys are refused. */
export const planSchema = z.strictObject({ ...common, alternatives: z.array(z.strictObject(common).partial({ flat: true, elapsedMs: true })).optional() });
