import type { Vec2 } from "../../geometry/vec2";
import type { DocumentHole } from "../../part/partDocument";
import { tidy } from "./tidy";

/** A hole moved by `place`, which turns the plane over when `mirrored`; numbers rounded. */
export function placedHole(hole: DocumentHole, place: (p: Vec2) => Vec2, mirrored: boolean): DocumentHole {
  const at = (p: Vec2): Vec2 => {
    const [x, y] = place(p);
    return [tidy(x), tidy(y)];
  };
  if ("circle" in hole) return { circle: at(hole.circle), diameter: tidy(hole.diameter) };
  if ("slot" in hole) return { slot: [at(hole.slot[0]), at(hole.slot[1])], width: tidy(hole.width) };
  return {
    polygon: hole.polygon.map(([x, y, bulge]) => {
      const [a, b] = at([x, y]);
      return bulge ? [a, b, mirrored ? -bulge : bulge] : [a, b];
    }),
  };
}
