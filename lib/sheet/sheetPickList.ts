import { createSheetFormat } from "./createSheetFormat";
import type { PlanModel } from "./planModel";
import type { PickLine } from "./sheetView";

/** What to fetch from the rack, station by station, punches before dies, left to right. */
export function sheetPickList(model: PlanModel): readonly PickLine[] {
  const format = createSheetFormat(model.units);
  return model.stations.flatMap((station) =>
    station.pieces.map((piece) => ({
      piece: piece.id,
      tool: piece.tool,
      toolName: (piece.kind === "punch" ? station.punch : station.die).name,
      kind: piece.kind,
      length: format.length(piece.to - piece.from),
      horn: piece.horn === null ? "" : piece.horn === "both" ? "horn left and right" : `horn ${piece.horn}`,
      rack: piece.rack ?? "no place known",
      station: station.id,
    })),
  );
}
