export interface ToolDraft {
  readonly code: string;
  readonly name: string;
  readonly kind: "punch" | "die";
  readonly angle: string;
  readonly radius: string;
  readonly vOpening: string;
  readonly height: string;
  readonly bodyWidth: string;
  readonly rating: string;
  readonly tang: string;
  /** Does the die flatten hems in a slot? The next three describe it. */
  readonly flattens: boolean;
  readonly slotFloor: string;
  readonly slotBack: string;
  readonly slotOpening: string;
  /** One point a line: x and y in mm. */
  readonly profile: string;
}

export const firstToolDraft: ToolDraft = {
  code: "", name: "", kind: "punch", angle: "88", radius: "0.8", vOpening: "16", height: "120", bodyWidth: "26", rating: "1000", tang: "20 mm", flattens: false, slotFloor: "44", slotBack: "6", slotOpening: "20", profile: "",
};
