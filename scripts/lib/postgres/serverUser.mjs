import { spawnSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { PlainError } from "../plainError.mjs";

/**
 * PostgreSQL refuses to run as root: root hands the server to Debian's `postgres` user, anybody else runs it
 * himself (null).
 * @returns {{ uid: number, gid: number } | null}
 */
export function serverUser() {
  if (process.getuid?.() !== 0) return null;
  const line = readFileSync("/etc/passwd", "utf8").split("\n").find((entry) => entry.startsWith("postgres:"));
  if (!line) throw new PlainError("There is no user `postgres` on this machine, and PostgreSQL does not run as root. Install Debian's package `postgresql`.");
  const [, , uid, gid] = line.split(":");
  return { uid: Number(uid), gid: Number(gid) };
}

/** Whether the server's user can walk into a folder. @param {string} folder */
export function serverCanEnter(folder) {
  const user = serverUser();
  return spawnSync("/usr/bin/test", ["-x", folder], { ...user, cwd: "/" }).status === 0;
}
