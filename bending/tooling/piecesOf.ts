import type { FieldProblem } from "../core/problem";
import { mm } from "../core/units";
import { formatLength } from "../core/formatLength";
import type { ToolPiece } from "./tool";
import type { SectionEntry, ToolEntry } from "./toolingDocument";

/** Every physical piece of a tool, longest first; marks are made up from tool, length and count when none are given. */
export function piecesOf(tool: ToolEntry, path: string, scale: number): { readonly pieces: readonly ToolPiece[]; readonly problems: readonly FieldProblem[] } {
  const problems: FieldProblem[] = [];
  const pieces: ToolPiece[] = [];
  const counted = new Map<string, number>();
  tool.sections.forEach((section, k) => {
    const count = section.count ?? section.pieces?.length ?? 1;
    if (section.pieces && section.pieces.length !== count) {
      problems.push({ path: `${path}.sections[${k}].pieces`, message: `names ${section.pieces.length} pieces, but the count is ${count}; give a mark for each piece` });
      return;
    }
    for (let i = 0; i < count; i++) pieces.push(piece(tool, section, section.pieces?.[i], counted, scale));
  });
  const seen = new Set<string>();
  for (const { id } of pieces) {
    if (seen.has(id)) problems.push({ path: `${path}.sections`, message: `the mark "${id}" stands on two pieces; each piece needs its own` });
    seen.add(id);
  }
  const order = pieces.map((_, i) => i).sort((a, b) => (pieces[b]?.length ?? 0) - (pieces[a]?.length ?? 0) || a - b);
  return { pieces: order.flatMap((i) => pieces[i] ?? []), problems };
}

function piece(tool: ToolEntry, section: SectionEntry, mark: string | undefined, counted: Map<string, number>, scale: number): ToolPiece {
  const length = section.length * scale;
  const suffix = section.horn ? section.horn.charAt(0).toUpperCase() : "";
  const kind = `${tool.id}-${formatLength(length, "mm").replace(" mm", "")}${suffix}`;
  const number = (counted.get(kind) ?? 0) + 1;
  if (mark === undefined) counted.set(kind, number);
  return { id: mark ?? `${kind}-${number}`, length: mm(length), horn: section.horn ?? null, rack: section.rack ?? null };
}
