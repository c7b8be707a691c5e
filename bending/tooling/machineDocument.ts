import type { LengthUnit } from "../core/units";

type Points = readonly (readonly [number, number])[];
type Range = readonly [number, number];

/** The machine document, format `machine/1`: lengths in `units`, force in kN, times in seconds, angles in degrees. */
export interface MachineDocument {
  readonly format: "machine/1";
  readonly name: string;
  readonly units: LengthUnit;
  readonly bedLength: number;
  readonly betweenFrames: number;
  readonly maxForce: number;
  readonly daylight: number;
  readonly stroke: number;
  readonly throatDepth: number;
  readonly punchTang: string;
  readonly dieTang: string;
  readonly ramProfile: Points;
  readonly bedProfile: Points;
  readonly gauge: {
    readonly fingers: number;
    readonly independent: boolean;
    readonly x: Range;
    readonly r: Range;
    readonly z: Range;
    readonly minSpread: number;
    readonly fingerProfile: Points;
    readonly fingerWidth: number;
  };
  readonly settings?: {
    readonly clearance?: number | undefined;
    readonly maxSectionGap?: number | undefined;
    readonly maxUncoveredEnd?: number | undefined;
    readonly angleRepeat?: number | undefined;
    readonly gaugeRepeat?: number | undefined;
    /** Distance of the load's middle from the bed's and the share of `maxForce` that holds there, point by point; straight lines between. */
    readonly offCentre?: Points | undefined;
  } | undefined;
  readonly times?: {
    readonly flip?: number | undefined;
    readonly turn?: number | undefined;
    readonly walkPerMetre?: number | undefined;
    readonly stroke?: number | undefined;
    readonly gaugeMove?: number | undefined;
    readonly stationSetup?: number | undefined;
    readonly sectionPlace?: number | undefined;
  } | undefined;
}
