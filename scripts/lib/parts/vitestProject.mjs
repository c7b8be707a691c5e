import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { run } from "../machine/run.mjs";
import { projectRoot } from "../projectRoot.mjs";
import { countVitest } from "../report/countVitest.mjs";
import { wholePart } from "../report/wholePart.mjs";

/** Runs one project of vitest.config.ts. @param {"unit" | "integration"} project @param {readonly string[]} filters */
export async function vitestProject(project, filters) {
  const folder = mkdtempSync(join(tmpdir(), "foldwright-report-"));
  const file = join(folder, "vitest.json");
  try {
    const result = await run(
      process.execPath,
      ["node_modules/vitest/vitest.mjs", "run", "--project", project, "--reporter=json", `--outputFile=${file}`, ...filters],
      { quiet: true },
    );
    const report = readReport(file);
    if (!report) return wholePart(`vitest (${project})`, { code: result.code || 1, output: result.output });
    const count = countVitest(report, projectRoot);
    return result.code !== 0 && count.failed === 0 ? wholePart(`vitest (${project})`, result) : count;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** @param {string} file */
function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return null;
  }
}
