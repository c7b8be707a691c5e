import { readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { processMark } from "../machine/processMark.mjs";

/**
 * The server that runs on a data folder, from its lock file. A lock whose process is gone, or is by now
 * something else, is stale and is taken away.
 * @param {string} data
 * @returns {{ mark: string, port: number } | null}
 */
export function runningServer(data) {
  const lock = join(data, "postmaster.pid");
  let lines;
  try {
    lines = readFileSync(lock, "utf8").split("\n");
  } catch {
    return null;
  }
  const pid = Number(lines[0]);
  const mark = processMark(pid);
  if (mark !== null && commandOf(pid).includes("postgres")) return { mark, port: Number(lines[3]) };
  rmSync(lock, { force: true });
  return null;
}

/** @param {number} pid */
function commandOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, "utf8");
  } catch {
    return "";
  }
}
