import { spawn } from "node:child_process";
import { createConnection } from "node:net";
import { setTimeout as wait } from "node:timers/promises";
import { isAlive, processMark } from "../machine/processMark.mjs";
import { PlainError } from "../plainError.mjs";
import { projectRoot } from "../projectRoot.mjs";

/** @param {number} port @param {string} host @returns {Promise<boolean>} */
const answers = (port, host) =>
  new Promise((resolve) => {
    const socket = createConnection({ port, host });
    socket.once("connect", () => {
      socket.destroy();
      resolve(true);
    });
    socket.once("error", () => resolve(false));
  });

/**
 * Starts the web server and waits until it listens.
 * @param {{ mode: "start" | "dev", host: string, port: number, env: Record<string, string | undefined>, log?: number }} options `log`: a file for its output
 * @returns {Promise<{ mark: string, ended: Promise<number> }>}
 */
export async function startWeb({ mode, host, port, env, log }) {
  const output = log ?? "inherit";
  const child = spawn(process.execPath, ["node_modules/next/dist/bin/next", mode, "-p", String(port), "-H", host], {
    cwd: projectRoot,
    env: { ...process.env, NODE_ENV: mode === "dev" ? "development" : "production", NEXT_TELEMETRY_DISABLED: "1", ...env },
    detached: true,
    stdio: ["ignore", output, output],
  });
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => {
    child.once("error", () => resolve(127));
    child.once("exit", (code) => resolve(code ?? 1));
  });
  const mark = child.pid === undefined ? null : processMark(child.pid);
  if (mark === null) throw new PlainError("The web server did not start.");
  const probe = host === "0.0.0.0" || host === "::" ? "127.0.0.1" : host;
  for (let waited = 0; waited < 60_000; waited += 50) {
    if (!isAlive(mark)) throw new PlainError("The web server stopped while starting; what it said stands above.");
    if (await answers(port, probe)) return { mark, ended };
    await wait(50);
  }
  throw new PlainError("The web server did not answer within a minute.");
}
