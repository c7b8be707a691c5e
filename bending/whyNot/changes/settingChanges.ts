import { formatLength } from "../../core/formatLength";
import { mm, type LengthUnit } from "../../core/units";
import type { PlanChange } from "../../plan/planChange";
import type { MachineSettings } from "../../tooling/machine";
import { leastAmount } from "../leastAmount";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";

const GAPS_MM = [10, 20, 40, 80];
const GAP_MM = 1;
/** Parts of the clearance that is set, tried in turn. */
const CLEARANCES = [0.8, 0.6, 0.4, 0.2];
const CLEARANCE_MM = 0.1;

/** Last of all, settings of the shop that are on the safe side: wider gaps between sections, and less clearance. */
export function settingChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds } = facts;
  const { settings } = attempts.request.machine;
  const wider = kinds.has("sections") || kinds.has("clearance") ? setting(facts, {
    field: "maxSectionGap", kind: "section-gap", name: "gap between sections", resolution: GAP_MM, ladder: GAPS_MM.filter((gap) => gap > settings.maxSectionGap),
    says: (value, from) => `With gaps of up to ${value} between sections (the setting is ${from}) there would be a plan; a gap leaves a mark and bends less sharply there.`,
  }) : null;
  const nearer = kinds.has("clearance") || kinds.has("self-collision") ? setting(facts, {
    field: "clearance", kind: "clearance", name: "clearance", resolution: CLEARANCE_MM, ladder: CLEARANCES.map((by) => Math.floor((settings.clearance * by) / CLEARANCE_MM + 1e-9) * CLEARANCE_MM).filter((value) => value > 0),
    says: (value, from) => `With the clearance set to ${value} in place of ${from} there would be a plan; that leaves less room for error everywhere, so try it slowly and without load first.`,
  }) : null;
  return [wider, nearer].flatMap((change) => change ?? []);
}

interface SettingQuestion {
  readonly field: keyof Pick<MachineSettings, "maxSectionGap" | "clearance">;
  readonly kind: "section-gap" | "clearance";
  readonly name: string;
  readonly resolution: number;
  readonly ladder: readonly number[];
  readonly says: (value: string, from: string) => string;
}

function setting({ attempts }: WhyFacts, { field, kind, name, resolution, ladder, says }: SettingQuestion): PlanChange | null {
  const { machine, document } = attempts.request;
  const units: LengthUnit = document.units;
  attempts.doing("Looking whether another setting would do");
  const before = attempts.plans();
  const from = machine.settings[field];
  const found = leastAmount({ attempts, from, asItIs: true, ladder, resolution, change: (value) => ({ machine: { ...machine, settings: { ...machine.settings, [field]: mm(value) } } }) });
  return found && offeredChange(attempts, before, inUnits(found, resolution, units), {
    kind, group: "setting", what: {}, amount: lengthAmount(name, found.value, units, from), with: [],
    message: says(formatLength(found.value, units), formatLength(from, units)),
  });
}
