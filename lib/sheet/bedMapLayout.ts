import type { BedMap, BedPiece } from "./bedMap";
import { stationNamePlace, type NamePlace } from "./stationNamePlace";

/** Where things of a bed map go, in mm along the bed; `unit` is the height of a line of lettering. */
export interface BedMapLayout {
  readonly box: readonly [number, number, number, number];
  readonly bed: readonly [number, number];
  readonly unit: number;
  readonly rows: {
    readonly title: number;
    readonly punchName: number;
    readonly punch: readonly [number, number];
    readonly die: readonly [number, number];
    readonly dieName: number;
    readonly places: number;
  };
  readonly bendLine: (step: number) => number;
  readonly pieceOutline: (piece: BedPiece) => string;
  /** Where the names of a station's tools stand. */
  readonly names: (station: string) => NamePlace;
  /** A piece's mark as it fits a drawing: without the tool's name, which stands at the station. */
  readonly mark: (piece: BedPiece) => string;
  /** How a piece is lettered: its mark and length level, its mark alone upright, or not at all. */
  readonly lettering: (piece: BedPiece) => "level" | "upright" | "none";
}

/**
 * Lays the bed map out: z to scale, heights only as lettering needs them. `close` shows the run of the bed that carries
 * tools instead of the whole bed.
 */
export function bedMapLayout(map: BedMap, close: boolean): BedMapLayout {
  const [from, to] = close ? closeRun(map) : [map.from, map.to];
  const unit = (to - from) / 62;
  const steps = map.bends.length;
  const gap = unit * 0.95 * (steps + 1);
  const punch = [0, unit * 4] as const;
  const die = [punch[1] + gap, punch[1] + gap + unit * 4] as const;
  const top = -unit * 4;
  const bottom = die[1] + unit * 4;
  return {
    box: [from - unit, top, to - from + 2 * unit, bottom - top],
    bed: [Math.max(map.from, from), Math.min(map.to, to)],
    unit,
    rows: { title: -unit * 2.2, punchName: -unit * 0.6, punch, die, dieName: die[1] + unit * 1.2, places: die[1] + unit * 2.3 },
    bendLine: (step) => punch[1] + unit * 0.95 * step,
    pieceOutline: (piece) => outline(piece, piece.kind === "punch" ? punch : die, unit),
    names: (station) => stationNamePlace(map.stations, station, unit * 0.9),
    mark: markOf,
    lettering: (piece) => {
      const [wide, letters] = [piece.to - piece.from, markOf(piece).length];
      return wide > unit * 0.52 * Math.max(letters, piece.length.length) ? "level" : wide > unit * 0.7 && letters <= 11 ? "upright" : "none";
    },
  };
}

const markOf = ({ id, tool }: BedPiece): string => (id.startsWith(tool) ? id.slice(tool.length).replace(/^[-/ ]+/, "") || id : id);

/** At least 600 mm, the tools in its middle. */
function closeRun({ stations, from, to }: BedMap): readonly [number, number] {
  const left = Math.min(0, ...stations.map((station) => station.from));
  const right = Math.max(0, ...stations.map((station) => station.to));
  const half = Math.max(300, (right - left) / 2 + 60);
  const middle = (left + right) / 2;
  return [Math.max(from, middle - half), Math.min(to, middle + half)];
}

/** A punch's horn is cut away at its foot, away from the ram; a die has none. */
function outline({ from, to, horn, kind }: BedPiece, [top, bottom]: readonly [number, number], unit: number): string {
  const cut = Math.min(unit * 1.2, (to - from) / 3);
  const foot = kind === "punch" ? bottom : top;
  const knee = kind === "punch" ? bottom - unit * 1.1 : top + unit * 1.1;
  const head = kind === "punch" ? top : bottom;
  const left = horn === "left" || horn === "both" ? `L${from} ${knee}L${from + cut} ${foot}` : `L${from} ${foot}`;
  const right = horn === "right" || horn === "both" ? `L${to - cut} ${foot}L${to} ${knee}` : `L${to} ${foot}`;
  return `M${from} ${head}${left}${right}L${to} ${head}Z`;
}
