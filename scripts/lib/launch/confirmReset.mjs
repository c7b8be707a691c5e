import { createInterface } from "node:readline/promises";
import { PlainError } from "../plainError.mjs";

/**
 * Asks before the data goes.
 * @param {string} what
 * @param {boolean} yes answered already
 */
export async function confirmReset(what, yes) {
  if (yes) return;
  if (!process.stdin.isTTY) throw new PlainError(`--reset would empty ${what}. Nobody can be asked here: add --yes to do it.`);
  const terminal = createInterface({ input: process.stdin, output: process.stdout });
  const answer = await terminal.question(`This empties ${what}: parts, plans, sheets, tools and people are gone for good.\nType "empty" to go on: `);
  terminal.close();
  if (answer.trim().toLowerCase() !== "empty") throw new PlainError("Nothing was changed.");
}
