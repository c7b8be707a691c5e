import { installDebianPackage } from "../machine/installDebianPackage.mjs";
import { PlainError } from "../plainError.mjs";
import { findBinaries } from "./findBinaries.mjs";

/** PostgreSQL's programs, installed when missing. @param {string | null} major a version that the data demands */
export async function ensureBinaries(major = null) {
  const found = findBinaries(major);
  if (found) return found;
  if (major !== null && findBinaries() !== null) {
    throw new PlainError(`The data folder was made by PostgreSQL ${major}, which is not installed any more. Install postgresql-${major}, or start afresh with \`npm start -- --reset\`.`);
  }
  await installDebianPackage("postgresql", "Foldwright");
  const installed = findBinaries(major);
  if (!installed) throw new PlainError("Debian's package postgresql is installed, but initdb and postgres are not to be found under /usr/lib/postgresql.");
  return installed;
}
