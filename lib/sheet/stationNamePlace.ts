import type { BedMap } from "./bedMap";

export interface NamePlace {
  readonly x: number;
  readonly anchor: "start" | "middle" | "end";
}

/** Width of a letter of the drawing's face as a part of its height, on the safe side. */
const LETTER_WIDTH = 0.62;

/**
 * Where a station's tool names stand: over its middle, or, where they would run into a neighbour's, flush with the edge that
 * faces the neighbour. `letter` is the height of the lettering in mm of bed.
 */
export function stationNamePlace(stations: BedMap["stations"], id: string, letter: number): NamePlace {
  const inOrder = [...stations].sort((a, b) => a.from - b.from);
  const index = inOrder.findIndex((station) => station.id === id);
  const [left, own, right] = [inOrder[index - 1], inOrder[index], inOrder[index + 1]];
  if (own === undefined) return { x: 0, anchor: "middle" };
  const half = (station: BedMap["stations"][number]) => (Math.max(station.punch.length, station.die.length) * letter * LETTER_WIDTH) / 2;
  const meet = (a: BedMap["stations"][number] | undefined, b: BedMap["stations"][number] | undefined) =>
    a !== undefined && b !== undefined && (a.from + a.to) / 2 + half(a) > (b.from + b.to) / 2 - half(b);
  if (meet(own, right) && !meet(left, own)) return { x: own.to, anchor: "end" };
  if (meet(left, own) && !meet(own, right)) return { x: own.from, anchor: "start" };
  return { x: (own.from + own.to) / 2, anchor: "middle" };
}
