import type { Vec2 } from "@/bending/geometry/vec2";

/** What a shape of a drawing stands for; the renderer gives it its colour and line. */
export type ShapeKind =
  | "ram" | "bed" | "punch" | "die" | "finger"
  | "sheet-cut" | "sheet-met" | "sheet-beyond" | "sheet-before" | "front-face" | "bend-zone"
  | "bend-line" | "bend-done" | "bend-to-come" | "gauged-edge" | "tool-extent" | "arrow" | "centre";

export interface PictureShape {
  readonly kind: ShapeKind;
  readonly closed: boolean;
  readonly points: readonly Vec2[];
  /** Loops that are cut out (even-odd). */
  readonly holes?: readonly (readonly Vec2[])[];
}

export interface PictureLabel {
  readonly kind: "up" | "front" | "gauge" | "note";
  readonly text: string;
  readonly at: Vec2;
  readonly anchor: "start" | "middle" | "end";
}

/** A drawing in its own units with y downwards (as SVG has it); shapes are drawn in order. */
export interface StepPicture {
  /** Left, top, width, height. */
  readonly box: readonly [number, number, number, number];
  readonly shapes: readonly PictureShape[];
  readonly labels: readonly PictureLabel[];
  /** Height of lettering, in the drawing's units. */
  readonly lettering: number;
}
