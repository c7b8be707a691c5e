import { readFileSync } from "node:fs";

/**
 * Names a process so that a later one with the same number is not mistaken for it: number and start time
 * (field 22 of /proc/PID/stat, counted after the bracketed name, which may hold blanks). Null when it is gone.
 * @param {number} pid
 * @returns {string | null}
 */
export function processMark(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
    return fields[0] === "Z" ? null : `${pid}:${fields[19]}`;
  } catch {
    return null;
  }
}

/** @param {string | null | undefined} mark */
export function isAlive(mark) {
  if (!mark) return false;
  return processMark(Number(mark.split(":")[0])) === mark;
}
