import { z } from "zod";
import { trialAngle, trialLimits, trialLinesMost, type TrialLengthField } from "./bendTableLimits";
import { listQuerySchema } from "./listQuery";
import { filledText, plainText } from "./plainText";
import type { ListQuery } from "./views";

export const trialSorts = ["number", "material", "batch", "thickness", "vOpening", "punchRadius", "angle", "measuredOn", "measuredBy"] as const;
export const trialStates = ["counted", "excluded", "withdrawn"] as const;
export type TrialState = (typeof trialStates)[number];

export const trialListQuerySchema = listQuerySchema(trialSorts, "number", "desc").extend({
  material: plainText(60).optional(),
  state: z.enum(trialStates, { error: "must be counted, excluded or withdrawn" }).optional(),
});

export interface TrialListQuery extends ListQuery {
  readonly sort?: (typeof trialSorts)[number] | undefined;
  readonly material?: string | undefined;
  readonly state?: TrialState | undefined;
}

/** The lengths are given in the request's own units, so their limits are checked once they are millimetres. */
const length = z.number({ error: "must be a number" });

const day = z.iso.date("must be a day as 2026-12-01");

const trialLineSchema = z.strictObject({
  id: z.uuid("must be an id made for this line"),
  material: filledText(60),
  batch: plainText(60).default(""),
  /** What the sheet was bought as; null: the nearest usual thickness. */
  nominal: length.nullable().default(null),
  thickness: length,
  vOpening: length,
  punchRadius: length,
  /** Degrees turned through. */
  angle: z.number({ error: "must be a number" }).gt(trialAngle.above, "must be more than 0").lt(trialAngle.below, "must be less than 180"),
  blank: length,
  flangeA: length,
  flangeB: length,
  /** Null: not measured. */
  insideRadius: length.nullable().default(null),
  lengthInstrument: z.uuid("must be the id of an instrument"),
  /** Null: the one for lengths. */
  thicknessInstrument: z.uuid("must be the id of an instrument").nullable().default(null),
  angleInstrument: z.uuid("must be the id of an instrument"),
  radiusInstrument: z.uuid("must be the id of an instrument").nullable().default(null),
  measuredOn: day,
  measuredBy: filledText(120),
  note: plainText(500).default(""),
  partId: z.uuid("must be the id of a part").nullable().default(null),
  sheetId: z.uuid("must be the id of a sheet").nullable().default(null),
}).refine((line) => (line.insideRadius === null) === (line.radiusInstrument === null), {
  path: ["radiusInstrument"], error: "must be given exactly when the inside radius is",
});
export type TrialLineInput = z.output<typeof trialLineSchema>;

export const addTrialsSchema = z.strictObject({
  units: z.enum(["mm", "in"], { error: "must be mm or in" }).default("mm"),
  lines: z.array(trialLineSchema).min(1, "give at least one trial").max(trialLinesMost, `must be at most ${trialLinesMost} lines`),
});
export type AddTrialsInput = z.input<typeof addTrialsSchema>;

export const trialLengthFields = Object.keys(trialLimits) as readonly TrialLengthField[];

const reason = z.string().trim().min(1, "say why").max(500, "must be at most 500 characters").pipe(plainText(500));

export const judgeTrialSchema = z.discriminatedUnion("state", [
  z.strictObject({ state: z.literal("counted") }),
  z.strictObject({ state: z.literal("excluded"), reason }),
  z.strictObject({ state: z.literal("withdrawn"), reason }),
], { error: "must be counted, excluded or withdrawn" });
export type JudgeTrialInput = z.input<typeof judgeTrialSchema>;

export const instrumentKinds = ["calliper", "micrometer", "height gauge", "protractor", "radius gauge"] as const;
export type InstrumentKind = (typeof instrumentKinds)[number];

const error = z.number({ error: "must be a number" }).max(10, "must be at most 10");

export const instrumentSchema = z.strictObject({
  name: filledText(80),
  kind: z.enum(instrumentKinds, { error: `must be one of ${instrumentKinds.join(", ")}` }),
  /** Smallest step that it shows, in millimetres, of a protractor in degrees; 0 when it is part of the uncertainty. */
  resolution: error.min(0, "must be 0 or more"),
  /** Limit of error: what it reads is within plus or minus this of the truth. */
  uncertainty: error.gt(0, "must be more than 0"),
  note: plainText(500).default(""),
});
export type InstrumentInput = z.input<typeof instrumentSchema>;

export const withdrawInstrumentSchema = z.strictObject({ reason });

export const valueSorts = ["material", "thickness", "vOpening", "punchRadius", "angle", "deduction", "k", "insideRadius", "spread", "trials", "lastMeasured"] as const;
export type ValueSort = (typeof valueSorts)[number];
/** All well; a trial lies apart; fewer than three count, so that none can be told to lie apart; none counts. */
export const valueStates = ["ok", "outlier", "few", "none"] as const;
export type ValueState = (typeof valueStates)[number];

export const valueListQuerySchema = listQuerySchema(valueSorts, "material").extend({
  material: plainText(60).optional(),
  state: z.enum(valueStates, { error: `must be one of ${valueStates.join(", ")}` }).optional(),
});

export interface ValueListQuery extends ListQuery {
  readonly sort?: ValueSort | undefined;
  readonly material?: string | undefined;
  readonly state?: ValueState | undefined;
}

export const coverageQuerySchema = z.object({ material: filledText(60) });

/** The key of a value, as the list gives it. */
export const valueParams = z.object({ key: filledText(200) });

export const exportParams = z.object({ what: z.enum(["trials", "values"], { error: "must be trials or values" }) });
export const exportQuerySchema = z.object({
  material: plainText(60).optional(),
  separator: z.enum(["comma", "semicolon"], { error: "must be comma or semicolon" }).default("comma"),
});
