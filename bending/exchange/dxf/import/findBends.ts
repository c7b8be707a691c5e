import { DRAWN_POINT_MM } from "../../../core/tolerance";
import { polygonContains } from "../../../geometry/polygonContains";
import type { Vec2 } from "../../../geometry/vec2";
import type { Repair } from "../contour/piece";
import { placeText } from "../contour/placeText";
import type { FoundBend } from "./foundFlat";

/** Pieces of one bend line stand no farther off its line than this (mm). */
const OFF_LINE_MM = 0.05;

/**
 * Bend lines out of straight pieces: those drawn twice are taken once, and pieces on one line are joined across gaps within the sheet
 * (dashes drawn one by one, a line broken at a hole). Across a notch in the sheet's edge they stay apart.
 */
export function findBends(pieces: readonly FoundBend[], sheet: readonly Vec2[] | null): { readonly bends: readonly FoundBend[]; readonly repairs: readonly Repair[] } {
  const repairs: Repair[] = [];
  const bends: FoundBend[] = [];
  for (const piece of pieces) {
    let own = piece;
    // A piece may close the gap between two that were found before.
    for (let i = bends.findIndex((bend) => joins(bend, own, sheet)); i >= 0; i = bends.findIndex((bend) => joins(bend, own, sheet))) {
      const [other] = bends.splice(i, 1);
      if (!other) break;
      own = { ...other, line: spanOf(other.line, own.line), data: other.data ?? own.data };
      const at = middle(own.line);
      repairs.push({ kind: "joined", at, message: `pieces of a bend line at ${placeText(at)} were joined` });
    }
    bends.push(own);
  }
  return { bends, repairs };
}

const middle = ([p, q]: FoundBend["line"]): Vec2 => [(p[0] + q[0]) / 2, (p[1] + q[1]) / 2];

function joins(a: FoundBend, b: FoundBend, sheet: readonly Vec2[] | null): boolean {
  if (a.direction !== b.direction || (a.data && b.data && a.data.id !== b.data.id)) return false;
  const [long, short] = lengthOf(a.line) >= lengthOf(b.line) ? [a.line, b.line] : [b.line, a.line];
  const length = lengthOf(long);
  const u: Vec2 = [(long[1][0] - long[0][0]) / length, (long[1][1] - long[0][1]) / length];
  const on = (p: Vec2): Vec2 => [(p[0] - long[0][0]) * u[0] + (p[1] - long[0][1]) * u[1], (p[1] - long[0][1]) * u[0] - (p[0] - long[0][0]) * u[1]];
  const [s, t] = [on(short[0]), on(short[1])];
  if (Math.abs(s[1]) > OFF_LINE_MM || Math.abs(t[1]) > OFF_LINE_MM) return false;
  const [from, to] = [Math.min(s[0], t[0]), Math.max(s[0], t[0])];
  const gap: readonly [number, number] = from > length ? [length, from] : to < 0 ? [to, 0] : [0, 0];
  if (gap[1] - gap[0] <= DRAWN_POINT_MM) return true;
  const along = (share: number): Vec2 => { const d = gap[0] + (gap[1] - gap[0]) * share; return [long[0][0] + u[0] * d, long[0][1] + u[1] * d]; };
  return sheet !== null && [0.02, 0.25, 0.5, 0.75, 0.98].every((share) => polygonContains(sheet, along(share)));
}

const lengthOf = ([p, q]: FoundBend["line"]): number => Math.hypot(q[0] - p[0], q[1] - p[1]);

/** The longest line between two of the four ends. */
function spanOf(a: FoundBend["line"], b: FoundBend["line"]): FoundBend["line"] {
  const ends = [...a, ...b];
  const pairs = ends.flatMap((p, i) => ends.slice(i + 1).map((q): FoundBend["line"] => [p, q]));
  return pairs.reduce((best, line) => (lengthOf(line) > lengthOf(best) ? line : best), a);
}
