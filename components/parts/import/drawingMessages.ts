import type { Vec2 } from "@/bending/geometry/vec2";
import type { FoundFlat } from "@/bending/exchange/dxf/import/foundFlat";
import type { ImportChoices } from "@/bending/exchange/dxf/import/importChoices";
import type { OpenedDrawing } from "@/bending/exchange/dxf/import/openDrawing";

/** What the page knows of an opened drawing; its lines stay in the worker. */
export type DrawingFacts = Omit<OpenedDrawing, "shapes">;

export type DrawingAsk =
  | { readonly id: number; readonly kind: "open"; readonly bytes: ArrayBuffer }
  | { readonly id: number; readonly kind: "find"; readonly choices: ImportChoices };

export type DrawingAnswer =
  | { readonly id: number; readonly kind: "opened"; readonly facts: DrawingFacts }
  /** `paths`: the lines of each group, to be shown (mm). */
  | { readonly id: number; readonly kind: "found"; readonly flat: FoundFlat; readonly paths: readonly (readonly (readonly Vec2[])[])[] }
  | { readonly id: number; readonly kind: "failed"; readonly message: string };
