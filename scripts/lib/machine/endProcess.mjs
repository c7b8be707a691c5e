import { setTimeout as wait } from "node:timers/promises";
import { isAlive } from "./processMark.mjs";

/** @param {number} pid @param {NodeJS.Signals} signal */
function signalGroup(pid, signal) {
  for (const target of [-pid, pid]) {
    try {
      process.kill(target, signal);
      return;
    } catch {
      // not the leader of a group, or gone already
    }
  }
}

/**
 * Ends a process (and its group when it leads one): politely, then for good.
 * @param {string | null | undefined} mark from processMark
 */
export async function endProcess(mark, patienceMs = 5000) {
  if (!mark || !isAlive(mark)) return;
  const pid = Number(mark.split(":")[0]);
  signalGroup(pid, "SIGTERM");
  for (let waited = 0; waited < patienceMs && isAlive(mark); waited += 50) await wait(50);
  if (isAlive(mark)) signalGroup(pid, "SIGKILL");
}
