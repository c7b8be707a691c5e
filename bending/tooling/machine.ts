import type { KiloNewton, Mm, Rad } from "../core/units";
import type { ProfilePoint } from "../geometry/vec2";

/** A press brake, in millimetres; z from the middle of the bed, to the operator's right. */
export interface Machine {
  readonly name: string;
  readonly bedLength: Mm;
  readonly betweenFrames: Mm;
  readonly maxForce: KiloNewton;
  readonly daylight: Mm;
  readonly stroke: Mm;
  readonly throatDepth: Mm;
  readonly punchTang: string;
  readonly dieTang: string;
  /** y = 0 at the punch's seat, body upwards. */
  readonly ramProfile: readonly ProfilePoint[];
  /** y = 0 at the die's seat, body downwards. */
  readonly bedProfile: readonly ProfilePoint[];
  readonly gauge: BackGauge;
  readonly settings: MachineSettings;
  readonly times: MachineTimes;
}

export interface BackGauge {
  readonly fingers: number;
  readonly independent: boolean;
  readonly x: readonly [Mm, Mm];
  readonly r: readonly [Mm, Mm];
  readonly z: readonly [Mm, Mm];
  readonly minSpread: Mm;
  /** Stop face at x = 0, rest at y = 0, body towards the back (x > 0). */
  readonly fingerProfile: readonly ProfilePoint[];
  readonly fingerWidth: Mm;
}

export interface MachineSettings {
  readonly clearance: Mm;
  readonly maxSectionGap: Mm;
  readonly maxUncoveredEnd: Mm;
  readonly angleRepeat: Rad;
  readonly gaugeRepeat: Mm;
  /** How far the load's middle is from the bed's, and the share of the rating that holds there: outwards, shares not rising. Absent: the rating holds everywhere. */
  readonly offCentre?: readonly (readonly [distance: Mm, share: number])[];
}

/** Seconds (each), and seconds a metre for walking. */
export interface MachineTimes {
  readonly flip: number;
  readonly turn: number;
  readonly walkPerMetre: number;
  readonly stroke: number;
  readonly gaugeMove: number;
  readonly stationSetup: number;
  readonly sectionPlace: number;
}
