import type { PlanModel } from "./planModel";
import { createSheetFormat } from "./createSheetFormat";

/** One tool piece lying on the bed, mm from the middle of the bed. */
export interface BedPiece {
  readonly id: string;
  readonly tool: string;
  readonly kind: "punch" | "die";
  readonly from: number;
  readonly to: number;
  readonly length: string;
  readonly horn: "left" | "right" | "both" | null;
}

export interface BedStation {
  readonly id: string;
  readonly punch: string;
  readonly die: string;
  readonly from: number;
  readonly to: number;
  readonly fromText: string;
  readonly toText: string;
  readonly pieces: readonly BedPiece[];
}

/** The bed seen by the operator, to scale: z in mm from the middle, to the right. */
export interface BedMap {
  readonly from: number;
  readonly to: number;
  readonly frames: readonly [number, number];
  readonly length: string;
  readonly stations: readonly BedStation[];
  readonly bends: readonly { readonly step: number; readonly from: number; readonly to: number; readonly station: string }[];
}

/** Lays the stations of a plan out along the bed, piece by piece. */
export function bedMap(model: PlanModel): BedMap {
  const format = createSheetFormat(model.units);
  const half = model.machine.bedLength / 2;
  return {
    from: -half,
    to: half,
    frames: [-model.machine.betweenFrames / 2, model.machine.betweenFrames / 2],
    length: format.length(model.machine.bedLength),
    stations: model.stations.map((station) => ({
      id: station.id,
      punch: station.punch.id,
      die: station.die.id,
      from: station.from,
      to: station.to,
      fromText: format.place(station.from),
      toText: format.place(station.to),
      pieces: station.pieces.map((piece) => ({
        id: piece.id,
        tool: piece.tool,
        kind: piece.kind,
        from: piece.from,
        to: piece.to,
        length: format.length(piece.to - piece.from),
        horn: piece.horn,
      })),
    })),
    bends: model.steps.map((step, index) => ({ step: index + 1, from: step.bendZ[0], to: step.bendZ[1], station: step.station })),
  };
}
