/** What the lines of a group are for. */
export type LineRole = "cut" | "bend up" | "bend down" | "leave out";

/** Lines that look alike: one layer, one colour, one line type. What a person chooses by. */
export interface LineGroup {
  readonly key: string;
  readonly layer: string;
  readonly colour: number;
  readonly lineType: string;
  readonly dashed: boolean;
  readonly hidden: boolean;
  /** Indices of its shapes. */
  readonly shapes: readonly number[];
  /** How many of each kind, e.g. "LINE": 12. */
  readonly kinds: Readonly<Record<string, number>>;
  /** Whether every line is straight. */
  readonly straight: boolean;
}
