import { ok } from "@/bending/core/result";
import { MM_PER_INCH } from "@/bending/core/units";
import type { CsvColumn } from "@/lib/csv/csvColumn";
import { dateColumn } from "@/lib/csv/dateColumn";
import { numberColumn } from "@/lib/csv/numberColumn";
import { optionalColumn } from "@/lib/csv/optionalColumn";
import { textColumn } from "@/lib/csv/textColumn";
import { trialAngle, trialLimits, type TrialLengthField } from "./bendTableLimits";

const length = (header: string, field: TrialLengthField, example: string) => {
  const limits: { readonly above?: number; readonly least?: number; readonly most: number } = trialLimits[field];
  return numberColumn(header, {
    units: { mm: 1, in: MM_PER_INCH }, upTo: limits.most, example,
    ...(limits.above === undefined ? {} : { over: limits.above }),
    ...(limits.least === undefined ? {} : { from: limits.least }),
  });
};

/** As trials are filed: a thickness that was written in inches is no other one in its last digits. */
const toHundredth = (column: CsvColumn<number>): CsvColumn<number> => ({
  ...column,
  read: (cell, how) => {
    const found = column.read(cell, how);
    return found.ok ? ok(Math.round(found.value * 100 + 1e-7) / 100) : found;
  },
});

/** The columns of a file of trials; lengths in millimetres, the angle in degrees turned through, instruments by their names. */
export const bendTrialCsv = {
  number: optionalColumn(textColumn("trial", 30, { expects: "the number of a trial that is there", example: "" })),
  material: textColumn("material", 60, { expects: "the material's short name", example: "S235" }),
  batch: optionalColumn(textColumn("batch", 60, { example: "C-4471" })),
  nominal: optionalColumn(toHundredth(length("nominal thickness", "nominal", "2"))),
  thickness: length("thickness", "thickness", "1.98"),
  vOpening: length("v opening", "vOpening", "16"),
  punchRadius: length("punch radius", "punchRadius", "0.8"),
  angle: numberColumn("angle", { units: { "°": 1, deg: 1 }, over: trialAngle.above, expects: "a number over 0 and under 180: degrees turned through, 0 is flat", example: "90" }),
  blank: length("blank", "blank", "100"),
  flangeA: length("flange 1", "flangeA", "51.7"),
  flangeB: length("flange 2", "flangeB", "51.7"),
  insideRadius: optionalColumn(length("inside radius", "insideRadius", "2.5")),
  lengthInstrument: textColumn("length instrument", 80, { expects: "the name of an instrument", example: "Calliper 0.01" }),
  thicknessInstrument: optionalColumn(textColumn("thickness instrument", 80, { expects: "the name of an instrument", example: "Micrometer 0.01" })),
  angleInstrument: textColumn("angle instrument", 80, { expects: "the name of a protractor", example: "Protractor 5 minutes" }),
  radiusInstrument: optionalColumn(textColumn("radius instrument", 80, { expects: "the name of an instrument", example: "Radius gauges" })),
  measuredOn: dateColumn("measured on"),
  measuredBy: textColumn("measured by", 120, { example: "Greta Sommer" }),
  note: optionalColumn(textColumn("note", 500)),
};
