import { readdirSync } from "node:fs";
import path from "node:path";

export const projectRoot = path.resolve(import.meta.dirname, "../..");

export interface SiteFile {
  /** Absolute. */
  readonly file: string;
  /** `/parts/[id]`: folders in round brackets are not part of the address. */
  readonly path: string;
}

/** Every page.tsx or route.ts under app/, with the address that it answers. */
export function siteTree(name: "page" | "route"): readonly SiteFile[] {
  const app = path.join(projectRoot, "app");
  return readdirSync(app, { recursive: true, encoding: "utf8" })
    .filter((found) => new RegExp(`(^|[\\\\/])${name}\\.(ts|tsx|js|jsx|mjs)$`).test(found))
    .map((found) => {
      const folders = path.dirname(found).split(path.sep).filter((folder) => folder !== "." && !/^\(.*\)$/.test(folder));
      return { file: path.join(app, found), path: `/${folders.join("/")}` };
    })
    .sort((a, b) => (a.path < b.path ? -1 : 1));
}

/** An address for a path of the table: every variable part is an id that nothing has. */
export const withUnknownIds = (pattern: string): string => pattern.replace(/\[[^\]]+\]/g, "00000000-0000-4000-8000-000000000000");
