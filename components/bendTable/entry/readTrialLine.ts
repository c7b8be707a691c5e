import { fail, ok, type Result } from "@/bending/core/result";
import { mmPer, type LengthUnit } from "@/bending/core/units";
import type { MaterialFacts } from "@/bending/handbook/material";
import { formatLength } from "@/lib/format/formatLength";
import { parseAngle } from "@/lib/format/parseAngle";
import { parseLength } from "@/lib/format/parseLength";
import { trialAngle, trialLimits, type TrialLengthField } from "@/lib/schemas/bendTableLimits";
import type { TrialFigures } from "@/lib/schemas/bendTrialOf";
import { fieldWords } from "./fieldWords";
import type { AngleKind, LineField, TrialLine } from "./trialDraft";

/** A line read, in the units that are typed. */
export interface ReadLine extends TrialFigures {
  readonly note: string;
}

/** What is wrong, by field, in the units that are typed. */
export type LineProblems = Readonly<Partial<Record<LineField, string>>>;

interface ReadContext {
  readonly units: LengthUnit;
  readonly angles: AngleKind;
  readonly materials: readonly MaterialFacts[];
}

/** Reads one line as typed; every field that must change is named. */
export function readTrialLine(line: TrialLine, { units, angles, materials }: ReadContext): Result<ReadLine, LineProblems> {
  const problems: Partial<Record<LineField, string>> = {};
  const material = materials.find(({ id }) => id.toLowerCase() === line.material.trim().toLowerCase());
  if (material === undefined) problems.material = line.material.trim() === "" ? "Material: type its short name." : `Material: "${line.material.trim()}" is none of this shop's. Choose one from the list.`;
  for (const [field, most] of [["batch", 60], ["note", 500]] as const) {
    if (line[field].trim().length > most) problems[field] = `${fieldWords[field]} must be at most ${most} characters.`;
  }
  const length = (field: TrialLengthField): number => {
    const read = parseLength(line[field], units, field === "thickness" || field === "nominal" ? { gaugeGroup: material?.group } : {});
    const wrong = read.ok ? outside(field, read.value * mmPer(units), units) : `${fieldWords[field]}: ${read.error}`;
    if (wrong !== undefined) problems[field] = wrong;
    return read.ok ? read.value : Number.NaN;
  };
  const angle = angleOf(line.angle, angles);
  if (!angle.ok) problems.angle = angle.error;
  const value: ReadLine = {
    id: line.id,
    material: material?.id ?? "",
    batch: line.batch.trim(),
    nominal: line.nominal.trim() === "" ? null : length("nominal"),
    thickness: length("thickness"),
    vOpening: length("vOpening"),
    punchRadius: length("punchRadius"),
    angle: angle.ok ? angle.value : Number.NaN,
    blank: length("blank"),
    flangeA: length("flangeA"),
    flangeB: length("flangeB"),
    insideRadius: line.insideRadius.trim() === "" ? null : length("insideRadius"),
    note: line.note.trim(),
  };
  return Object.keys(problems).length === 0 ? ok(value) : fail(problems);
}

function outside(field: TrialLengthField, millimetres: number, units: LengthUnit): string | undefined {
  const limits: { readonly above?: number; readonly least?: number; readonly most: number } = trialLimits[field];
  if (limits.above !== undefined && millimetres <= limits.above) return `${fieldWords[field]} must be more than ${formatLength(limits.above, units)}.`;
  if (limits.least !== undefined && millimetres < limits.least) return `${fieldWords[field]} must be ${formatLength(limits.least, units)} or more.`;
  return millimetres > limits.most ? `${fieldWords[field]} must be at most ${formatLength(limits.most, units)}.` : undefined;
}

function angleOf(text: string, kind: AngleKind): Result<number, string> {
  const read = parseAngle(text);
  if (!read.ok) return fail(`Angle: ${read.error}`);
  const turned = kind === "turned" ? read.value : 180 - read.value;
  return turned > trialAngle.above && turned < trialAngle.below ? ok(turned) : fail("Angle must be more than 0° and less than 180°.");
}
