import { toDeg, type Rad } from "../core/units";
import type { Tool, ToolPiece } from "./tool";
import type { SectionEntry, ToolEntry } from "./toolingDocument";

/** A tool as an entry of a tooling document in millimetres; pieces alike share one section. */
export function toolToDocument(tool: Tool): ToolEntry {
  const common = {
    id: tool.id,
    name: tool.name,
    profile: tool.profile.map(([x, y]): readonly [number, number] => [x, y]),
    height: tool.height,
    maxForcePerMetre: tool.maxForcePerMetre,
    tang: tool.tang,
    sections: sections(tool.pieces),
  };
  return tool.kind === "punch"
    ? { ...common, kind: "punch", tipAngle: degrees(tool.tipAngle), tipRadius: tool.tipRadius }
    : { ...common, kind: "die", vOpening: tool.vOpening, vAngle: degrees(tool.vAngle), shoulderRadius: tool.shoulderRadius, ...(tool.flattening ? { flattening: { ...tool.flattening } } : {}) };
}

/** Without the last digits of the turn to radians and back. */
const degrees = (angle: Rad): number => Number(toDeg(angle).toFixed(9));

function sections(pieces: readonly ToolPiece[]): readonly SectionEntry[] {
  const alike = new Map<string, ToolPiece[]>();
  for (const piece of pieces) {
    const key = JSON.stringify([piece.length, piece.horn, piece.rack]);
    alike.set(key, [...(alike.get(key) ?? []), piece]);
  }
  return [...alike.values()].flatMap((group): readonly SectionEntry[] => {
    const [first] = group;
    if (!first) return [];
    return [{
      length: first.length,
      count: group.length,
      ...(first.horn ? { horn: first.horn } : {}),
      pieces: group.map((piece) => piece.id),
      ...(first.rack ? { rack: first.rack } : {}),
    }];
  });
}
