import { chmodSync, mkdtempSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { isAlive, processMark } from "../machine/processMark.mjs";
import { createCluster } from "./createCluster.mjs";
import { HASTY, startCluster } from "./startCluster.mjs";
import { stopCluster } from "./stopCluster.mjs";

const PREFIX = "foldwright-test-";

/**
 * A cluster for one test run, in the system's temporary folder; clusters that killed runs left behind are
 * ended first.
 * @param {string} binaries
 * @returns {Promise<{ url: string, end: () => Promise<void> }>}
 */
export async function throwAwayCluster(binaries) {
  await sweep();
  const folder = mkdtempSync(join(tmpdir(), PREFIX));
  chmodSync(folder, 0o755);
  writeFileSync(join(folder, "owner"), processMark(process.pid) ?? "");
  createCluster(folder, binaries);
  const { url } = await startCluster(folder, binaries, HASTY);
  return { url, end: () => remove(folder) };
}

/** @param {string} folder */
async function remove(folder) {
  await stopCluster(folder);
  rmSync(folder, { recursive: true, force: true });
}

async function sweep() {
  for (const name of readdirSync(tmpdir()).filter((entry) => entry.startsWith(PREFIX))) {
    const folder = join(tmpdir(), name);
    try {
      const owner = readFileSync(join(folder, "owner"), "utf8");
      const mine = process.getuid?.() === 0 || statSync(folder).uid === process.getuid?.();
      if (mine && !isAlive(owner)) await remove(folder);
    } catch {
      // another run is just making or removing it
    }
  }
}
