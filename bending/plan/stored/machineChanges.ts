import { formatLength } from "../../core/formatLength";
import { mm, toDeg, type LengthUnit } from "../../core/units";
import type { Machine } from "../../tooling/machine";
import type { StoredChange } from "../storedPlan";

/** What of a machine is set otherwise than when the plan was made; times count too, as the best order follows from them. */
export function machineChanges(before: Machine, now: Machine, units: LengthUnit): readonly StoredChange[] {
  const length = (value: number): string => formatLength(mm(value), units);
  const seconds = (value: number): string => `${value} s`;
  const range = ([from, to]: readonly [number, number]): string => `${length(from)} to ${length(to)}`;
  const changes: StoredChange[] = [];
  const look = <T>(what: string, of: (machine: Machine) => T, say: (value: T) => string): void => {
    const [was, is] = [say(of(before)), say(of(now))];
    if (was !== is) changes.push({ what, before: was, now: is });
  };
  look("clearance margin", (machine) => machine.settings.clearance, length);
  look("largest gap between sections", (machine) => machine.settings.maxSectionGap, length);
  look("largest uncovered end", (machine) => machine.settings.maxUncoveredEnd, length);
  look("angle repeatability", (machine) => machine.settings.angleRepeat, (value) => `${Number(toDeg(value).toFixed(3))}°`);
  look("gauge repeatability", (machine) => machine.settings.gaugeRepeat, length);
  look("bed length", (machine) => machine.bedLength, length);
  look("distance between the frames", (machine) => machine.betweenFrames, length);
  look("throat depth", (machine) => machine.throatDepth, length);
  look("daylight", (machine) => machine.daylight, length);
  look("ram stroke", (machine) => machine.stroke, length);
  look("force", (machine) => machine.maxForce, (value) => `${value} kN`);
  look("force off the middle of the bed", (machine) => machine.settings.offCentre, (points) => points?.map(([distance, share]) => `${Number((share * 100).toFixed(1))} % at ${length(distance)}`).join(", ") ?? "the same all along");
  look("punch tang", (machine) => machine.punchTang, String);
  look("die tang", (machine) => machine.dieTang, String);
  look("gauge fingers", (machine) => machine.gauge.fingers, String);
  look("fingers of their own depth", (machine) => machine.gauge.independent, (value) => (value ? "yes" : "no"));
  look("gauge travel X", (machine) => machine.gauge.x, range);
  look("gauge travel R", (machine) => machine.gauge.r, range);
  look("gauge travel along the bed", (machine) => machine.gauge.z, range);
  look("least distance of the fingers", (machine) => machine.gauge.minSpread, length);
  look("finger width", (machine) => machine.gauge.fingerWidth, length);
  shape("ram", (machine) => machine.ramProfile);
  shape("bed", (machine) => machine.bedProfile);
  shape("finger", (machine) => machine.gauge.fingerProfile);
  look("seconds for a flip", (machine) => machine.times.flip, seconds);
  look("seconds for a turn", (machine) => machine.times.turn, seconds);
  look("seconds for a metre of walking", (machine) => machine.times.walkPerMetre, seconds);
  look("seconds for a stroke", (machine) => machine.times.stroke, seconds);
  look("seconds for a move of the gauge", (machine) => machine.times.gaugeMove, seconds);
  look("seconds to set up a station", (machine) => machine.times.stationSetup, seconds);
  look("seconds to place a section", (machine) => machine.times.sectionPlace, seconds);
  return changes;

  function shape(what: string, of: (machine: Machine) => unknown): void {
    if (JSON.stringify(of(before)) !== JSON.stringify(of(now))) changes.push({ what: `shape of the ${what}`, before: "as planned", now: "drawn otherwise" });
  }
}
