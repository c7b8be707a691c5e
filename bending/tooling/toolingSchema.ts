import { z } from "zod";
import { fields } from "./fields";

const section = z.strictObject({
  length: fields.positive("the length of the piece"),
  count: fields.whole("how many pieces are alike").optional(),
  horn: z.enum(["left", "right", "both"], 'must be "left", "right" or "both"; leave it out for a plain piece').optional(),
  pieces: z.array(fields.text("the mark on the piece")).optional(),
  rack: fields.text("the rack place").optional(),
});

const common = {
  id: fields.text("the tool's code"),
  name: fields.text("the tool's name").optional(),
  profile: fields.points("the tool's cross-section"),
  height: fields.positive("the working height"),
  maxForcePerMetre: fields.positive("the maker's rating in kN for each metre"),
  tang: fields.text("what the tool is held by"),
  sections: z.array(section, "must be a list of pieces").max(1000, "must have 1000 entries at the most"),
};

const punch = z.strictObject({
  ...common,
  kind: z.literal("punch"),
  tipAngle: fields.degrees("the angle of the tip", 180),
  tipRadius: fields.notNegative("the radius of the tip"),
});

const die = z.strictObject({
  ...common,
  kind: z.literal("die"),
  vOpening: fields.positive("the V opening, between the tops of the shoulder arcs"),
  vAngle: fields.degrees("the angle of the V", 180),
  shoulderRadius: fields.notNegative("the radius of the shoulders"),
  flattening: z.strictObject({
    floor: fields.positive("how far the floor of the slot lies under the top plane"),
    back: fields.number("where the slot ends, from the middle of the V"),
    opening: fields.positive("the clear height of the open slot"),
  }).optional(),
});

/** Shape of a tooling document; geometry is checked after it (`readTool`). */
export const toolingSchema = z.strictObject({
  format: z.literal("tooling/1", 'must be "tooling/1"'),
  units: fields.units,
  tools: z.array(z.discriminatedUnion("kind", [punch, die], 'must have the kind "punch" or "die"'), "must be a list of tools").max(5000, "must have 5000 tools at the most"),
});
