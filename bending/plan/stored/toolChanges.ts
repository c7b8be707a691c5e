import { formatLength } from "../../core/formatLength";
import { toDeg, type LengthUnit, type Rad } from "../../core/units";
import type { Tool } from "../../tooling/tool";
import type { StoredChange } from "../storedPlan";

/** What of the plan's tools is entered otherwise now. Pieces are looked at by themselves. */
export function toolChanges(before: readonly Tool[], now: readonly Tool[], units: LengthUnit): readonly StoredChange[] {
  return before.flatMap((was): readonly StoredChange[] => {
    const is = now.find((tool) => tool.id === was.id);
    if (is === undefined) return [];
    if (is.kind !== was.kind) return [{ what: `kind of ${was.id}`, before: was.kind, now: is.kind }];
    const facts = [...factsOf(was, units)].flatMap(([what, value]): readonly StoredChange[] => {
      const other = factsOf(is, units).get(what) ?? "";
      return value === other ? [] : [{ what: `${what} of ${was.id}`, before: value, now: other }];
    });
    const drawn = JSON.stringify(was.profile) === JSON.stringify(is.profile) ? [] : [{ what: `profile of ${was.id}`, before: "as planned", now: "drawn otherwise" }];
    return [...facts, ...drawn];
  });
}

function factsOf(tool: Tool, units: LengthUnit): ReadonlyMap<string, string> {
  const common: readonly (readonly [string, string])[] = [
    ["height", formatLength(tool.height, units)], ["force rating", `${tool.maxForcePerMetre} kN/m`], ["tang", tool.tang],
  ];
  switch (tool.kind) {
    case "punch": return new Map([...common, ["tip angle", degrees(tool.tipAngle)], ["tip radius", formatLength(tool.tipRadius, units)]]);
    case "die": return new Map([...common, ["V", formatLength(tool.vOpening, units)], ["V angle", degrees(tool.vAngle)], ["shoulder radius", formatLength(tool.shoulderRadius, units)]]);
    default: return tool satisfies never;
  }
}

const degrees = (angle: Rad): string => `${Number(toDeg(angle).toFixed(2))}°`;
