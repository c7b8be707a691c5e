import { polygonBounds } from "../../geometry/polygonBounds";
import { contourAsChords } from "../../part/contourAsChords";
import type { FlatContour } from "../../part/partModel";
import type { Vec2 } from "../../geometry/vec2";
import type { DrawnBendLine, FlatDrawing } from "../flatDrawing";

/** Line width on the drawing and room round it, mm. */
const LINE_MM = 0.25;
const MARGIN_MM = 1;

/**
 * A flat as SVG 1.1 in true size (a user unit is a millimetre, and the picture says its size in mm): a group for each kind of line,
 * arcs as arcs, seen from the base's top with y up as in the drawing.
 */
export function writeSvg({ name, contours, bendLines }: FlatDrawing): string {
  const { min, max } = polygonBounds(contourAsChords(contours.outline));
  const [width, height] = [max[0] - min[0] + 2 * MARGIN_MM, max[1] - min[1] + 2 * MARGIN_MM];
  const at = ([x, y]: Vec2): string => `${text(x - min[0] + MARGIN_MM)} ${text(max[1] - y + MARGIN_MM)}`;
  const group = (id: string, dash: string | null, content: readonly string[]): readonly string[] =>
    content.length === 0 ? [] : [`  <g id="${id}"${dash === null ? "" : ` stroke-dasharray="${dash}"`}>`, ...content.map((one) => `    ${one}`), "  </g>"];
  const bend = ({ id, line, angle, direction, insideRadius }: DrawnBendLine) =>
    `<path d="M${at(line[0])}L${at(line[1])}"><title>${escaped(`${id}: ${direction} ${text(angle)} degrees, inside radius ${text(insideRadius)} mm`)}</title></path>`;
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<svg xmlns="http://www.w3.org/2000/svg" version="1.1" width="${text(width)}mm" height="${text(height)}mm" viewBox="0 0 ${text(width)} ${text(height)}" fill="none" stroke="#000" stroke-width="${LINE_MM}" stroke-linejoin="round">`,
    `  <title>${escaped(name)}</title>`,
    `  <desc>Flat pattern ${text(max[0] - min[0])} x ${text(max[1] - min[1])} mm, true size, ${bendLines.length} bend lines, seen from the base's top</desc>`,
    ...group("CUT", null, [`<path fill-rule="evenodd" d="${[contours.outline, ...contours.holes].map((one) => contourPath(one, at)).join("")}"/>`]),
    ...group("BEND_UP", "8 2 0.5 2", bendLines.filter(({ direction }) => direction === "up").map(bend)),
    ...group("BEND_DOWN", "6 3", bendLines.filter(({ direction }) => direction === "down").map(bend)),
    "</svg>",
    "",
  ].join("\n");
}

function contourPath(contour: FlatContour, at: (p: Vec2) => string): string {
  if (contour.kind === "circle") {
    const { centre: [x, y], radius: r } = contour;
    return `M${at([x + r, y])}A${text(r)} ${text(r)} 0 1 0 ${at([x - r, y])}A${text(r)} ${text(r)} 0 1 0 ${at([x + r, y])}Z`;
  }
  const { vertices } = contour;
  return `${vertices.map(([x, y, bulge], i) => {
    const next = vertices[(i + 1) % vertices.length] ?? [x, y, 0];
    const to: Vec2 = [next[0], next[1]];
    const start = i === 0 ? `M${at([x, y])}` : "";
    if (bulge === 0) return i === vertices.length - 1 ? start : `${start}L${at(to)}`;
    const radius = (Math.hypot(to[0] - x, to[1] - y) * (1 + bulge * bulge)) / (4 * Math.abs(bulge));
    // y runs down here, so that a counter-clockwise arc has the sweep flag 0.
    return `${start}A${text(radius)} ${text(radius)} 0 ${Math.abs(bulge) > 1 ? 1 : 0} ${bulge > 0 ? 0 : 1} ${at(to)}`;
  }).join("")}Z`;
}

const text = (value: number): string => String(Number(value.toFixed(5)) + 0);
const escaped = (value: string): string => value.replace(/[\p{Cc}\uFFFE\uFFFF]/gu, " ").replace(/&/g, "&amp;").replace(/</g, "&lt;").replace(/>/g, "&gt;").replace(/"/g, "&quot;");
