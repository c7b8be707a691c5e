import { mmPer, type LengthUnit } from "@/bending/core/units";
import type { Tool } from "@/bending/tooling/tool";
import type { DieEntry } from "@/bending/tooling/toolingDocument";
import { toolToDocument } from "@/bending/tooling/toolToDocument";

/** A tool as an entry of a tooling document in the units asked for with no pieces. */
export function toolValuesIn(tool: Tool, units: LengthUnit): Readonly<Record<string, unknown>> {
  const entry = toolToDocument({ ...tool, pieces: [] });
  const scaled = (length: number): number => length / mmPer(units);
  const common = { ...entry, height: scaled(entry.height), profile: entry.profile.map(([x, y]) => [scaled(x), scaled(y)]) };
  return entry.kind === "punch"
    ? { ...common, tipRadius: scaled(entry.tipRadius) }
    : { ...common, vOpening: scaled(entry.vOpening), shoulderRadius: scaled(entry.shoulderRadius), ...(entry.flattening ? { flattening: slotIn(entry.flattening, scaled) } : {}) };
}

const slotIn = ({ floor, back, opening }: NonNullable<DieEntry["flattening"]>, scaled: (length: number) => number) =>
  ({ floor: scaled(floor), back: scaled(back), opening: scaled(opening) });
