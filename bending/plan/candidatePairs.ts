import type { LengthUnit, Mm } from "../core/units";
import { FORCE_V_RANGE } from "../handbook/airBendForce";
import { formatLength } from "../core/formatLength";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";
import type { PlanReason } from "./planDocument";
import type { ToolPair } from "./toolPair";

export interface CandidatePairs {
  readonly pairs: readonly ToolPair[];
  /** Why tools that might be looked for are not among them. */
  readonly reasons: readonly PlanReason[];
}

/** mm. Least opening above the sheet to put it in by hand. Common practice, no source. */
const LEAST_OPENING_MM = 10;

/**
 * Punches and dies with pieces in service that this machine takes, the likeliest first: the V nearest to the
 * one wanted, then the punch that bears more (the straighter one), then as the tools were listed.
 */
export function candidatePairs(tools: readonly Tool[], machine: Machine, thickness: Mm, wantedV: number, units: LengthUnit): CandidatePairs {
  const reasons: PlanReason[] = [];
  const say = (kind: PlanReason["kind"], ids: readonly string[], message: string) => reasons.push({ kind, bends: [], faces: [], tools: ids, message });
  const [least, most] = [FORCE_V_RANGE[0] * thickness, FORCE_V_RANGE[1] * thickness];
  const punches = tools.filter((tool): tool is Punch => tool.kind === "punch");
  const dies = tools.filter((tool): tool is Die => tool.kind === "die");
  const length = (value: number) => formatLength(value, units);
  const fittingPunches = punches.filter((punch) => punch.tang === machine.punchTang && punch.pieces.length > 0);
  const seatedDies = dies.filter((die) => die.tang === machine.dieTang && die.pieces.length > 0);
  const fittingDies = seatedDies.filter((die) => die.vOpening >= least - 1e-9 && die.vOpening <= most + 1e-9);
  if (fittingPunches.length === 0) say("no-punch", punches.map(({ id }) => id), `no punch with pieces in service fits ${machine.name}: its ram takes the tang "${machine.punchTang}"`);
  if (seatedDies.length === 0) say("no-die", dies.map(({ id }) => id), `no die with pieces in service fits ${machine.name}: its bed takes the tang "${machine.dieTang}"`);
  else if (fittingDies.length === 0) say("no-die", seatedDies.map(({ id }) => id), `no die has a V for ${length(thickness)} sheet: it takes ${length(least)} to ${length(most)}, best ${length(wantedV)}`);
  const all = fittingPunches.flatMap((punch) => fittingDies.map((die) => ({ punch, die })));
  const open = all.filter(({ punch, die }) => machine.daylight - punch.height - die.height - thickness >= LEAST_OPENING_MM);
  if (open.length === 0 && all.length > 0) {
    const heights = all.map(({ punch, die }) => punch.height + die.height);
    say("daylight", [], `no punch and die fit the daylight of ${machine.name}: together they are ${length(Math.min(...heights))} to ${length(Math.max(...heights))} high, ` +
      `up to ${length(machine.daylight - LEAST_OPENING_MM - thickness)} would do`);
  }
  const off = (die: Die) => Math.abs(Math.log(die.vOpening / wantedV));
  const pairs = open
    .sort((a, b) => off(a.die) - off(b.die) || b.punch.maxForcePerMetre - a.punch.maxForcePerMetre)
    .map((pair, index): ToolPair => ({ index, ...pair }));
  return { pairs, reasons };
}
