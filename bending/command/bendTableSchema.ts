import { z } from "zod";

const number = z.number("must be a number");
const instrument = z.strictObject({
  uncertainty: number.positive("must be over 0: the instrument's limit of error"),
  resolution: number.min(0, "must be 0 or more").default(0),
});
const instruments = z.strictObject({
  length: instrument,
  angle: instrument,
  thickness: instrument.optional(),
  radius: instrument.optional(),
});

/** A bend table for the command line, format `bend-table/1`: trials with their lengths in `units`, angles in degrees turned through. */
export const bendTableSchema = z.strictObject({
  format: z.literal("bend-table/1", 'must be "bend-table/1"'),
  units: z.enum(["mm", "in"], 'must be "mm" or "in"'),
  /** What the trials were measured with, unless a trial names its own. */
  instruments,
  trials: z.array(z.strictObject({
    id: z.string().optional(),
    material: z.string().min(1, "must name the material"),
    batch: z.string().default(""),
    nominalThickness: number.optional(),
    thickness: number,
    vOpening: number,
    punchRadius: number,
    angle: number,
    blankLength: number,
    flanges: z.tuple([number, number], "must be the two legs, such as [60.02, 40.01]"),
    insideRadius: number.optional(),
    instruments: instruments.partial().optional(),
    measuredOn: z.string(),
    excluded: z.strictObject({ reason: z.string().min(1, "say why the trial does not count"), by: z.string(), on: z.string() }).optional(),
  })).max(100_000, "must be at most 100 000 trials"),
});
