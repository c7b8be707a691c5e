import type { Machine } from "../../tooling/machine";
import { NEAR_GAP_MM } from "../placeStations";
import type { PieceStock } from "./createPieceStock";
import type { SharedWish } from "./sharedWish";
import type { ShutHeight } from "./shutHeights";

export interface ReasonQuestion {
  readonly wishes: readonly SharedWish[];
  readonly stocks: readonly PieceStock[];
  readonly classes: readonly ShutHeight[];
  readonly machine: Machine;
  readonly leastStations: number;
  readonly spent: boolean;
  readonly lost: boolean;
}

/** Why no bed serves all wishes, or why none was found, one sentence each. */
export function sharedReasons({ wishes, stocks, classes, machine, leastStations, spent, lost }: ReasonQuestion): readonly string[] {
  const never = wishes.filter((wish) => classes.every(({ missing }) => missing.includes(wish)));
  if (never.length > 0) return never.map((wish) => neverServed(wish, stocks));
  if (classes.every(({ missing }) => missing.length > 0)) {
    return classes.map(({ height, missing }) => `at a shut height of ${mm(height)} no tools make ${names(missing)}; all stations on one bed close at one height`);
  }
  if (spent) return [`no bed was found in the effort given; it needs ${leastStations} ${leastStations === 1 ? "station" : "stations"} at the least`];
  if (lost) return [`stations were found, but not a place on the bed of ${mm(machine.bedLength)} where no part comes to another station and the machine bears every load; fewer parts on one bed, or a longer bed, may do`];
  return [`no division of the ${wishes.length} bends among stations can be made of the pieces in stock on a bed of ${mm(machine.bedLength)} with ${mm(NEAR_GAP_MM)} between two; it needs ${leastStations} at the least`];
}

function neverServed({ id, ways, lineLength }: SharedWish, stocks: readonly PieceStock[]): string {
  const unknown = ways.flatMap(({ punch, die }) => [["punch", punch], ["die", die]] as const).filter(([kind, tool]) => !stocks.some((stock) => stock.tool.kind === kind && stock.tool.id === tool));
  if (ways.length === 0) return `${id}: no tools are named that make it`;
  if (unknown.length > 0) return `${id}: ${[...new Set(unknown.map(([, tool]) => tool))].join(", ")} ${unknown.length === 1 ? "is" : "are"} not in stock`;
  const windows = ways.map(({ punch, punchWindow: [from, to] }) => `${punch} may stand over ${mm(to - from)}`);
  return `${id}: no pieces make a run for its line of ${mm(lineLength)} that fits (${[...new Set(windows)].join("; ")})`;
}

const names = (wishes: readonly SharedWish[]) => (wishes.length > 4 ? `${wishes.slice(0, 3).map(({ id }) => id).join(", ")} and ${wishes.length - 3} more` : wishes.map(({ id }) => id).join(", "));
const mm = (value: number) => (Number.isFinite(value) ? `${Math.round(value * 10) / 10} mm` : "the whole bed");
