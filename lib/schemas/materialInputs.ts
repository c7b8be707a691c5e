import { z } from "zod";
import { materialFields, materialGroups, originKinds, straightLengthGroups, type MaterialFacts, type MaterialField } from "@/bending/handbook/material";
import { springbackTable, type SpringbackMaterial } from "@/bending/handbook/springbackFactor";
import { filledText, plainText } from "./plainText";

export const materialIdParams = z.object({ id: filledText(60) });

/** Words of an address that stand for pages, not for materials. */
const TAKEN: readonly string[] = ["new", "import"];

const value = z.number({ error: "must be a number" });

const id = filledText(60)
  .regex(/^[\p{L}\p{N}][\p{L}\p{N} ._+-]*$/u, "must begin with a letter or digit, then letters, digits, spaces and . _ + - only")
  .refine((text) => !TAKEN.includes(text.toLowerCase()), "must be another word; this one is an address of its own");

const origin = z.strictObject({ kind: z.enum(originKinds, { error: `must be one of ${originKinds.join(", ")}` }), text: plainText(300) });

const rows = z.array(z.strictObject({ upTo: value, across: value, along: value.nullable() })).max(60, "must be at most 60 rows");

export const springbackRows = Object.keys(springbackTable) as [SpringbackMaterial, ...SpringbackMaterial[]];

/** A material's values, as the API takes them: strengths and modulus in MPa, density in kg/m³, radii in mm or in thicknesses. */
export const materialFactsSchema = z.strictObject({
  id,
  name: filledText(120),
  designation: filledText(120),
  standard: filledText(120),
  group: z.enum(materialGroups, { error: `must be one of ${materialGroups.join(", ")}` }),
  tensile: z.tuple([value, value], { error: "must be the lowest and the highest" }),
  yield: value,
  modulus: value,
  density: value,
  straightLengthGroup: z.enum(straightLengthGroups, { error: `must be one of ${straightLengthGroups.join(", ")}` }),
  naturalRadiusRatio: value,
  defaultRadiusPerThickness: value,
  allowance: z.discriminatedUnion("rule", [z.strictObject({ rule: z.enum(["din6935", "machinery", "faa"]) }), z.strictObject({ rule: z.literal("k"), k: value })], { error: "must be din6935, machinery, faa or k" }),
  minimumRadii: z.strictObject({ as: z.enum(["mm", "thickness"], { error: "must be mm or thickness" }), rows }).nullable(),
  springbackRow: z.enum(springbackRows, { error: `must be one of ${springbackRows.join(", ")}, or null` }).nullable(),
  origins: z.strictObject(Object.fromEntries(materialFields.map((field) => [field, origin])) as Record<MaterialField, typeof origin>),
}).transform((facts) => facts as unknown as MaterialFacts);

const note = plainText(2000).default("");

export const createMaterialSchema = z.strictObject({ facts: materialFactsSchema, note });

export const updateMaterialSchema = z.strictObject({
  basedOn: z.number({ error: "must be the number of the version that was changed" }).int("must be a whole number").min(1, "must be 1 or more").max(2_147_483_646, "is higher than any version"),
  facts: materialFactsSchema,
  note,
});

export const withdrawMaterialSchema = z.strictObject({ withdrawn: z.boolean({ error: "must be true or false" }), note });

export interface CreateMaterialInput {
  readonly facts: MaterialFacts;
  /** Why, for the record. */
  readonly note?: string | undefined;
}

export interface UpdateMaterialInput extends CreateMaterialInput {
  /** The version that was changed: when a newer one exists, nothing is saved. */
  readonly basedOn: number;
}

export interface WithdrawMaterialInput {
  readonly withdrawn: boolean;
  readonly note?: string | undefined;
}

export const csvExportQuerySchema = z.object({ separator: z.enum(["comma", "semicolon"], { error: "must be comma or semicolon" }).default("comma") });

