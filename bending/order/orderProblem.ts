import type { Pose } from "./pose";

/**
 * The order question without any geometry: bends as bits, moves (one stroke each, with a front), stations as
 * numbers, and a call that says whether a move can be made at a station when a set of bends is formed.
 */
export interface OrderProblem {
  /** How many bends; bit i of a set is bend i. At most 30. */
  readonly bends: number;
  readonly moves: readonly OrderMove[];
  readonly stations: number;
  readonly times: OrderTimes;
  /** Seconds to walk from one station to another. */
  readonly walk: (from: number, to: number) => number;
  readonly option: (move: number, formed: number, station: number) => StepOption | null;
  /** What is known of a move at any station without asking `option`; null where no station can make it. Absent: nothing is known. */
  readonly least?: (move: number, formed: number) => LeastOption | null;
}

export interface OrderMove {
  /** The bends that the stroke forms. */
  readonly mask: number;
  readonly pose: Pose;
  /** Strokes of the ram that it takes; 1 unless said (2 for a hem). */
  readonly strokes?: number;
}

export interface OrderTimes {
  readonly flip: number;
  readonly turn: number;
  readonly stroke: number;
  readonly gaugeMove: number;
}

export interface StepOption {
  /** Names the gauge setting; two steps with the same number need no gauge move between them. */
  readonly gauge: number;
  /** How many wishes (not demands) the step leaves unmet; fewer always goes before less time. */
  readonly demerit: number;
}

/** Never more than the answer at any station: what no answer goes below. */
export interface LeastOption {
  readonly demerit: number;
  /** The gauge settings that an answer can have; null when it can have any. Equal objects are kept as one. */
  readonly gauges: readonly number[] | null;
}

export interface OrderStep {
  readonly move: number;
  readonly station: number;
  /** The bends formed before this step. */
  readonly formed: number;
}

/** Largest count of bends: sets are kept in 31-bit integers. */
export const MAX_BENDS = 30;

/** Weighs a demerit against seconds, so that the order is by demerits first. */
export const DEMERIT_SECONDS = 1e6;

/** A gauge setting not settled yet, equal to every other: for problems that only bound the real one from below. */
export const ANY_GAUGE = -1;
