import type { PlacedShape } from "../shape/placedShape";
import type { LineGroup } from "./lineGroup";

/** The shapes sorted by how they look, in the order in which they first come. */
export function lineGroups(shapes: readonly PlacedShape[]): readonly LineGroup[] {
  const groups = new Map<string, { key: string; shape: PlacedShape; shapes: number[]; kinds: Record<string, number>; straight: boolean }>();
  shapes.forEach((shape, i) => {
    const key = [shape.layer, shape.colour, shape.lineType.toUpperCase(), shape.hidden ? "hidden" : ""].join("|");
    const group = groups.get(key) ?? { key, shape, shapes: [], kinds: {}, straight: true };
    group.shapes.push(i);
    group.kinds[shape.source] = (group.kinds[shape.source] ?? 0) + 1;
    if (!(shape.curve.kind === "LINE" || (shape.curve.kind === "POLYLINE" && !shape.curve.closed && shape.curve.points.every(([, , bulge]) => bulge === 0)))) group.straight = false;
    groups.set(key, group);
  });
  return [...groups.values()].map(({ key, shape, shapes: own, kinds, straight }) => ({
    key, layer: shape.layer, colour: shape.colour, lineType: shape.lineType, dashed: shape.dashed, hidden: shape.hidden, shapes: own, kinds, straight,
  }));
}
