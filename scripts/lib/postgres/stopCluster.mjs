import { join } from "node:path";
import { setTimeout as wait } from "node:timers/promises";
import { isAlive } from "../machine/processMark.mjs";
import { runningServer } from "./runningServer.mjs";

/** Fast shutdown of the cluster in `folder` (SIGINT: connections are closed, nothing is lost). @param {string} folder */
export async function stopCluster(folder) {
  const running = runningServer(join(folder, "data"));
  if (!running) return;
  process.kill(Number(running.mark.split(":")[0]), "SIGINT");
  for (let waited = 0; waited < 20000 && isAlive(running.mark); waited += 25) await wait(25);
}
