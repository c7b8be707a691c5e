import { fail, ok, type Result } from "../core/result";
import { materialById } from "../handbook/materials";
import { readPartDocument } from "../part/readPartDocument";
import { readPlanDocument } from "../plan/readPlanDocument";
import { rounded } from "../plan/rounded";
import { stationName } from "../plan/stationName";
import { waysOf, type WaysQuestion } from "../plan/waysOf";
import { wishesOf } from "../plan/wishesOf";
import type { PlanDocument } from "../plan/planDocument";
import type { Run } from "../setup/composeRuns";
import { sharedSetup } from "../setup/shared/sharedSetup";
import type { SharedWay } from "../setup/shared/sharedWish";
import { readMachineDocument } from "../tooling/readMachineDocument";
import { readToolingDocument } from "../tooling/readToolingDocument";
import { wrongInput, type CommandOutcome, type CommandWorld } from "./outcome";
import type { Arguments } from "./readArguments";
import { problemLine, readJsonFile } from "./readJsonFile";
import { readNumber } from "./readNumber";

const DEFAULT_SECONDS = 60;
/** Far more than the time allows. */
const STEPS = 1e9;

/** `setup`: one bed for all steps of several plans, in mm, with the plans' own tools or, with `--parts`, any that make the step; exit code 3 when there is none, 4 when none was found in time. */
export function setupCommand({ files, options }: Arguments, world: CommandWorld): CommandOutcome {
  const [tooling, machineFile] = [options.get("--tooling"), options.get("--machine")];
  if (tooling === undefined) return wrongInput("--tooling: name the tooling document");
  if (machineFile === undefined) return wrongInput("--machine: name the machine document");
  const plans: PlanDocument[] = [];
  for (const file of files) {
    const plan = readJsonFile(world, file, readPlanDocument);
    if (!plan.ok) return wrongInput(plan.error);
    plans.push(plan.value);
  }
  const tools = readJsonFile(world, tooling, readToolingDocument);
  if (!tools.ok) return wrongInput(tools.error);
  const machine = readJsonFile(world, machineFile, readMachineDocument);
  if (!machine.ok) return wrongInput(machine.error);
  const limit = readNumber(options, "--time-limit", DEFAULT_SECONDS, { least: 0, most: 86_400, whole: false });
  if (!limit.ok) return wrongInput(limit.error);
  const others = otherWays(options.get("--parts"), plans, { tools: tools.value, machine: machine.value }, world);
  if (!others.ok) return wrongInput(others.error);
  const wishes = wishesOf(plans, others.value);
  if (!wishes.ok) {
    const [first] = wishes.error;
    const index = Number(/^\[(\d+)\]/.exec(first?.path ?? "")?.[1] ?? 0);
    return wrongInput(`${files[index] ?? ""}: steps: ${first?.message ?? ""}`);
  }
  const end = world.now() + limit.value * 1000;
  const setup = sharedSetup(wishes.value, tools.value, machine.value, { steps: STEPS, shouldStop: () => world.now() > end });
  const run = ({ pieces, gap, length }: Run) => ({ length: rounded(length), gap: rounded(gap), pieces: pieces.map((piece) => ({ piece: piece.id, length: rounded(piece.length) })) });
  return {
    exitCode: setup.status === "infeasible" ? 3 : setup.status === "unknown" ? 4 : 0,
    error: null,
    json: {
      ...setup,
      units: "mm",
      machine: machine.value.name,
      stations: setup.stations.map(({ punch, die, punchRun, dieRun, z, wishes: served }, index) => ({
        id: stationName(index), punch, die, z: rounded(z), punchRun: run(punchRun), dieRun: run(dieRun), bends: served.map((one) => ({ bend: one.id, z: rounded(one.z) })),
      })),
    },
  };
}

/** The other tools that make each step, when the parts of the plans are named in turn. */
function otherWays(named: string | undefined, plans: readonly PlanDocument[], shop: Pick<WaysQuestion, "tools" | "machine">, world: CommandWorld): Result<readonly (readonly (readonly SharedWay[])[])[], string> {
  if (named === undefined) return ok([]);
  const files = named.split(",").map((file) => file.trim());
  if (files.length !== plans.length) return fail(`--parts: names ${files.length} parts for ${plans.length} plans; give the part of each plan in turn, with commas between`);
  const all: (readonly (readonly SharedWay[])[])[] = [];
  for (const [index, plan] of plans.entries()) {
    const file = files[index] ?? "";
    const document = readJsonFile(world, file, readPartDocument);
    if (!document.ok) return document;
    const ways = waysOf({ ...shop, plan, document: document.value, materials: materialById });
    if (!ways.ok) return fail(problemLine(file, ways.error));
    all.push(ways.value);
  }
  return ok(all);
}
