import { fail, ok, type Result } from "@/bending/core/result";
import type { Vec2 } from "@/bending/geometry/vec2";

/** Points typed one a line as `x y`, `x; y` or `x, y`, or pasted as JSON `[[0,0],[3.1,3.1]]`. Decimal points, not commas. */
export function parseProfile(text: string): Result<readonly Vec2[], string> {
  const typed = text.trim();
  if (typed === "") return fail("Type the corners of the cross-section, one a line: x and y in mm.");
  if (typed.startsWith("[")) return parseJson(typed);
  const points: Vec2[] = [];
  for (const [i, line] of typed.split(/\r?\n/).entries()) {
    if (line.trim() === "") continue;
    const [x, y, ...more] = line.trim().split(/[\s;,]+/).map(Number);
    if (x === undefined || y === undefined || more.length > 0 || !Number.isFinite(x) || !Number.isFinite(y)) return fail(`Line ${i + 1}, "${line.trim().slice(0, 40)}", is not a point. Type x and y, like 3.1 3.1.`);
    points.push([x, y]);
  }
  return ok(points);
}

function parseJson(text: string): Result<readonly Vec2[], string> {
  try {
    const read: unknown = JSON.parse(text);
    const points = Array.isArray(read) ? read.flatMap((entry: unknown): readonly Vec2[] =>
      (Array.isArray(entry) && entry.length === 2 && typeof entry[0] === "number" && typeof entry[1] === "number" ? [[entry[0], entry[1]]] : [])) : [];
    return Array.isArray(read) && points.length === read.length ? ok(points) : fail("The list must hold pairs of numbers: [[0, 0], [3.1, 3.1], ...].");
  } catch {
    return fail("This begins like a list but cannot be read: [[0, 0], [3.1, 3.1], ...].");
  }
}
