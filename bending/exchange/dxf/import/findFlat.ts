import { CURVE_FIT_MM, DRAWN_POINT_MM } from "../../../core/tolerance";
import { arcToChords } from "../../../geometry/arcToChords";
import { polygonContains } from "../../../geometry/polygonContains";
import type { Vec2 } from "../../../geometry/vec2";
import { findLoops } from "../contour/findLoops";
import { openSlits } from "../contour/openSlits";
import type { Loop, Piece } from "../contour/piece";
import { pieceMiddle } from "../contour/pieceMiddle";
import { placeText } from "../contour/placeText";
import { curvePieces } from "../shape/curvePieces";
import { moveCurve } from "../shape/moveCurve";
import type { PlacedShape } from "../shape/placedShape";
import { mmPerDrawingUnit } from "./drawingUnit";
import { findBends } from "./findBends";
import type { FoundBend, FoundFlat, Leftover } from "./foundFlat";
import type { ImportChoices } from "./importChoices";
import type { LineGroup } from "./lineGroup";

/** Sorts the drawing into the sheet's edge, holes, bend lines and what is left over, by the choices made. */
export function findFlat(shapes: readonly PlacedShape[], groups: readonly LineGroup[], choices: ImportChoices): FoundFlat {
  const factor = mmPerDrawingUnit[choices.unit];
  const chainOf = (index: number): readonly Piece[] => {
    const shape = shapes[index];
    if (!shape) return [];
    return moveCurve(shape.curve, [factor, 0, 0, factor, 0, 0]).flatMap((curve) => curvePieces(curve, CURVE_FIT_MM)).map((piece) => ({ ...piece, shape: index }));
  };
  const cut: (readonly Piece[])[] = [];
  const lines: FoundBend[] = [];
  const leftovers: Leftover[] = [];
  for (const group of groups) {
    const role = choices.roles.get(group.key) ?? "cut";
    if (role === "leave out") continue;
    for (const index of group.shapes) {
      const chain = chainOf(index);
      if (role === "cut") { cut.push(chain); continue; }
      const data = shapes[index]?.bend ?? null;
      for (const piece of chain) {
        if (piece.bulge !== 0) leftovers.push(leftover(piece, shapes, "is not straight, so it is no bend line"));
        else if (lengthOf(piece) > DRAWN_POINT_MM) lines.push({ line: [piece.from, piece.to], direction: data?.direction ?? (role === "bend up" ? "up" : "down"), data });
      }
    }
  }
  const { loops, repairs, rest } = findLoops(cut, choices.gap);
  const chosen = loops[choices.contour] ?? loops[0] ?? null;
  const slits = openSlits(chosen?.vertices ?? []);
  const outline = chosen && { ...chosen, vertices: slits.vertices };
  const sheet = outline ? chordsOf(outline) : null;
  const inside = (p: Vec2) => sheet !== null && polygonContains(sheet, p);
  const inner = loops.filter((loop) => loop !== chosen && outline !== null && loop.area < outline.area && inside(pointOf(loop)));
  const within = new Set(inner);
  const { holes, islands } = topmost(inner);
  const single: Piece[] = [];
  for (const piece of rest) {
    if (piece.bulge === 0 && inside(pieceMiddle(piece)) && lengthOf(piece) > 10 * DRAWN_POINT_MM) single.push(piece);
    else leftovers.push(leftover(piece, shapes, "is on no closed contour"));
  }
  if (choices.singleLines === null) leftovers.push(...single.map((piece) => leftover(piece, shapes, "lies inside the contour and closes nothing")));
  else lines.push(...single.map((piece): FoundBend => ({ line: [piece.from, piece.to], direction: choices.singleLines ?? "up", data: null })));
  for (const loop of islands) leftovers.push(loopLeftover(loop, "a closed contour inside a hole"));
  for (const loop of loops) if (loop !== chosen && !within.has(loop)) leftovers.push(loopLeftover(loop, "a closed contour outside the sheet"));
  const found = findBends(lines, sheet);
  const bends = found.bends.filter((bend) => {
    const on = sheet === null || inside(at(bend.line, 0.5)) || inside(at(bend.line, 0.25)) || inside(at(bend.line, 0.75));
    if (!on) leftovers.push({ what: `a bend line outside the sheet at ${placeText(at(bend.line, 0.5))}`, at: at(bend.line, 0.5), path: bend.line });
    return on;
  });
  return { outline, holes, bends, repairs: [...repairs, ...slits.repairs, ...found.repairs], leftovers, contours: loops, singleLines: single.map(({ from, to }) => [from, to] as const) };
}

const lengthOf = ({ from, to }: Piece): number => Math.hypot(to[0] - from[0], to[1] - from[1]);
const at = ([p, q]: FoundBend["line"], share: number): Vec2 => [p[0] + (q[0] - p[0]) * share, p[1] + (q[1] - p[1]) * share];
const pointOf = (loop: Loop): Vec2 => { const [x, y] = loop.vertices[0] ?? [0, 0]; return [x, y]; };

function leftover(piece: Piece, shapes: readonly PlacedShape[], why: string): Leftover {
  const shape = shapes[piece.shape];
  const middle = pieceMiddle(piece);
  return { what: `${shape?.source ?? "a line"} on line ${shape?.line ?? 0} of the file, at ${placeText(middle)}, ${why}`, at: middle, path: [piece.from, ...arcToChords(piece.from, piece.to, piece.bulge, 0.05)] };
}

const loopLeftover = (loop: Loop, what: string): Leftover => ({ what: `${what} at ${placeText(pointOf(loop))}`, at: pointOf(loop), path: [...chordsOf(loop), pointOf(loop)] });

function chordsOf(loop: Loop): readonly Vec2[] {
  return loop.vertices.flatMap(([x, y, bulge], i): readonly Vec2[] => {
    const next = loop.vertices[(i + 1) % loop.vertices.length] ?? [x, y, 0];
    return arcToChords([x, y], [next[0], next[1]], bulge, 0.02);
  });
}

/** Contours that lie in no other (holes of the sheet), and those within them. Sorted by area, so that a container comes first. */
function topmost(loops: readonly Loop[]): { readonly holes: readonly Loop[]; readonly islands: readonly Loop[] } {
  const holes: { readonly loop: Loop; readonly chords: readonly Vec2[]; readonly box: readonly [number, number, number, number] }[] = [];
  const islands: Loop[] = [];
  for (const loop of loops) {
    const [x, y] = pointOf(loop);
    const within = holes.some(({ chords, box }) => x > box[0] && x < box[1] && y > box[2] && y < box[3] && polygonContains(chords, [x, y]));
    if (within) { islands.push(loop); continue; }
    const chords = chordsOf(loop);
    const [xs, ys] = [chords.map((p) => p[0]), chords.map((p) => p[1])];
    const span = (values: readonly number[]) => values.reduce(([a, b], v): readonly [number, number] => [Math.min(a, v), Math.max(b, v)], [Infinity, -Infinity] as readonly [number, number]);
    holes.push({ loop, chords, box: [...span(xs), ...span(ys)] });
  }
  return { holes: holes.map(({ loop }) => loop), islands };
}
