import type { LineRole } from "@/bending/exchange/dxf/import/lineGroup";

/** What is carried from one import to the next in this browser. */
export interface RememberedImport {
  readonly material: string;
  readonly thickness: string;
  readonly units: "mm" | "in";
  /** By layer name. */
  readonly roles: Readonly<Record<string, LineRole>>;
}

const KEY = "foldwright.import.1";
const ROLES: readonly string[] = ["cut", "bend up", "bend down", "leave out"] satisfies readonly LineRole[];

export function readRememberedImport(): RememberedImport | null {
  try {
    const read = JSON.parse(window.localStorage.getItem(KEY) ?? "null") as Partial<RememberedImport> | null;
    if (typeof read?.material !== "string" || typeof read.thickness !== "string" || typeof read.roles !== "object") return null;
    const roles = Object.fromEntries(Object.entries(read.roles).filter(([, role]) => ROLES.includes(role)));
    return { material: read.material, thickness: read.thickness, units: read.units === "in" ? "in" : "mm", roles };
  } catch {
    return null;
  }
}

export function rememberImport(remembered: RememberedImport): void {
  try {
    window.localStorage.setItem(KEY, JSON.stringify(remembered));
  } catch {
    // A full or forbidden store only means that the next file begins afresh.
  }
}
