import { run } from "../machine/run.mjs";
import { runWholePart, wholePart } from "../report/wholePart.mjs";

/** Next's own route types first (a fresh clone has none), then the compiler over everything. */
export async function typeCheck() {
  const types = await run(process.execPath, ["node_modules/next/dist/bin/next", "typegen"], { quiet: true, env: { NEXT_TELEMETRY_DISABLED: "1" } });
  if (types.code !== 0) return wholePart("next typegen", types);
  return runWholePart("tsc", "typescript/bin/tsc", ["--noEmit", "--pretty", "false"]);
}
