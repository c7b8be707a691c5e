import type { FieldProblem } from "../core/problem";
import type { BaseShape, FlangeEntry } from "./partDocument";

/** Whether the flanges make a tree on the base, each on a straight edge of its own. */
export function checkFlanges(base: BaseShape, flanges: readonly FlangeEntry[]): readonly FieldProblem[] {
  const problems: FieldProblem[] = [];
  const byId = new Map<string, number>();
  flanges.forEach(({ id }, i) => {
    const first = byId.get(id);
    if (id === "base") problems.push({ path: `flanges[${i}].id`, message: `"base" is the base's own name; choose another` });
    else if (first !== undefined) problems.push({ path: `flanges[${i}].id`, message: `"${id}" is already the name of flanges[${first}]; each flange needs a name of its own` });
    else byId.set(id, i);
  });
  const taken = new Map<string, string>();
  flanges.forEach((flange, i) => {
    const path = `flanges[${i}]`;
    const parent = byId.get(flange.on);
    if (flange.on !== "base" && parent === undefined) {
      problems.push({ path: `${path}.on`, message: `there is no face "${flange.on}"; it must be one of: ${known(flanges)}` });
      return;
    }
    if (inCircle(flange, flanges, byId)) {
      problems.push({ path: `${path}.on`, message: `"${flange.id}" hangs on itself through "${flange.on}"; every chain of flanges must begin on the base` });
      return;
    }
    problems.push(...checkEdge(flange, path, flange.on === "base" ? base.outline : flanges[parent ?? 0]?.outline, taken));
  });
  return problems;
}

function checkEdge(flange: FlangeEntry, path: string, outline: BaseShape["outline"] | undefined, taken: Map<string, string>): readonly FieldProblem[] {
  const count = outline?.length ?? 4;
  const where = `${path}.edge`;
  if (flange.edge >= count) return [{ path: where, message: `"${flange.on}" has no edge ${flange.edge}; its edges are 0 to ${count - 1}` }];
  if (flange.on !== "base" && flange.edge === 0) return [{ path: where, message: `edge 0 of "${flange.on}" is its own bend; use edge 1 (end side), 2 (far edge) or 3 (start side)` }];
  if ((outline?.[flange.edge]?.[2] ?? 0) !== 0) return [{ path: where, message: `edge ${flange.edge} of "${flange.on}" is curved; a bend needs a straight edge` }];
  const key = `${flange.edge} ${flange.on}`;
  const other = taken.get(key);
  if (other !== undefined) return [{ path: where, message: `edge ${flange.edge} of "${flange.on}" is already bent by "${other}"` }];
  taken.set(key, flange.id);
  return [];
}

function inCircle(flange: FlangeEntry, flanges: readonly FlangeEntry[], byId: ReadonlyMap<string, number>): boolean {
  let on = flange.on;
  for (let steps = 0; steps <= flanges.length; steps++) {
    if (on === "base") return false;
    if (on === flange.id) return true;
    const next = flanges[byId.get(on) ?? -1];
    if (!next) return false;
    on = next.on;
  }
  return true;
}

function known(flanges: readonly FlangeEntry[]): string {
  const names = ["base", ...flanges.map(({ id }) => id)];
  return names.slice(0, 12).map((name) => `"${name}"`).join(", ") + (names.length > 12 ? ", ..." : "");
}
