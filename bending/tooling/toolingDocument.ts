import type { LengthUnit } from "../core/units";

/** The tooling document, format `tooling/1`: lengths in `units`, angles in degrees, ratings in kN for each metre. */
export interface ToolingDocument {
  readonly format: "tooling/1";
  readonly units: LengthUnit;
  readonly tools: readonly ToolEntry[];
}

export type ToolEntry = PunchEntry | DieEntry;

export interface ToolEntryCommon {
  readonly id: string;
  readonly name?: string | undefined;
  readonly profile: readonly (readonly [number, number])[];
  readonly height: number;
  readonly maxForcePerMetre: number;
  readonly tang: string;
  readonly sections: readonly SectionEntry[];
}

export interface PunchEntry extends ToolEntryCommon {
  readonly kind: "punch";
  readonly tipAngle: number;
  readonly tipRadius: number;
}

export interface DieEntry extends ToolEntryCommon {
  readonly kind: "die";
  readonly vOpening: number;
  readonly vAngle: number;
  readonly shoulderRadius: number;
  /** The slot of a two-stage hem die: how far its floor lies under the top plane, x of its end from the middle of the V, clear height while open. */
  readonly flattening?: { readonly floor: number; readonly back: number; readonly opening: number } | undefined;
}

/** `count` pieces alike; `pieces` are the shop's marks, one for each. */
export interface SectionEntry {
  readonly length: number;
  readonly count?: number | undefined;
  readonly horn?: "left" | "right" | "both" | undefined;
  readonly pieces?: readonly string[] | undefined;
  readonly rack?: string | undefined;
}
