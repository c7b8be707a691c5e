import type { Vec2 } from "@/bending/geometry/vec2";
import type { Vec3 } from "@/bending/geometry/vec3";
import { foldFrames } from "@/bending/part/foldFrames";
import type { FormedAngles, PartModel } from "@/bending/part/partModel";
import { boundsOf } from "@/lib/sheet/boundsOf";
import { convexHull } from "@/bending/geometry/convexHull";
import { sheetPrisms } from "@/lib/sheet/sheetPrisms";

const [COS, SIN] = [Math.cos(Math.PI / 6), Math.sin(Math.PI / 6)];
/** Isometric, seen from the front right above; y downwards. */
const look = ([x, y, z]: Vec3): Vec2 => [(x + y) * COS, (x - y) * SIN - z];
const nearness = ([x, y, z]: Vec3): number => x - y + z;

/** The folded part as a line drawing, for browsers without 3D. Far pieces are drawn first. */
export function PartDrawing({ part, angles, className }: { readonly part: PartModel; readonly angles: FormedAngles; readonly className?: string }) {
  const pieces = sheetPrisms(part, foldFrames(part, angles), angles, 6)
    .map((prism) => {
      const corners = [...prism.lower, ...prism.upper];
      return { points: convexHull(corners.map(look)), near: corners.reduce((sum, corner) => sum + nearness(corner), 0) / corners.length, bend: prism.bend !== null };
    })
    .sort((a, b) => a.near - b.near);
  const [left, top, right, bottom] = boundsOf(pieces.map((piece) => piece.points));
  const margin = Math.max(right - left, bottom - top) * 0.05 + 1;
  return (
    <svg viewBox={[left - margin, top - margin, right - left + 2 * margin, bottom - top + 2 * margin].join(" ")} role="img" aria-label={`The part ${part.name}, folded`} className={className}>
      {pieces.map(({ points, bend }, index) => (
        <polygon key={index} points={points.map((point) => point.join(",")).join(" ")} fill={bend ? "var(--steel-300)" : "var(--accent-wash)"} stroke="var(--accent)" strokeWidth={bend ? 0.5 : 1}
          strokeLinejoin="round" vectorEffect="non-scaling-stroke" />
      ))}
    </svg>
  );
}
