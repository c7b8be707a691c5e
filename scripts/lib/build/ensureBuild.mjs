import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { run } from "../machine/run.mjs";
import { projectRoot } from "../projectRoot.mjs";
import { sourceDigest } from "./sourceDigest.mjs";

const stamp = join(projectRoot, ".next", "foldwright-build.json");
const buildId = join(projectRoot, ".next", "BUILD_ID");

/** Whether the build in .next is of the sources as they are now. @param {string} digest */
function isFresh(digest) {
  if (!existsSync(stamp) || !existsSync(buildId)) return false;
  try {
    const made = JSON.parse(readFileSync(stamp, "utf8"));
    return made.digest === digest && made.buildId === readFileSync(buildId, "utf8");
  } catch {
    return false;
  }
}

/**
 * Builds for production when the sources have changed since the last build.
 * @param {{ onBuild?: () => void, quiet?: boolean }} options
 * @returns {Promise<{ code: number, output: string, built: boolean }>}
 */
export async function ensureBuild({ onBuild = () => undefined, quiet = false } = {}) {
  const digest = sourceDigest(projectRoot);
  if (isFresh(digest)) return { code: 0, output: "", built: false };
  onBuild();
  const result = await run(process.execPath, ["node_modules/next/dist/bin/next", "build"], {
    env: { NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1" },
    quiet,
  });
  if (result.code === 0) writeFileSync(stamp, JSON.stringify({ digest, buildId: readFileSync(buildId, "utf8") }));
  return { ...result, built: true };
}
