import type { PictureLabel, ShapeKind } from "./pictureShape";

/** A colour of the house by name; a screen takes it from the theme, paper from `paperColours`. */
export type Paint = "steel-100" | "steel-200" | "steel-300" | "steel-400" | "steel-500" | "steel-600" | "steel-700" | "ink" | "ink-soft" | "accent" | "accent-wash" | "amber" | "amber-wash" | "sheet" | "brick";

export interface ShapeLook {
  readonly fill: Paint | null;
  readonly line: Paint | null;
  /** Line width in px on screen. */
  readonly width: number;
  readonly dash?: readonly number[];
  readonly fade?: number;
}

/** How each kind of shape is drawn, on screen and on paper. */
export const shapeLook: Record<ShapeKind, ShapeLook> = {
  ram: { fill: "steel-100", line: "steel-300", width: 1 },
  bed: { fill: "steel-100", line: "steel-300", width: 1 },
  punch: { fill: "steel-300", line: "steel-600", width: 1.25 },
  die: { fill: "steel-300", line: "steel-600", width: 1.25 },
  finger: { fill: "amber-wash", line: "amber", width: 1.25 },
  "sheet-cut": { fill: "accent", line: "accent", width: 1 },
  "sheet-met": { fill: "brick", line: "brick", width: 2 },
  "sheet-beyond": { fill: "accent-wash", line: "accent", width: 0.75, fade: 0.85 },
  "sheet-before": { fill: "steel-400", line: null, width: 0, fade: 0.4 },
  "front-face": { fill: "sheet", line: "accent", width: 0.75, fade: 0.95 },
  "bend-zone": { fill: "accent-wash", line: null, width: 0 },
  "bend-line": { fill: null, line: "ink", width: 3 },
  "bend-done": { fill: null, line: "steel-400", width: 1 },
  "bend-to-come": { fill: null, line: "ink-soft", width: 1, dash: [8, 3, 2, 3] },
  "gauged-edge": { fill: null, line: "brick", width: 4 },
  "tool-extent": { fill: "steel-400", line: "steel-600", width: 0.75, fade: 0.6 },
  arrow: { fill: "ink", line: "ink", width: 1.5 },
  centre: { fill: null, line: "ink-soft", width: 0.75, dash: [10, 3, 2, 3] },
};

export const labelPaint: Record<PictureLabel["kind"], Paint> = { up: "ink", front: "ink-soft", gauge: "ink", note: "ink-soft" };
export const labelScale: Record<PictureLabel["kind"], number> = { up: 1.9, front: 0.9, gauge: 1.1, note: 0.9 };

/** The light theme's values, for paper. */
export const paperColours: Record<Paint, string> = {
  "steel-100": "#e6e9eb", "steel-200": "#ced4d9", "steel-300": "#aeb7bf", "steel-400": "#8a95a0", "steel-500": "#69747f", "steel-600": "#4d5762", "steel-700": "#363e47",
  ink: "#20242a", "ink-soft": "#454d57", accent: "#17766c", "accent-wash": "#dfebe6", amber: "#b7791f", "amber-wash": "#f5e8cc", sheet: "#fdfcf8", brick: "#b23a2a",
};
