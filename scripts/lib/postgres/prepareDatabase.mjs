import { spawnSync } from "node:child_process";
import { PlainError } from "../plainError.mjs";
import { projectRoot } from "../projectRoot.mjs";

/**
 * Runs scripts/prepareDatabase.ts (migrations, demonstration) against a database.
 * @param {string} url
 * @param {readonly ("--create" | "--empty" | "--seed")[]} flags
 * @param {Record<string, string>} environment
 * @returns {{ applied: number, seeded: boolean, signIns: string[] }}
 */
export function prepareDatabase(url, flags = [], environment = {}) {
  const result = spawnSync(process.execPath, ["--import", "tsx", "scripts/prepareDatabase.ts", ...flags], {
    cwd: projectRoot,
    env: { ...process.env, ...environment, DATABASE_URL: url },
    encoding: "utf8",
  });
  if (result.status !== 0) throw new PlainError(`The database could not be brought up to date:\n${(result.stderr || result.error?.message || "").trim()}`);
  return JSON.parse(result.stdout.trim().split("\n").at(-1) ?? "{}");
}
