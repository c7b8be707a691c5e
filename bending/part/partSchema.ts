import { z } from "zod";
import { PART_LIMITS } from "./partLimits";

const number = z.number();
const positive = z.number().positive();
const notNegative = z.number().min(0);
const point = z.tuple([number, number]);
const vertex = z.union([point, z.tuple([number, number, number])], "must be [x, y] or [x, y, bulge]");
const outline = z.array(vertex).min(3, "needs at least 3 vertices").max(PART_LIMITS.vertices);
// Over 180 degrees is for teardrop hems alone, which the check of the bend says.
const angle = z.number().gt(0, "must be over 0 (0 = flat, no bend) and at most 180 degrees turned through").max(270, "must be over 0 and at most 180 degrees turned through");
const direction = z.enum(["up", "down"]);
const dimension = z.enum(["outside", "inside", "tangent"]);
const hem = z.enum(["closed", "open", "teardrop"]);
const kFactor = z.number().gt(0, "must be over 0 and at most 1").max(1, "must be over 0 and at most 1");
const toleranceAngle = positive.max(45, "must be over 0 and at most 45 degrees");
const taper = z.number().gt(0, "must be over 0 and under 180 degrees (90 = square)").lt(180, "must be over 0 and under 180 degrees (90 = square)");
// Ids are joined with "+" and "," where an order is written down.
const id = z.string().min(1, "must not be empty").max(PART_LIMITS.id)
  .refine((text) => text.trim() === text && !/[+,\p{Cc}]/u.test(text), "must not hold '+', ',' or control characters, nor start or end with a space");

const relief = z.strictObject({ kind: z.enum(["rectangular", "round", "tear", "none"]), width: positive.optional(), depth: positive.optional() });
const corner = z.strictObject({ kind: z.enum(["open", "mitre"]), gap: notNegative.optional() }).superRefine((value, context) => {
  const say = (message: string) => context.addIssue({ code: "custom", path: ["gap"], message });
  if (value.kind === "mitre" && value.gap === undefined) say("is missing: a mitre needs the gap that stays between the flanges");
  if (value.kind === "open" && value.gap !== undefined) say("belongs to a mitre only");
});

const hole = z.strictObject({
  circle: point.optional(),
  diameter: positive.optional(),
  slot: z.tuple([point, point]).optional(),
  width: positive.optional(),
  polygon: outline.optional(),
}).superRefine((value, context) => {
  const kinds = (["circle", "slot", "polygon"] as const).filter((kind) => value[kind] !== undefined);
  const say = (path: string[], message: string) => context.addIssue({ code: "custom", path, message });
  if (kinds.length !== 1) say([], "must be one of: circle with diameter, slot with width, polygon");
  else if (kinds[0] === "circle" && value.diameter === undefined) say(["diameter"], "is missing: a circle needs its diameter");
  else if (kinds[0] === "slot" && value.width === undefined) say(["width"], "is missing: a slot needs its width");
  if (value.diameter !== undefined && kinds[0] !== "circle") say(["diameter"], "belongs to a circle only");
  if (value.width !== undefined && kinds[0] !== "slot") say(["width"], "belongs to a slot only");
});
const holes = z.array(hole).max(PART_LIMITS.holes);

const bendOptions = {
  angle,
  direction,
  insideRadius: notNegative.optional(),
  kFactor: kFactor.optional(),
};

const profile = z.strictObject({
  width: positive,
  legs: z.array(positive).min(1, "needs at least one leg").max(PART_LIMITS.bends + 1),
  bends: z.array(z.strictObject({
    ...bendOptions,
    hem: hem.optional(),
    gap: notNegative.optional(),
    toleranceAngle: toleranceAngle.optional(),
    strokeWith: id.optional(),
  })).max(PART_LIMITS.bends),
});

const flange = z.strictObject({
  id,
  on: z.string().min(1, "must not be empty"),
  edge: z.number().int("must be a whole number: edge k runs from vertex k to vertex k + 1").min(0, "must be 0 or more"),
  length: positive.optional(),
  outline: outline.optional(),
  ...bendOptions,
  dimension: dimension.optional(),
  hem: hem.optional(),
  gap: notNegative.optional(),
  start: notNegative.optional(),
  end: notNegative.optional(),
  startAngle: taper.optional(),
  endAngle: taper.optional(),
  relief: relief.optional(),
  corner: corner.optional(),
  offset: z.strictObject({ height: positive }).optional(),
  strokeWith: id.optional(),
  holes: holes.optional(),
  toleranceAngle: toleranceAngle.optional(),
  toleranceLength: positive.optional(),
});

const flat = z.strictObject({
  outline,
  holes: holes.optional(),
  bends: z.array(z.strictObject({
    id,
    line: z.tuple([point, point]),
    ...bendOptions,
    hem: hem.optional(),
    gap: notNegative.optional(),
    toleranceAngle: toleranceAngle.optional(),
    strokeWith: id.optional(),
  })).max(PART_LIMITS.bends),
  base: point.optional(),
});

/** The shape of a part document; unknown keys are refused. Lengths are checked against limits elsewhere. */
export const partSchema = z.strictObject({
  format: z.literal("part/1"),
  name: z.string().min(1, "must not be empty").max(PART_LIMITS.name),
  units: z.enum(["mm", "in"]),
  material: z.string().min(1, "must not be empty").max(PART_LIMITS.id),
  thickness: z.number().positive("must be more than 0"),
  insideRadius: notNegative.optional(),
  kFactor: kFactor.optional(),
  rule: z.enum(["shop", "din6935", "machinery", "faa", "k"]).optional(),
  dimension: dimension.optional(),
  toleranceAngle: toleranceAngle.optional(),
  toleranceLength: positive.optional(),
  grain: z.union([z.enum(["x", "y"]), z.number().min(-180).max(180)], 'must be "x", "y", or degrees from x, from -180 to 180').optional(),
  relief: relief.optional(),
  corner: corner.optional(),
  profile: profile.optional(),
  base: z.strictObject({ outline, holes: holes.optional() }).optional(),
  flanges: z.array(flange).max(PART_LIMITS.bends).optional(),
  flat: flat.optional(),
});
