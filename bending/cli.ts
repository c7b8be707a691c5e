import { readFileSync, writeFileSync } from "node:fs";
import { runCommand } from "./command/runCommand";

const reason = (error: unknown, what: string): string => {
  const code = (error as NodeJS.ErrnoException).code;
  return code === "ENOENT" ? (what === "read" ? "there is no such file" : "there is no such folder") : `it cannot be ${what} (${code ?? "unknown error"})`;
};

function attempt<T>(read: () => T) {
  try {
    return { ok: true, value: read() } as const;
  } catch (error) {
    return { ok: false, error: reason(error, "read") } as const;
  }
}

const outcome = runCommand(process.argv.slice(2), {
  readText: (path) => attempt(() => readFileSync(path, "utf8")),
  readBytes: (path) => attempt(() => readFileSync(path)),
  now: () => performance.now(),
});
let { exitCode, error }: { exitCode: number; error: string | null } = outcome;
if (outcome.file !== undefined) {
  try {
    writeFileSync(outcome.file.path, outcome.file.content);
  } catch (thrown) {
    [exitCode, error] = [2, `${outcome.file.path}: ${reason(thrown, "written")}`];
  }
}
if (error !== null) process.stderr.write(`${error}\n`);
if (outcome.json !== null) process.stdout.write(`${JSON.stringify(outcome.json, null, 2)}\n`);
process.exitCode = exitCode;
