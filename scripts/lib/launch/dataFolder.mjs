import { accessSync, chmodSync, constants, existsSync, mkdirSync, statSync } from "node:fs";
import { join } from "node:path";
import { PlainError } from "../plainError.mjs";
import { projectRoot } from "../projectRoot.mjs";

/** Where the private database, the secret and the notes of running launchers are kept; ignored by git. */
export function dataFolder() {
  const folder = join(projectRoot, ".data");
  try {
    if (!existsSync(folder)) {
      mkdirSync(folder);
      chmodSync(folder, 0o755);
    }
    accessSync(folder, constants.W_OK | constants.X_OK);
  } catch {
    const holder = existsSync(folder) ? `belongs to user number ${statSync(folder).uid}` : "cannot be made";
    throw new PlainError(`The data folder ${folder} ${holder}, and this user may not write there. Run npm start as the user who made it, or give the folder to this user.`);
  }
  return folder;
}
