import type { FieldProblem } from "@/bending/core/problem";
import type { Result } from "@/bending/core/result";
import type { LengthUnit } from "@/bending/core/units";
import type { MaterialGroup } from "@/bending/handbook/material";
import { parseAngle } from "@/lib/format/parseAngle";
import { parseLength } from "@/lib/format/parseLength";
import { parseNumber } from "@/lib/format/parseNumber";

type Keyed = Readonly<Record<string, number>>;

/** Reads typed texts into numbers and keeps what was wrong, by path. What cannot be read counts as 0. */
export interface DraftReader {
  readonly problems: readonly FieldProblem[];
  readonly report: (path: string, message: string) => void;
  readonly length: (path: string, text: string, gaugeGroup?: MaterialGroup) => number;
  readonly angle: (path: string, text: string) => number;
  readonly number: (path: string, text: string) => number;
  /** `{}` for an empty text, else the value under the path's last name. */
  readonly optionalLength: (path: string, text: string) => Keyed;
  readonly optionalAngle: (path: string, text: string) => Keyed;
  readonly optionalNumber: (path: string, text: string) => Keyed;
}

export function createDraftReader(units: LengthUnit): DraftReader {
  const problems: FieldProblem[] = [];
  const report = (path: string, message: string) => { problems.push({ path, message }); };
  const take = (path: string, read: Result<number, string>): number => {
    if (read.ok) return read.value;
    report(path, read.error);
    return 0;
  };
  const optional = (one: (path: string, text: string) => number) => (path: string, text: string): Keyed =>
    text.trim() === "" ? {} : { [path.slice(path.lastIndexOf(".") + 1)]: one(path, text) };
  const length = (path: string, text: string, gaugeGroup?: MaterialGroup) => take(path, parseLength(text, units, { gaugeGroup }));
  const angle = (path: string, text: string) => take(path, parseAngle(text));
  const number = (path: string, text: string) => take(path, parseNumber(text));
  return {
    problems, report, length, angle, number,
    optionalLength: optional((path, text) => length(path, text)), optionalAngle: optional(angle), optionalNumber: optional(number),
  };
}
