import { ok } from "../core/result";
import { builtInMaterials, materialById } from "../handbook/materials";
import { buildPart } from "../part/buildPart";
import { readPartDocument } from "../part/readPartDocument";
import { drawCommand } from "./drawCommand";
import { flatCommand } from "./flatCommand";
import { importCommand } from "./importCommand";
import { importStepCommand } from "./importStepCommand";
import { isSolidFile } from "./isSolidFile";
import { wrongInput, type CommandOutcome, type CommandWorld } from "./outcome";
import { planCommand } from "./planCommand";
import { readArguments } from "./readArguments";
import { readBendTable } from "./readBendTable";
import { problemLine, readJsonFile } from "./readJsonFile";
import { setupCommand } from "./setupCommand";

const FLAT = ["--bend-table"];
const PLANNING = [...FLAT, "--tooling", "--machine", "--batch", "--alternatives", "--time-limit", "--why"];
const VERBS = {
  flat: [...FLAT, "--tooling", "--machine"],
  plan: [...PLANNING, "--robustness"],
  check: [...PLANNING, "--order"],
  setup: ["--parts", "--tooling", "--machine", "--time-limit"],
  draw: [...FLAT, "--out", "--ticks", "--text"],
  import: ["--thickness", "--material", "--radius", "--units", "--bend-layers", "--single-lines", "--gap", "--body", "--name", "--out"],
} as const;

/** The command line as a function of its arguments and files: flat, plan, check, setup, draw, import. */
export function runCommand(args: readonly string[], world: CommandWorld): CommandOutcome {
  const given = readArguments(args, VERBS, ["setup"]);
  if (!given.ok) return wrongInput(given.error);
  if (given.value.verb === "setup") return setupCommand(given.value, world);
  if (given.value.verb === "import") return isSolidFile(given.value.file) ? importStepCommand(given.value, world) : importCommand(given.value, world);
  const document = readJsonFile(world, given.value.file, readPartDocument);
  if (!document.ok) return wrongInput(document.error);
  const tableFile = given.value.options.get("--bend-table");
  const table = tableFile === undefined ? ok(undefined) : readJsonFile(world, tableFile, (json) => readBendTable(json, materialById));
  if (!table.ok) return wrongInput(table.error);
  const built = buildPart(document.value, { materials: materialById, knownMaterials: builtInMaterials.map(({ id }) => id), shopTable: table.value });
  if (!built.ok) return wrongInput(problemLine(given.value.file, built.error));
  if (given.value.verb === "draw") return drawCommand(given.value, document.value, built.value);
  return given.value.verb === "flat" ? flatCommand(given.value, document.value, built.value, world) : planCommand(given.value, document.value, { part: built.value, shopTable: table.value }, world);
}
