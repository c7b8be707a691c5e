import { z } from "zod";
import { listQuerySchema } from "./listQuery";
import { filledText, plainText } from "./plainText";
import type { ListQuery } from "./views";

export const toolSorts = ["code", "name", "kind", "angle", "radius", "vOpening", "height", "maxForce", "pieces", "lengthInService"] as const;

export const toolListQuerySchema = listQuerySchema(toolSorts, "code").extend({ kind: z.enum(["punch", "die"], { error: "must be punch or die" }).optional() });

export interface ToolListQuery extends ListQuery {
  readonly sort?: (typeof toolSorts)[number] | undefined;
  readonly kind?: "punch" | "die" | undefined;
}

export const toolCodeParams = z.object({ code: filledText(60) });

const length = z.number().positive("must be more than 0").max(20_000, "must be at most 20000");

const pieceSchema = z.strictObject({
  /** Made up when absent. */
  code: filledText(80).optional(),
  /** In the units of the request, millimetres unless said. */
  length,
  horn: z.enum(["left", "right", "both"], { error: "must be left, right, both or null" }).nullable().default(null),
  rack: plainText(60).default(""),
  /** How many alike; only without a code. */
  count: z.number().int("must be a whole number").min(1, "must be 1 or more").max(200, "must be at most 200").default(1),
}).refine((piece) => piece.code === undefined || piece.count === 1, { path: ["count"], error: "must be 1 when the piece has a code of its own" });
export type PieceInput = z.output<typeof pieceSchema>;

const units = z.enum(["mm", "in"], { error: "must be mm or in" }).default("mm");

const code = filledText(60).regex(/^[\p{L}\p{N}][\p{L}\p{N} ._+-]*$/u, "must begin with a letter or digit, then letters, digits, spaces and . _ + - only");

/** The tool's own values go to the library to be checked: profile, angles, radii, heights, ratings. */
const toolValues = {
  name: filledText(120).optional(),
  profile: z.unknown().optional(),
  tipAngle: z.unknown().optional(),
  tipRadius: z.unknown().optional(),
  vOpening: z.unknown().optional(),
  vAngle: z.unknown().optional(),
  shoulderRadius: z.unknown().optional(),
  flattening: z.unknown().optional(),
  height: z.unknown().optional(),
  maxForcePerMetre: z.unknown().optional(),
  tang: filledText(60).optional(),
};

export const toolSchema = z.strictObject({
  code,
  kind: z.enum(["punch", "die"], { error: "must be punch or die" }),
  units,
  ...toolValues,
  pieces: z.array(pieceSchema).max(200, "must be at most 200 entries").default([]),
});

export const updateToolSchema = z.strictObject({ units, ...toolValues });

export const addPiecesSchema = z.strictObject({ units, pieces: z.array(pieceSchema).min(1, "give at least one piece").max(200, "must be at most 200 entries") });
export type AddPiecesInput = z.input<typeof addPiecesSchema>;

interface ToolValues {
  readonly units?: "mm" | "in" | undefined;
  readonly name?: string | undefined;
  readonly profile: readonly (readonly [number, number])[];
  readonly tipAngle?: number | undefined;
  readonly tipRadius?: number | undefined;
  readonly vOpening?: number | undefined;
  readonly vAngle?: number | undefined;
  readonly shoulderRadius?: number | undefined;
  /** The slot of a two-stage hem die. */
  readonly flattening?: { readonly floor: number; readonly back: number; readonly opening: number } | undefined;
  readonly height: number;
  readonly maxForcePerMetre: number;
  readonly tang?: string | undefined;
}

/** Lengths in `units` (mm unless said), angles in degrees, force in kN a metre, as in a tooling document. */
export interface ToolInput extends ToolValues {
  readonly code: string;
  readonly kind: "punch" | "die";
  readonly pieces?: readonly z.input<typeof pieceSchema>[] | undefined;
}

/** Only what changes; an absent key stays. */
export type UpdateToolInput = Partial<ToolValues>;

export const updatePieceSchema = z.strictObject({
  state: z.enum(["in rack", "at brake", "at regrind", "withdrawn"], { error: "must be in rack, at brake, at regrind or withdrawn" }).optional(),
  /** The brake where it stands; with the state `at brake` only. */
  machineId: z.uuid("must be the id of a machine").optional(),
  rack: plainText(60).optional(),
  /** After a cut or a regrind, in mm. */
  lengthMm: length.optional(),
}).refine((change) => (change.state === "at brake") === (change.machineId !== undefined), {
  path: ["machineId"], error: "must name the machine when the state is at brake, and only then",
}).refine((change) => Object.values(change).some((value) => value !== undefined), { error: "must change something: state, rack or lengthMm" });
export type UpdatePieceInput = z.input<typeof updatePieceSchema>;
