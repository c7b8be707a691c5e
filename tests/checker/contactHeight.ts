import type { Bend, Die } from "@/bending";

/**
 * How high the lowest point of the bent sheet's outside stands over the die's top when its wings just rest on the shoulders,
 * found by lowering the sheet (secant steps on the gap) and not by a formula. Null when the sheet rests on its round strip
 * and not on its wings: such a die does not fit the bend.
 */
export function contactHeight(bend: Bend, thickness: number, die: Die, angle: number): number | null {
  if (angle === 0) return 0;
  const half = angle / 2;
  const outer = bend.allowance / angle + (1 - bend.k) * thickness;
  const [cos, sin] = [Math.cos(half), Math.sin(half)];
  const [tangentX, tangentY] = [outer * sin, 2 * outer * Math.sin(half / 2) ** 2];
  const [shoulderX, shoulderY] = [die.vOpening / 2, -die.shoulderRadius];
  /** How far the shoulder's circle stands off the wing's outside, below it, with the lowest point at `height`. */
  const gap = (height: number) => {
    const [dx, dy] = [shoulderX - tangentX, shoulderY - tangentY - height];
    return dx * sin - dy * cos - die.shoulderRadius;
  };
  let [high, low] = [0, -die.vOpening];
  let [gapHigh, gapLow] = [gap(high), gap(low)];
  for (let i = 0; i < 60 && Math.abs(gapLow) > 1e-10 && gapHigh !== gapLow; i++) {
    const next = low - (gapLow * (low - high)) / (gapLow - gapHigh);
    [high, gapHigh] = [low, gapLow];
    [low, gapLow] = [next, gap(next)];
  }
  const touchesAt = (shoulderX - tangentX) * cos + (shoulderY - tangentY - low) * sin;
  return touchesAt >= 0 ? low : null;
}
