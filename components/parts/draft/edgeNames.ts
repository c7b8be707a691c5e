import type { PartDraft } from "./partDraft";

const rectangle = ["front", "right", "back", "left"];
const sides = ["bend", "end side", "far edge", "start side"];

/** The edges of a face that a flange can stand on, with a name for each. */
export function edgeNames(draft: PartDraft, face: string): readonly { readonly edge: number; readonly name: string }[] {
  if (face === "base") {
    if (draft.base.kind === "rectangle") return rectangle.map((name, edge) => ({ edge, name }));
    const { vertices } = draft.base;
    return vertices.map((vertex, edge) => {
      const next = vertices[(edge + 1) % vertices.length];
      return { edge, name: `${edge}: (${vertex.x}, ${vertex.y}) to (${next?.x ?? ""}, ${next?.y ?? ""})` };
    });
  }
  const carrier = draft.flanges.find((flange) => flange.id === face);
  if (carrier !== undefined && carrier.outline !== null)
    return carrier.outline.slice(1).map((_, i) => ({ edge: i + 1, name: `${i + 1}: edge of its outline` }));
  return [2, 1, 3].map((edge) => ({ edge, name: sides[edge] ?? "" }));
}
