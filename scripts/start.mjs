import { clearDeadLaunchers, otherLaunchers, removeNote, writeNote } from "./lib/launch/launcherNotes.mjs";
import { confirmReset } from "./lib/launch/confirmReset.mjs";
import { dataFolder } from "./lib/launch/dataFolder.mjs";
import { ensureBuild } from "./lib/build/ensureBuild.mjs";
import { ensureNodeModules } from "./lib/packages/ensureNodeModules.mjs";
import { HELP, readArguments } from "./lib/launch/readArguments.mjs";
import { endProcess } from "./lib/machine/endProcess.mjs";
import { endRunning } from "./lib/machine/run.mjs";
import { openPrivateCluster } from "./lib/postgres/openPrivateCluster.mjs";
import { PlainError } from "./lib/plainError.mjs";
import { prepareDatabase } from "./lib/postgres/prepareDatabase.mjs";
import { requireNode } from "./lib/machine/requireNode.mjs";
import { say, secondsSince } from "./lib/say.mjs";
import { serve } from "./lib/launch/serve.mjs";
import { signingSecret } from "./lib/launch/signingSecret.mjs";
import { stopCluster } from "./lib/postgres/stopCluster.mjs";

const began = Date.now();
/** @type {{ data: string | null, place: string | null, web: string | null, ending: Promise<void> | null }} */
const state = { data: null, place: null, web: null, ending: null };

/** Ends everything that this launcher started; the database only when no other launcher uses it. */
function endAll() {
  state.ending ??= (async () => {
    await endRunning();
    await endProcess(state.web);
    if (!state.data) return;
    removeNote(state.data);
    if (state.place && otherLaunchers(state.data).length === 0) await stopCluster(state.place);
  })();
  return state.ending;
}

for (const signal of /** @type {const} */ (["SIGINT", "SIGTERM", "SIGHUP"])) {
  process.on(signal, async () => {
    if (!state.ending) say("\nStopping ...");
    await endAll();
    say("Stopped.");
    process.exit(0);
  });
}

/** @param {ReturnType<typeof readArguments>} wishes @param {string} data */
async function openDatabase(wishes, data) {
  if (wishes.reset && otherLaunchers(data).length > 0) throw new PlainError("Another `npm start` runs on this data. Stop it before --reset.");
  if (wishes.databaseUrl) {
    const { host, pathname } = new URL(wishes.databaseUrl);
    if (wishes.reset) await confirmReset(`the database ${pathname.slice(1)} on ${host}`, wishes.yes);
    await ensureNodeModules();
    say(`Using the PostgreSQL of DATABASE_URL (${host}${pathname})`);
    return wishes.databaseUrl;
  }
  if (wishes.reset) await confirmReset(`the database in ${data}`, wishes.yes);
  const { place, url } = await openPrivateCluster(data, { empty: wishes.reset });
  state.place = place;
  await ensureNodeModules();
  return url;
}

/** @param {ReturnType<typeof readArguments>} wishes @param {string} databaseUrl */
function bringUpToDate(wishes, databaseUrl) {
  const since = Date.now();
  const flags = wishes.databaseUrl ? (wishes.reset ? ["--empty", "--seed"] : ["--seed"]) : ["--create", "--seed"];
  const done = prepareDatabase(databaseUrl, flags);
  const what = [done.applied > 0 ? `${done.applied} migrations applied` : "schema up to date", done.seeded ? "demonstration shop put in" : "data kept"];
  say(`Database ready: ${what.join(", ")} (${secondsSince(since)})`);
  return done;
}

async function buildWhenStale() {
  const since = Date.now();
  const { code, built } = await ensureBuild({ onBuild: () => say("Building (about a minute; only when sources have changed) ...") });
  if (code !== 0) throw new PlainError("The build failed; what it said stands above.");
  if (built) say(`Built in ${secondsSince(since)}`);
}

/** @param {Record<string, string | undefined>} given @param {string} databaseUrl @param {string} data @returns {Record<string, string>} */
function webEnvironment(given, databaseUrl, data) {
  return {
    DATABASE_URL: databaseUrl,
    NEXTAUTH_SECRET: given.NEXTAUTH_SECRET || signingSecret(data),
    ...(given.NEXTAUTH_URL ? {} : { AUTH_TRUST_HOST: "true" }),
  };
}

async function start() {
  requireNode();
  const wishes = readArguments(process.argv.slice(2), process.env);
  if (wishes.help) return say(HELP);
  const data = dataFolder();
  const orphans = await clearDeadLaunchers(data);
  if (orphans > 0) say("Ended a web server that an earlier, killed start had left behind.");
  state.data = data;
  writeNote(data, { web: null, port: null });
  const databaseUrl = await openDatabase(wishes, data);
  const { signIns } = bringUpToDate(wishes, databaseUrl);
  if (!wishes.dev) await buildWhenStale();
  const mode = wishes.dev ? "dev" : "start";
  const web = await serve({ mode, host: wishes.host, wanted: wishes.port, env: webEnvironment(process.env, databaseUrl, data) });
  state.web = web.mark;
  writeNote(data, { web: web.mark, port: web.port });
  const shown = wishes.host === "127.0.0.1" || wishes.host === "0.0.0.0" ? "localhost" : wishes.host;
  say(["", `Foldwright is ready at http://${shown}:${web.port} (${secondsSince(began)})`, ...signIns, "Ctrl-C stops it.", ""].join("\n"));
  const code = await web.ended;
  if (state.ending) return;
  throw new PlainError(`The web server ended by itself (code ${code}).`);
}

try {
  await start();
} catch (error) {
  if (!state.ending) {
    process.stderr.write(`\n${error instanceof PlainError ? error.message : error instanceof Error ? error.stack : String(error)}\n`);
    await endAll();
    process.exit(1);
  }
}
if (state.ending) await state.ending;
else await endAll();
