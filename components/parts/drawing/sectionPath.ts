import type { Vec2 } from "@/bending/geometry/vec2";
import type { CrossSection } from "./crossSection";

const step = (p: Vec2, way: Vec2, by: number): Vec2 => [p[0] + way[0] * by, p[1] + way[1] * by];

/** Outline of the section as SVG path data with true arcs: along the top side, back along the bottom side. */
export function sectionPath({ legs, bends, thickness }: CrossSection, at: (point: Vec2) => Vec2, scale: number): string {
  const half = thickness / 2;
  const say = (point: Vec2) => at(point).map((value) => value.toFixed(2)).join(" ");
  const arc = (i: number, side: 1 | -1, to: Vec2): string => {
    const bend = bends[i];
    if (bend === undefined) return "";
    const inside = Math.sign(bend.turn) === side;
    const radius = Math.max(0, bend.insideRadius + (inside ? 0 : thickness)) * scale;
    const forward = side === 1 ? bend.turn > 0 : bend.turn < 0;
    return `A${radius.toFixed(3)} ${radius.toFixed(3)} 0 ${Math.abs(bend.turn) > Math.PI ? 1 : 0} ${forward ? 0 : 1} ${say(to)}`;
  };
  const top = legs.map((leg, i) => {
    const start = step(leg.from, leg.left, half);
    return `${i === 0 ? `M${say(start)}` : arc(i - 1, 1, start)}L${say(step(leg.to, leg.left, half))}`;
  });
  const bottom = [...legs].reverse().map((leg, k) => {
    const i = legs.length - 1 - k;
    const start = step(leg.to, leg.left, -half);
    return `${k === 0 ? `L${say(start)}` : arc(i, -1, start)}L${say(step(leg.from, leg.left, -half))}`;
  });
  return `${top.join("")}${bottom.join("")}Z`;
}
