import { spawn } from "node:child_process";
import { projectRoot } from "../projectRoot.mjs";
import { endProcess } from "./endProcess.mjs";
import { processMark } from "./processMark.mjs";

/** Programs of ours that run at this moment, for an interruption to end. @type {Set<string>} */
const running = new Set();

/**
 * Runs a program to its end. Unless it `asks` something at the terminal it leads a group of its own, so that an
 * interruption is passed on once and in order.
 * @param {string} command
 * @param {readonly string[]} parameters
 * @param {{ env?: Record<string, string | undefined>, cwd?: string, asks?: boolean, quiet?: boolean }} options
 * @returns {Promise<{ code: number, output: string }>} output is empty unless `quiet`
 */
export function run(command, parameters, { env = {}, cwd = projectRoot, asks = false, quiet = false } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, [...parameters], {
      cwd,
      env: { ...process.env, ...env },
      detached: !asks,
      stdio: [asks ? "inherit" : "ignore", quiet ? "pipe" : "inherit", quiet ? "pipe" : "inherit"],
    });
    const mark = child.pid === undefined ? null : processMark(child.pid);
    if (mark) running.add(mark);
    /** @type {Buffer[]} */
    const chunks = [];
    child.stdout?.on("data", (chunk) => chunks.push(chunk));
    child.stderr?.on("data", (chunk) => chunks.push(chunk));
    const end = (/** @type {number} */ code, extra = "") => {
      if (mark) running.delete(mark);
      resolve({ code, output: Buffer.concat(chunks).toString("utf8") + extra });
    };
    child.on("error", (error) => end(127, error.message));
    child.on("close", (code) => end(code ?? 1));
  });
}

/** Ends whatever `run` has under way. */
export async function endRunning() {
  await Promise.all([...running].map((mark) => endProcess(mark)));
}
