import { fail, ok, type Result } from "@/bending/core/result";
import { mmPer, MM_PER_INCH, type LengthUnit } from "@/bending/core/units";
import { gaugeSystemOf } from "@/bending/handbook/gaugeSystemOf";
import { gaugeThickness } from "@/bending/handbook/gaugeThickness";
import type { MaterialGroup } from "@/bending/handbook/material";
import { GAUGE_RANGE } from "@/bending/handbook/usStandardGauge";
import { parseNumber } from "./parseNumber";

const mmInUnit: Readonly<Record<string, number>> = {
  mm: 1, cm: 10, m: 1000, "µm": 0.001, in: MM_PER_INCH, inch: MM_PER_INCH, inches: MM_PER_INCH, '"': MM_PER_INCH, "”": MM_PER_INCH, "″": MM_PER_INCH, "''": MM_PER_INCH,
  ft: 12 * MM_PER_INCH, "'": 12 * MM_PER_INCH, thou: MM_PER_INCH / 1000, mil: MM_PER_INCH / 1000,
};
const ending = /^(.*?)\s*([a-zµ]+\.?|"|”|″|''|')$/i;
const gaugeFirst = /^(?:ga|ga\.|gauge|gage)\s*(\d+)$/i;
const gauges = new Set(["ga", "gauge", "gage"]);

export interface ParseLengthOptions {
  /** Whose gauge table `16 ga` is read from; without it gauges are refused. */
  readonly gaugeGroup?: MaterialGroup | undefined;
}

/**
 * A length as people type it, in the given unit: `12.5`, `1/8`, `3 1/2"`, `2.5 mm`, `0.1 in`, `16 ga`. A number
 * without a unit is in `unit`; with one it is converted. Zero and negative lengths pass: the field says what it takes.
 */
export function parseLength(text: string, unit: LengthUnit, options: ParseLengthOptions = {}): Result<number, string> {
  const typed = text.trim();
  if (typed === "") return fail(`Type a length in ${unit === "in" ? "inches" : "mm"}.`);
  const turned = gaugeFirst.exec(typed);
  if (turned !== null) return gauge(turned[1] ?? "", unit, options);
  const parts = ending.exec(typed);
  if (parts === null) return parseNumber(typed);
  const name = (parts[2] ?? "").toLowerCase().replace(/\.$/, "");
  if (gauges.has(name)) return gauge(parts[1] ?? "", unit, options);
  const scale = mmInUnit[name];
  if (scale === undefined) return fail(`"${parts[2] ?? ""}" is not a unit of length known here. Use mm, cm, m, in, ft, or ga for a sheet gauge.`);
  const number = parseNumber(parts[1] ?? "");
  return number.ok ? ok(cleared((number.value * scale) / mmPer(unit))) : number;
}

function gauge(number: string, unit: LengthUnit, { gaugeGroup }: ParseLengthOptions): Result<number, string> {
  if (gaugeGroup === undefined) return fail("A gauge can stand for a sheet thickness only. Type this length in mm or inches.");
  const system = gaugeSystemOf(gaugeGroup);
  if (system === null) return fail(`There is no gauge table for ${gaugeGroup}. Type the thickness in mm or inches.`);
  const thickness = gaugeThickness(Number(number), system);
  return thickness === null
    ? fail(`Gauge ${number.trim()} is not in the table. Type a whole gauge from ${GAUGE_RANGE.from} to ${GAUGE_RANGE.to}, or the thickness.`)
    : ok(cleared(thickness / mmPer(unit)));
}

/** Takes the noise of conversion off the last digits, far under anything that can be measured. */
const cleared = (value: number): number => Number(value.toPrecision(12));
