import { materialById } from "../handbook/materials";
import type { PartDocument } from "../part/partDocument";
import type { PartModel } from "../part/partModel";
import { checkOrder } from "../plan/checkOrder";
import { planPart } from "../plan/planPart";
import type { PlanDocument } from "../plan/planDocument";
import type { CheckRequest, PlanRequest } from "../plan/planRequest";
import { readOrder } from "../plan/readOrder";
import type { ShopTable } from "../shopTable/shopCell";
import { readMachineDocument } from "../tooling/readMachineDocument";
import { readToolingDocument } from "../tooling/readToolingDocument";
import { firstFailure } from "../whyNot/firstFailure";
import { robustness } from "../whyNot/robustness";
import type { WhyLimits } from "../whyNot/whyLimits";
import { whyNot } from "../whyNot/whyNot";
import { wrongInput, type CommandOutcome, type CommandWorld } from "./outcome";
import { problemLine, readJsonFile } from "./readJsonFile";
import type { Arguments } from "./readArguments";
import { readNumber } from "./readNumber";

const DEFAULT_BATCH = 1;
const DEFAULT_SECONDS = 60;

/**
 * `plan` and `check`: the plan document; exit code 3 when there is none, 4 when the time ran out before one was found. `--why` adds
 * the least changes that would work, `--robustness` how firm a plan is; each may take the time limit once more.
 */
export function planCommand({ verb, options }: Arguments, document: PartDocument, { part, shopTable }: { readonly part: PartModel; readonly shopTable: ShopTable | undefined }, world: CommandWorld): CommandOutcome {
  const tooling = options.get("--tooling");
  const machineFile = options.get("--machine");
  if (tooling === undefined) return wrongInput("--tooling: name the tooling document");
  if (machineFile === undefined) return wrongInput("--machine: name the machine document");
  const tools = readJsonFile(world, tooling, readToolingDocument);
  if (!tools.ok) return wrongInput(tools.error);
  const machine = readJsonFile(world, machineFile, readMachineDocument);
  if (!machine.ok) return wrongInput(machine.error);
  const batch = readNumber(options, "--batch", DEFAULT_BATCH, { least: 1, most: 1_000_000, whole: true });
  if (!batch.ok) return wrongInput(batch.error);
  const alternatives = readNumber(options, "--alternatives", 0, { least: 0, most: 20, whole: true });
  if (!alternatives.ok) return wrongInput(alternatives.error);
  const limit = readNumber(options, "--time-limit", DEFAULT_SECONDS, { least: 0, most: 86_400, whole: false });
  if (!limit.ok) return wrongInput(limit.error);
  const within = () => {
    const end = world.now() + limit.value * 1000;
    return { shouldStop: () => world.now() > end };
  };
  const request: PlanRequest = {
    document, materials: materialById, ...(shopTable ? { shopTable } : {}), tools: tools.value, machine: machine.value, batch: batch.value, alternatives: alternatives.value,
    now: world.now, ...within(),
  };
  if (verb === "plan") {
    const plan = planPart(request);
    if (options.has("--robustness") && plan.steps.length > 0) return outcomeOf({ ...plan, robustness: robustness(request, plan, within()) });
    return outcomeOf(options.has("--why") ? withChanges(request, plan, within()) : plan);
  }
  const text = options.get("--order");
  if (text === undefined) return wrongInput("--order: give the bends in order, e.g. b2,b1 (bends of one stroke joined with +)");
  const order = text.split(",").map((entry) => entry.trim());
  const known = readOrder(part, order);
  if (!known.ok) return wrongInput(problemLine("--order", known.error));
  const own = { ...request, order };
  const checked = checkOrder(own);
  if (options.has("--why")) return outcomeOf(withChanges(own, checked, within()));
  const failure = checked.status === "infeasible" ? firstFailure(own, within().shouldStop) : null;
  return outcomeOf(failure === null ? checked : { ...checked, firstFailure: failure });
}

/** A plan without steps, with where the order ends and the least changes that would work. */
function withChanges(request: PlanRequest | CheckRequest, plan: PlanDocument, limits: WhyLimits): PlanDocument {
  if (plan.steps.length > 0) return plan;
  const found = whyNot(request, plan, limits);
  return { ...plan, ...(found.firstFailure === null ? {} : { firstFailure: found.firstFailure }), changes: found.changes };
}

function outcomeOf(plan: PlanDocument): CommandOutcome {
  const exitCode = plan.status === "infeasible" ? 3 : plan.status === "unknown" ? 4 : 0;
  return { exitCode, json: plan, error: null };
}
