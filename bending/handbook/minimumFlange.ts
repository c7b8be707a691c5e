import { mm, type Mm, type Rad } from "../core/units";

interface DieFacts {
  readonly vOpening: Mm;
  readonly shoulderRadius: Mm;
}

/**
 * Shortest outside flange (to the apex of the outside surfaces) that still touches the die's shoulder at the
 * end of an air bend: c / cos(a / 2) - rd tan(a / 2), c = V / 2 between the tops of the shoulder arcs.
 * Derived from the two tangencies; independent of radius and thickness.
 */
export function minimumFlange(angle: Rad, { vOpening, shoulderRadius }: DieFacts): Mm {
  return mm(vOpening / 2 / Math.cos(angle / 2) - shoulderRadius * Math.tan(angle / 2));
}

/** Flange that shops keep to at 90 degrees, as a part of the V opening (trade chart for mild steel, 88 degree dies). */
export function advisedFlange(vOpening: Mm): Mm {
  const part = vOpening <= 12 ? 0.7 : vOpening <= 25 ? 0.72 : vOpening < 125 ? 0.75 : 0.77;
  return mm(part * vOpening);
}
