import { createHash } from "node:crypto";
import { chmodSync, existsSync, mkdirSync, statSync } from "node:fs";
import { join } from "node:path";
import { PlainError } from "../plainError.mjs";
import { projectRoot } from "../projectRoot.mjs";
import { serverCanEnter, serverUser } from "./serverUser.mjs";

/**
 * The folder of the private cluster: in the data folder; outside the tree when the server's user cannot walk
 * into that (a tree under root's home).
 * @param {string} data
 */
export function clusterPlace(data) {
  const inTree = join(data, "postgres");
  const outside = join("/var/tmp", `foldwright-${createHash("sha256").update(projectRoot).digest("hex").slice(0, 12)}`);
  const made = [inTree, outside].find((folder) => existsSync(join(folder, "complete")));
  const place = made ?? (serverCanEnter(data, serverUser(inTree)) ? inTree : outside);
  if (!existsSync(place)) {
    mkdirSync(place);
    chmodSync(place, 0o755);
  }
  const trusted = place === outside ? [process.getuid?.(), serverUser("")?.uid] : [];
  refuseForeign(place, trusted);
  return place;
}

/**
 * A cluster of another user can neither be read nor, in a folder that all may write to, be trusted.
 * @param {string} place
 * @param {readonly (number | undefined)[]} trusted empty: root takes any owner
 */
function refuseForeign(place, trusted) {
  const self = process.getuid?.() ?? 0;
  const owner = statSync(place).uid;
  const fits = self === 0 ? trusted.length === 0 || trusted.includes(owner) : owner === self;
  if (!fits) {
    throw new PlainError(`The database in ${place} was made by user number ${owner}: run npm start as that user, or as root.`);
  }
}
