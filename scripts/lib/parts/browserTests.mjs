import { closeSync, mkdirSync, openSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { anyFreePort } from "../freePort.mjs";
import { endProcess } from "../machine/endProcess.mjs";
import { ensureChromium } from "../machine/ensureChromium.mjs";
import { run } from "../machine/run.mjs";
import { ensureBinaries } from "../postgres/ensureBinaries.mjs";
import { prepareDatabase } from "../postgres/prepareDatabase.mjs";
import { throwAwayCluster } from "../postgres/throwAwayCluster.mjs";
import { projectRoot } from "../projectRoot.mjs";
import { countPlaywright } from "../report/countPlaywright.mjs";
import { tail } from "../report/tail.mjs";
import { wholePart } from "../report/wholePart.mjs";
import { startWeb } from "../web/startWeb.mjs";

const results = join(projectRoot, "test-results");

/**
 * The browser journeys against a production server with a database of its own, migrated and seeded just now.
 * @param {readonly string[]} filters
 * @param {(end: () => Promise<void>) => void} onEnd what an interruption must undo
 */
export async function browserTests(filters, onEnd) {
  const browser = await ensureChromium();
  rmSync(results, { recursive: true, force: true });
  mkdirSync(results, { recursive: true });
  const cluster = await throwAwayCluster(await ensureBinaries());
  /** @type {string | null} */
  let web = null;
  const end = async () => {
    await endProcess(web);
    await cluster.end();
  };
  onEnd(end);
  try {
    const url = new URL(cluster.url);
    url.pathname = "/foldwright";
    prepareDatabase(url.href, ["--create", "--seed"], { BCRYPT_ROUNDS: "4" });
    const port = await anyFreePort();
    web = await serveOn(port, url.href);
    return await runPlaywright(filters, { E2E_BASE_URL: `http://127.0.0.1:${port}`, E2E_DATABASE_URL: url.href, E2E_CHROMIUM: browser });
  } finally {
    await end();
  }
}

/** @param {number} port @param {string} databaseUrl */
async function serveOn(port, databaseUrl) {
  const log = openSync(join(results, "server.log"), "w");
  const env = { DATABASE_URL: databaseUrl, NEXTAUTH_SECRET: "only-for-the-browser-tests-of-this-run", NEXTAUTH_URL: undefined, AUTH_TRUST_HOST: "true", BCRYPT_ROUNDS: "4" };
  try {
    return (await startWeb({ mode: "start", host: "127.0.0.1", port, env, log })).mark;
  } finally {
    closeSync(log);
  }
}

/** @param {readonly string[]} filters @param {Record<string, string>} env */
async function runPlaywright(filters, env) {
  const file = join(results, "report.json");
  const result = await run(process.execPath, ["node_modules/@playwright/test/cli.js", "test", "--reporter=json", ...filters], {
    quiet: true,
    env: { ...env, PLAYWRIGHT_JSON_OUTPUT_NAME: file, PLAYWRIGHT_JSON_OUTPUT_FILE: file },
  });
  const count = readCount(file);
  if (count && !(result.code !== 0 && count.failed === 0)) return count;
  return wholePart("playwright", { code: result.code || 1, output: tail(result.output) });
}

/** @param {string} file */
function readCount(file) {
  try {
    return countPlaywright(JSON.parse(readFileSync(file, "utf8")));
  } catch {
    return null;
  }
}
