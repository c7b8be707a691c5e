import { fail, ok, type Result } from "@/bending/core/result";
import { gaugeSystemOf } from "@/bending/handbook/gaugeSystemOf";
import { gaugeThickness, type GaugeSystem } from "@/bending/handbook/gaugeThickness";
import type { MaterialGroup } from "@/bending/handbook/material";
import { GAUGE_RANGE } from "@/bending/handbook/usStandardGauge";
import type { QuantityKind } from "./quantityKind";

const metal = String.raw`(?:\s*(steel|stainless|aluminium|aluminum))?`;
const gauge = new RegExp(String.raw`(?<![\w.,])(?:(\d+)\s*(?:gauge|gage|ga)\b\.?|(?:gauge|gage|ga)\b\.?\s*(\d+))${metal}`, "gi");
const systems: Readonly<Record<string, GaugeSystem>> = { steel: "steel", stainless: "stainless", aluminium: "aluminium", aluminum: "aluminium" };

/** Gauges as lengths: `16 ga` by the material's own table, `16 ga stainless` by the one that is named. */
export function spellGauges(text: string, kind: QuantityKind, group: MaterialGroup | undefined): Result<string, string> {
  let wrong: string | null = null;
  const spelled = text.replace(gauge, (all: string, before: string | undefined, after: string | undefined, named: string | undefined) => {
    const number = before ?? after ?? "";
    const system = named === undefined ? (group === undefined ? null : gaugeSystemOf(group)) : (systems[named.toLowerCase()] ?? null);
    if (kind !== "length") wrong ??= "has a gauge, which is a sheet thickness";
    else if (system === null) wrong ??= group === undefined || named !== undefined ? `has "${all.trim()}" without a metal: write ${number} ga steel, ${number} ga stainless or ${number} ga aluminium` : `has a gauge, and ${group} has no gauge table`;
    const thickness = system === null ? null : gaugeThickness(Number(number), system);
    if (system !== null && thickness === null) wrong ??= `has gauge ${number}; the table goes from ${GAUGE_RANGE.from} to ${GAUGE_RANGE.to}`;
    return `(${thickness ?? 0} mm)`;
  });
  return wrong === null ? ok(spelled) : fail(wrong);
}
