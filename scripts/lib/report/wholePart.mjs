import { run } from "../machine/run.mjs";
import { tail } from "./tail.mjs";

/** @typedef {import("./countVitest.mjs").Count} Count */

/** A part that passes or fails as a whole. @param {string} name @param {{ code: number, output: string }} result @returns {Count} */
export const wholePart = (name, { code, output }) =>
  code === 0
    ? { passed: 1, failed: 0, skipped: 0, failures: [] }
    : { passed: 0, failed: 1, skipped: 0, failures: [{ name, message: tail(output) || `ended with code ${code}` }] };

/** Runs one of node_modules' programs as a part. @param {string} name @param {string} script @param {readonly string[]} parameters @returns {Promise<Count>} */
export const runWholePart = async (name, script, parameters) =>
  wholePart(name, await run(process.execPath, [`node_modules/${script}`, ...parameters], { quiet: true, env: { NEXT_TELEMETRY_DISABLED: "1" } }));
