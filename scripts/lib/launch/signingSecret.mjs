import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";

/** The secret that signs sessions: made once, kept in the data folder, so that a restart signs nobody out. @param {string} data */
export function signingSecret(data) {
  const file = join(data, "signing-secret");
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString("hex"), { mode: 0o600 });
  return readFileSync(file, "utf8").trim();
}
