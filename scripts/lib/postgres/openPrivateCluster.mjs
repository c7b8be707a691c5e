import { existsSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { say, secondsSince } from "../say.mjs";
import { clusterPlace } from "./clusterPlace.mjs";
import { createCluster } from "./createCluster.mjs";
import { ensureBinaries } from "./ensureBinaries.mjs";
import { startCluster } from "./startCluster.mjs";
import { stopCluster } from "./stopCluster.mjs";

/**
 * The private cluster, made when there is none, emptied when asked, started when it does not run.
 * @param {string} data the data folder
 * @param {{ empty: boolean }} options
 * @returns {Promise<{ place: string, url: string }>} `url` names the database `foldwright`, which may have to be made
 */
export async function openPrivateCluster(data, { empty }) {
  await ensureBinaries();
  const place = clusterPlace(data);
  if (empty) await emptyCluster(place);
  const binaries = await ensureBinaries(majorOf(place));
  const since = Date.now();
  const made = createCluster(place, binaries);
  const server = await startCluster(place, binaries);
  say(`Private PostgreSQL ${made ? "made" : server.found ? "found running" : "started"} on 127.0.0.1:${server.port} (${secondsSince(since)}), data in ${place}`);
  const url = new URL(server.url);
  url.pathname = "/foldwright";
  return { place, url: url.href };
}

/** @param {string} place */
async function emptyCluster(place) {
  await stopCluster(place);
  for (const name of ["complete", "data", "password", "server.log"]) rmSync(join(place, name), { recursive: true, force: true });
}

/** @param {string} place */
function majorOf(place) {
  const file = join(place, "data", "PG_VERSION");
  return existsSync(join(place, "complete")) && existsSync(file) ? readFileSync(file, "utf8").trim() : null;
}
