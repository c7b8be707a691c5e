import type { FieldProblem } from "../core/problem";
import { SAME_POINT_MM } from "../core/tolerance";
import { stepOf } from "./stepOf";
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
  flanges.forEach(({ id, offset }, i) => {
    const other = byId.get(stepOf(id));
    if (offset && other !== undefined) problems.push({ path: `flanges[${other}].id`, message: `"${stepOf(id)}" is the name of the step of "${id}" (flanges[${i}]); choose another` });
  });
  const taken = new Map<string, FlangeEntry[]>();
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

function checkEdge(flange: FlangeEntry, path: string, outline: BaseShape["outline"] | undefined, taken: Map<string, FlangeEntry[]>): readonly FieldProblem[] {
  const count = outline?.length ?? 4;
  const where = `${path}.edge`;
  if (flange.edge >= count) return [{ path: where, message: `"${flange.on}" has no edge ${flange.edge}; its edges are 0 to ${count - 1}` }];
  if (flange.on !== "base" && flange.edge === 0) return [{ path: where, message: `edge 0 of "${flange.on}" is its own bend; use edge 1 (end side), 2 (far edge) or 3 (start side)` }];
  if ((outline?.[flange.edge]?.[2] ?? 0) !== 0) return [{ path: where, message: `edge ${flange.edge} of "${flange.on}" is curved; a bend needs a straight edge` }];
  const key = `${flange.edge} ${flange.on}`;
  const before = taken.get(key) ?? [];
  const length = edgeLength(flange, outline);
  taken.set(key, [...before, flange]);
  const other = before.find((earlier) => lap(earlier, flange, length));
  return other ? [{ path: where, message: `edge ${flange.edge} of "${flange.on}" is already bent by "${other.id}" there; give both insets (start, end) that keep them apart` }] : [];
}

/** Of a drawn edge; null where it follows from what the bends leave. */
function edgeLength({ edge }: FlangeEntry, outline: BaseShape["outline"] | undefined): number | null {
  const [p, q] = [outline?.[edge], outline?.[(edge + 1) % (outline?.length ?? 1)]];
  return p && q ? Math.hypot(q[0] - p[0], q[1] - p[1]) : null;
}

/** Whether two flanges on one edge lie over one another along it; where the edge's length is not drawn, only what is sure. */
function lap(a: FlangeEntry, b: FlangeEntry, length: number | null): boolean {
  const [first, second] = (a.start ?? 0) <= (b.start ?? 0) ? [a, b] : [b, a];
  if (first.outline) {
    const reach = (first.start ?? 0) + Math.max(...first.outline.filter((v) => v[1] === 0).map((v) => v[0]));
    return reach > (second.start ?? 0) + SAME_POINT_MM;
  }
  if ((first.end ?? 0) === 0) return true;
  return length !== null && length - (first.end ?? 0) > (second.start ?? 0) + SAME_POINT_MM;
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
