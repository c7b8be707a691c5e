import { existsSync, readdirSync } from "node:fs";
import { join } from "node:path";

const DEBIAN = "/usr/lib/postgresql";

/** @param {string} folder */
const complete = (folder) => ["initdb", "postgres", "pg_isready"].every((name) => existsSync(join(folder, name)));

/**
 * The folder of PostgreSQL's programs: Debian's newest (or the wanted major version), else what PATH offers.
 * @param {string | null} major
 * @returns {string | null}
 */
export function findBinaries(major = null) {
  const versions = existsSync(DEBIAN) ? readdirSync(DEBIAN).filter((name) => /^\d+$/.test(name)) : [];
  const folders = versions
    .sort((a, b) => Number(b) - Number(a))
    .filter((version) => major === null || version === major)
    .map((version) => join(DEBIAN, version, "bin"));
  if (major === null) folders.push(...(process.env.PATH ?? "").split(":").filter((entry) => entry.startsWith("/")));
  return folders.find(complete) ?? null;
}
