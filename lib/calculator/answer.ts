import type { MeasureKind } from "@/lib/format/formatQuantity";

/** A number of a formula with what it measures; angles in degrees. */
export interface Figure {
  readonly value: number;
  readonly kind: MeasureKind;
}

/**
 * A formula written once and shown twice: with names and with numbers. `[a | b]` is a fraction, `R_i` has a lowered i; whatever
 * stands in `of` is replaced by its number. Angles within tan, cos and log stand in degrees.
 */
export interface Formula {
  readonly text: string;
  readonly of: Readonly<Record<string, Figure>>;
}

export interface Answer {
  readonly label: string;
  readonly kind: MeasureKind;
  readonly value: number;
  /** The other end where sources give a range. */
  readonly upTo?: number;
  readonly formula?: Formula;
  readonly source: string;
  readonly note?: string;
}

export interface AnswerGroup {
  readonly title?: string;
  readonly answers: readonly Answer[];
  /** Something to know before the numbers are used. */
  readonly remark?: { readonly tone: "note" | "caution"; readonly text: string };
}
