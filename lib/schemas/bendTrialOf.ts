import { mmPer, type LengthUnit } from "@/bending/core/units";
import type { BendTrial, Instrument } from "@/bending/shopTable/bendTrial";

/** One bent strip as written down: lengths in the line's own units, the angle in degrees turned through. */
export interface TrialFigures {
  readonly id: string;
  readonly material: string;
  readonly batch: string;
  /** What the sheet was bought as; null: the nearest usual thickness. */
  readonly nominal: number | null;
  readonly thickness: number;
  readonly vOpening: number;
  readonly punchRadius: number;
  readonly angle: number;
  readonly blank: number;
  readonly flangeA: number;
  readonly flangeB: number;
  /** Null: not measured. */
  readonly insideRadius: number | null;
}

/** What a line of the notebook says, with what it was measured by (instruments by their ids) and when. */
export interface TrialEntry extends TrialFigures {
  readonly lengthInstrument: string;
  readonly thicknessInstrument: string | null;
  readonly angleInstrument: string;
  readonly radiusInstrument: string | null;
  readonly measuredOn: string;
}

/** Resolution and limit of error in millimetres, of a protractor in degrees. */
export type InstrumentLookup = (id: string) => Instrument | undefined;

/** The line as the library evaluates it, in the line's units; undefined when an instrument is not known. */
export function bendTrialOf(entry: TrialEntry, units: LengthUnit, instruments: InstrumentLookup): BendTrial | undefined {
  const scaled = (found: Instrument | undefined): Instrument | undefined =>
    found && { uncertainty: found.uncertainty / mmPer(units), resolution: found.resolution / mmPer(units) };
  const length = scaled(instruments(entry.lengthInstrument));
  const angle = instruments(entry.angleInstrument);
  const thickness = entry.thicknessInstrument === null ? null : scaled(instruments(entry.thicknessInstrument));
  const radius = entry.radiusInstrument === null ? null : scaled(instruments(entry.radiusInstrument));
  if (length === undefined || angle === undefined || thickness === undefined || radius === undefined) return undefined;
  return {
    id: entry.id, units, material: entry.material, batch: entry.batch,
    ...(entry.nominal === null ? {} : { nominalThickness: entry.nominal }),
    thickness: entry.thickness, vOpening: entry.vOpening, punchRadius: entry.punchRadius, angle: entry.angle,
    blankLength: entry.blank, flanges: [entry.flangeA, entry.flangeB], insideRadius: entry.insideRadius,
    instruments: { length, thickness, angle: { uncertainty: angle.uncertainty, resolution: angle.resolution }, radius },
    measuredOn: entry.measuredOn,
  };
}
