import { spawnSync } from "node:child_process";
import { existsSync, readFileSync, statSync } from "node:fs";
import { join } from "node:path";
import { PlainError } from "../plainError.mjs";

/** @typedef {{ uid: number, gid: number } | null} ServerUser */

/**
 * PostgreSQL refuses to run as root: root hands the server to the owner of the cluster in `folder`, or for a new
 * one to Debian's `postgres` user; anybody else runs it himself (null).
 * @param {string} folder
 * @returns {ServerUser}
 */
export function serverUser(folder) {
  if (process.getuid?.() !== 0) return null;
  const data = join(folder, "data");
  const owner = existsSync(data) ? statSync(data) : null;
  if (owner && owner.uid !== 0) return { uid: owner.uid, gid: owner.gid };
  const line = readFileSync("/etc/passwd", "utf8").split("\n").find((entry) => entry.startsWith("postgres:"));
  if (!line) throw new PlainError("There is no user `postgres` on this machine, and PostgreSQL does not run as root. Install Debian's package `postgresql`.");
  const [, , uid, gid] = line.split(":");
  return { uid: Number(uid), gid: Number(gid) };
}

/** Whether the server's user can walk into a folder. @param {string} folder @param {ServerUser} user */
export function serverCanEnter(folder, user) {
  return spawnSync("/usr/bin/test", ["-x", folder], { ...user, cwd: "/" }).status === 0;
}
