import { readFileSync, writeFileSync } from "node:fs";
import { isSolidFile } from "./command/isSolidFile";
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

/** The solid that an import names, read before the command runs; the kernel is loaded for nothing else. */
async function solidNamed(args: readonly string[]) {
  const path = args[0] === "import" ? args.find((word) => !word.startsWith("--") && isSolidFile(word)) : undefined;
  if (path === undefined) return null;
  const bytes = attempt(() => readFileSync(path));
  if (!bytes.ok) return bytes;
  const body = /^--body[= ]([1-9]\d{0,4})$/.exec(args.flatMap((word, i) => (word === "--body" ? [`--body ${args[i + 1]}`] : word.startsWith("--body=") ? [word] : []))[0] ?? "")?.[1];
  return (await import("../lib/step/readSolidFile")).readSolidFile(bytes.value, body === undefined ? undefined : Number(body));
}

const args = process.argv.slice(2);
const solid = await solidNamed(args);
const outcome = runCommand(args, {
  readText: (path) => attempt(() => readFileSync(path, "utf8")),
  readBytes: (path) => attempt(() => readFileSync(path)),
  ...(solid ? { readSolid: () => solid } : {}),
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
