import { z } from "zod";
import { fields } from "./fields";

const gauge = z.strictObject({
  fingers: fields.whole("how many gauge fingers there are"),
  independent: fields.flag("true when fingers can stand at two depths, else false"),
  x: fields.range("travel in X, from the bend line to the back"),
  r: fields.range("travel in R, up from the die's top"),
  z: fields.range("travel in Z, from the middle of the bed"),
  minSpread: fields.notNegative("the least distance of two fingers"),
  fingerProfile: fields.points("the finger, its stop face at x = 0"),
  fingerWidth: fields.positive("the width of a finger"),
});

const offCentre = z.array(
  z.tuple([fields.positive("the distance of the load from the middle of the bed"), fields.positive("the share of the rating that holds there").lte(1, "must be 1 at the most: the share of the rating that holds there")]),
  "must be a list of points [distance, share]: how much of the rating holds so far from the middle of the bed",
).min(1, "must have a point [distance, share]; leave it out where the rating holds everywhere").max(50, "must have 50 points at the most")
  .refine((points) => points.every(([distance, share], i) => { const before = points[i - 1]; return !before || (distance > before[0] && share <= before[1]); }), "must go outwards from the middle, and no share may be larger than the one before")
  .optional();

const settings = z.strictObject({
  clearance: fields.positive("the clearance between part and tools").optional(),
  maxSectionGap: fields.notNegative("the widest gap between two pieces").optional(),
  maxUncoveredEnd: fields.notNegative("how far a bend may stand out over its station").optional(),
  angleRepeat: fields.notNegative("how far the angle repeats, in degrees").optional(),
  gaugeRepeat: fields.notNegative("how far the gauge repeats").optional(),
  offCentre,
});

const seconds = fields.notNegative("seconds").optional();
const times = z.strictObject({ flip: seconds, turn: seconds, walkPerMetre: seconds, stroke: seconds, gaugeMove: seconds, stationSetup: seconds, sectionPlace: seconds });

/** Shape of a machine document; geometry is checked after it (`readMachineDocument`). */
export const machineSchema = z.strictObject({
  format: z.literal("machine/1", 'must be "machine/1"'),
  name: fields.text("the machine's name"),
  units: fields.units,
  bedLength: fields.positive("the length of the bed"),
  betweenFrames: fields.positive("the width between the side frames"),
  maxForce: fields.positive("the greatest force in kN"),
  daylight: fields.positive("the open height between the seats of punch and die"),
  stroke: fields.positive("the ram's travel"),
  throatDepth: fields.positive("the depth of the throat"),
  punchTang: fields.text("what holds the punches"),
  dieTang: fields.text("what holds the dies"),
  ramProfile: fields.points("the ram's cross-section, y = 0 at the punch's seat"),
  bedProfile: fields.points("the bed's cross-section, y = 0 at the die's seat"),
  gauge,
  settings: settings.optional(),
  times: times.optional(),
});
