import { createHash } from "node:crypto";
import { existsSync, readFileSync, readdirSync, statSync } from "node:fs";
import { join } from "node:path";

/** What goes into a production build. */
const SOURCES = [
  "app", "bending", "components", "db", "lib", "public", "proxy.ts", "instrumentation.ts", "next.config.mjs",
  "postcss.config.mjs", "tailwind.config.ts", "tsconfig.json", "package.json", "package-lock.json",
];

/** @param {string} root @param {string} path @returns {string[]} */
function filesUnder(root, path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [path];
  return readdirSync(full).sort().flatMap((name) => filesUnder(root, join(path, name)));
}

/** Digest over every source of the build, tests left out: the same sources, the same digest. @param {string} root */
export function sourceDigest(root) {
  const hash = createHash("sha256").update(process.version);
  for (const path of SOURCES.flatMap((source) => filesUnder(root, source))) {
    if (/\.test\.tsx?$/.test(path)) continue;
    const content = readFileSync(join(root, path));
    hash.update(`\n${path} ${content.length}\n`).update(content);
  }
  return hash.digest("hex");
}
