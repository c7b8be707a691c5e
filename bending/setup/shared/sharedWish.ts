import type { Interval } from "../../geometry/interval";

/** One bend that a shared bed must serve. All lengths in mm, from the middle of the bend's line along the bed. */
export interface SharedWish {
  /** Unique among the wishes. */
  readonly id: string;
  /** From the first bend line's start to the last one's end. */
  readonly lineLength: number;
  /** From where to where the part lies along the bed during the stroke. */
  readonly sheet: Interval;
  readonly forceKN: number;
  /** The tools that can make it; at least one. */
  readonly ways: readonly SharedWay[];
}

/** A pair of tools that can make the bend, and the stretch round its line in which each may stand. */
export interface SharedWay {
  readonly punch: string;
  readonly die: string;
  readonly punchWindow: Interval;
  readonly dieWindow: Interval;
}
