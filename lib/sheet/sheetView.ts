import type { MaterialFacts } from "@/bending/handbook/material";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { Machine } from "@/bending/tooling/machine";
import type { Tool } from "@/bending/tooling/tool";
import type { BedMap } from "./bedMap";
import type { StepPicture } from "./pictureShape";

/** What a plan was made of, as it was: enough to draw every step again. JSON-safe. */
export interface PlanSource {
  readonly plan: PlanDocument;
  readonly document: PartDocument;
  readonly material: MaterialFacts;
  readonly machine: Machine;
  readonly tools: readonly Tool[];
}

/**
 * A setup sheet ready to be shown: screen, print and PDF only place these texts, so they agree to the digit.
 * JSON-safe; frozen when the sheet is released.
 */
export interface SheetView {
  readonly format: "sheet/1";
  readonly header: SheetHeader;
  readonly cautions: readonly SheetCaution[];
  readonly pickList: readonly PickLine[];
  readonly bedMap: BedMap;
  readonly steps: readonly SheetStep[];
  readonly measurements: readonly SheetMeasurement[];
  readonly flat: SheetFlat;
  readonly source: PlanSource;
}

export interface SheetHeader {
  readonly number: string;
  readonly partNumber: string;
  readonly partName: string;
  readonly revision: string;
  readonly material: string;
  readonly thickness: string;
  readonly machine: string;
  readonly batch: string;
  readonly units: string;
  readonly status: string;
  readonly setupTime: string;
  readonly timePerPart: string;
  readonly bends: string;
  readonly stations: string;
  /** How sides and lengths are to be read on this sheet. */
  readonly conventions: readonly string[];
}

export interface SheetCaution {
  readonly level: "stop" | "caution";
  readonly text: string;
  /** Steps it belongs to, empty when it holds throughout. */
  readonly steps: readonly number[];
}

export interface PickLine {
  readonly piece: string;
  readonly tool: string;
  readonly toolName: string;
  readonly kind: "punch" | "die";
  readonly length: string;
  readonly horn: string;
  readonly rack: string;
  readonly station: string;
}

export interface SheetStep {
  readonly number: number;
  readonly bends: string;
  /** "TOP" is the side that is the base's top, "UNDER" its underside. */
  readonly upSide: "TOP" | "UNDER";
  readonly up: string;
  readonly front: string;
  readonly toGauge: string;
  readonly handling: string;
  readonly punch: string;
  readonly die: string;
  readonly station: string;
  readonly bendZ: string;
  readonly gaugeX: string;
  readonly gaugeR: string;
  readonly fingers: readonly { readonly x: string; readonly r: string; readonly z: string }[];
  readonly gaugeZ: string;
  readonly angle: string;
  readonly includedAngle: string;
  readonly demandedAngle: string;
  readonly insideRadius: string;
  readonly force: string;
  readonly depth: string;
  readonly picture: StepPicture;
  readonly above: StepPicture;
}

export interface SheetMeasurement {
  readonly what: string;
  readonly kind: "angle" | "length";
  readonly nominal: string;
  readonly tolerance: string;
  readonly low: string;
  readonly high: string;
  /** Where the tolerance comes from. */
  readonly source: string;
  /** What the order and the brake let it miss at worst; absent for angles, and on sheets of before it was kept. */
  readonly expected?: string;
  readonly afterStep: number | null;
}

export interface SheetFlat {
  readonly width: string;
  readonly depth: string;
  readonly area: string;
  readonly mass: string;
  readonly bends: readonly {
    readonly id: string;
    readonly allowance: string;
    readonly deduction: string;
    readonly k: string;
    readonly insideRadius: string;
    readonly source: string;
  }[];
}
