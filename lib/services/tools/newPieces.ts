import { mmPer, type LengthUnit } from "@/bending/core/units";
import type { NewPiece } from "@/db/tools/newPiece";
import type { PieceInput } from "@/lib/schemas/toolInputs";

/** Every physical piece asked for; marks are made up from tool, length and the next free count where none are given. */
export function newPieces(toolCode: string, inputs: readonly PieceInput[], units: LengthUnit, taken: readonly string[]): readonly NewPiece[] {
  const used = new Set([...taken, ...inputs.flatMap((input) => input.code ?? [])]);
  const nextMark = (kind: string): string => {
    for (let count = 1; ; count++) {
      const mark = `${kind}-${count}`;
      if (used.has(mark)) continue;
      used.add(mark);
      return mark;
    }
  };
  return inputs.flatMap((input) => {
    const lengthMm = Math.round(input.length * mmPer(units) * 1000) / 1000;
    const kind = `${toolCode}-${lengthMm}${(input.horn ?? "").charAt(0).toUpperCase()}`;
    return Array.from({ length: input.count }, () => ({ code: input.code ?? nextMark(kind), lengthMm, horn: input.horn, rack: input.rack }));
  });
}
