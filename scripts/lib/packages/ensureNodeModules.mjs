import { readFileSync } from "node:fs";
import { join } from "node:path";
import { run } from "../machine/run.mjs";
import { PlainError } from "../plainError.mjs";
import { projectRoot } from "../projectRoot.mjs";
import { say, secondsSince } from "../say.mjs";
import { installedMatchesLock } from "./installedMatchesLock.mjs";

/** @param {string} path */
function readJson(path) {
  try {
    return JSON.parse(readFileSync(join(projectRoot, path), "utf8"));
  } catch {
    return null;
  }
}

/** Installs the npm packages of the lock file when they are missing or others. */
export async function ensureNodeModules() {
  if (installedMatchesLock(readJson("package-lock.json") ?? {}, readJson("node_modules/.package-lock.json"))) return;
  const since = Date.now();
  say("Installing the npm packages of package-lock.json (about a minute) ...");
  const script = process.env.npm_execpath;
  const [program, first] = script?.endsWith("js") ? [process.execPath, [script]] : ["npm", []];
  const { code } = await run(program, [...first, "ci", "--include=dev", "--no-audit", "--no-fund", "--loglevel=error"]);
  if (code !== 0) throw new PlainError("`npm ci` failed; what it said stands above.");
  say(`npm packages installed in ${secondsSince(since)}`);
}
