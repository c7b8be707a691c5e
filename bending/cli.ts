import { readFileSync } from "node:fs";
import { runCommand } from "./command/runCommand";

const outcome = runCommand(process.argv.slice(2), {
  readText: (path) => {
    try {
      return { ok: true, value: readFileSync(path, "utf8") };
    } catch (error) {
      const code = (error as NodeJS.ErrnoException).code;
      return { ok: false, error: code === "ENOENT" ? "there is no such file" : `it cannot be read (${code ?? "unknown error"})` };
    }
  },
  now: () => performance.now(),
});
if (outcome.error !== null) process.stderr.write(`${outcome.error}\n`);
if (outcome.json !== null) process.stdout.write(`${JSON.stringify(outcome.json, null, 2)}\n`);
process.exitCode = outcome.exitCode;
