import { fail, ok, type Result } from "../core/result";
import { shopLimitsOf } from "../findings/shopLimitsOf";
import type { ShopLimits } from "../findings/shopLimits";
import { stockSheets } from "../findings/stockSheets";
import { readMachineDocument } from "../tooling/readMachineDocument";
import { readToolingDocument } from "../tooling/readToolingDocument";
import type { CommandWorld } from "./outcome";
import type { Arguments } from "./readArguments";
import { readJsonFile } from "./readJsonFile";

/** What the tooling and machine documents that were named can do; null when none was. */
export function readShop({ options }: Arguments, world: CommandWorld): Result<ShopLimits | null, string> {
  const [tooling, machine] = [options.get("--tooling"), options.get("--machine")];
  if (tooling === undefined && machine === undefined) return ok(null);
  const tools = tooling === undefined ? ok([]) : readJsonFile(world, tooling, readToolingDocument);
  if (!tools.ok) return fail(tools.error);
  const brake = machine === undefined ? null : readJsonFile(world, machine, readMachineDocument);
  if (brake && !brake.ok) return fail(brake.error);
  return ok(shopLimitsOf(tools.value, brake ? [brake.value] : [], stockSheets));
}
