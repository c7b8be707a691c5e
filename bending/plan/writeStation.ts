import { mmPer } from "../core/units";
import type { Run } from "../setup/composeRuns";
import { stationLength, type PlacedStation } from "../setup/layout";
import type { PlanSection, PlanStation } from "./planDocument";
import { rounded } from "./rounded";
import type { Situation } from "./situation";
import { stationName } from "./stationName";

/** A station with its pieces from left to right; the shorter of the two runs starts with a gap, as both have one middle. */
export function writeStation({ pairs, units }: Situation, station: PlacedStation, index: number): PlanStation {
  const pair = pairs[station.pair];
  if (pair === undefined) throw new Error("invariant: a station has a pair of the situation");
  const inUnits = (value: number) => rounded(value / mmPer(units));
  const length = stationLength(station);
  return {
    id: stationName(index),
    punch: pair.punch.id,
    die: pair.die.id,
    from: inUnits(station.z - length / 2),
    to: inUnits(station.z + length / 2),
    punchSections: sections(station.punch, length, inUnits),
    dieSections: sections(station.die, length, inUnits),
  };
}

function sections(run: Run, length: number, inUnits: (value: number) => number): readonly PlanSection[] {
  const lead = (length - run.length) / 2;
  return run.pieces.flatMap((piece, index): readonly PlanSection[] => {
    const gap = index === 0 ? lead : run.gap;
    const section = { length: inUnits(piece.length), piece: piece.id, ...(piece.horn === null ? {} : { horn: piece.horn }) };
    return gap > 1e-6 ? [{ gap: inUnits(gap) }, section] : [section];
  });
}
