import { spawnSync } from "node:child_process";
import { randomBytes } from "node:crypto";
import { chownSync, existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { PlainError } from "../plainError.mjs";
import { serverUser } from "./serverUser.mjs";

export const CLUSTER_USER = "foldwright";

/** The cluster's password, made when there is none yet. @param {string} folder */
export function clusterPassword(folder) {
  return readFileSync(join(folder, "password"), "utf8").trim();
}

/**
 * Makes a database cluster in `folder`/data, with its password beside it. One that is there already is left
 * alone; one that was cut off half-way is made anew.
 * @param {string} folder
 * @param {string} binaries
 * @returns {boolean} whether it was made now
 */
export function createCluster(folder, binaries) {
  const data = join(folder, "data");
  const password = join(folder, "password");
  const done = join(folder, "complete");
  if (existsSync(done) && existsSync(join(data, "PG_VERSION"))) return false;
  rmSync(data, { recursive: true, force: true });
  mkdirSync(data, { recursive: true, mode: 0o700 });
  writeFileSync(password, randomBytes(24).toString("hex"), { mode: 0o600 });
  const user = serverUser(folder);
  if (user) for (const path of [folder, data, password]) chownSync(path, user.uid, user.gid);
  const result = spawnSync(
    join(binaries, "initdb"),
    ["-D", data, "-U", CLUSTER_USER, "-A", "scram-sha-256", "--pwfile", password, "-E", "UTF8", "--locale=C.UTF-8", "--no-sync", "--no-instructions"],
    { ...user, cwd: "/", encoding: "utf8" },
  );
  if (result.status !== 0) throw new PlainError(`PostgreSQL could not make its data folder ${data}:\n${result.stderr ?? ""}${result.error?.message ?? ""}`);
  writeFileSync(done, "");
  return true;
}
