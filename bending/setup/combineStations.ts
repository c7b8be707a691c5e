import type { MachineSettings } from "../tooling/machine";
import type { Station, StationWish } from "./layout";
import { stationsFor } from "./stationsFor";

/** How many makings of one wish are tried when it shares the bed with others. */
const MAKINGS = 4;

/** Every way (the few best of each) to make several stations at once, no piece twice. */
export function combineStations(wishes: readonly StationWish[], settings: MachineSettings, used: ReadonlySet<string> = new Set()): readonly (readonly Station[])[] {
  const [first, ...rest] = wishes;
  if (first === undefined) return [[]];
  const makings = stationsFor(first, used, settings);
  return (rest.length === 0 ? makings : makings.slice(0, MAKINGS)).flatMap((station) => {
    const taken = new Set([...used, ...station.punch.pieces.map(({ id }) => id), ...station.die.pieces.map(({ id }) => id)]);
    return combineStations(rest, settings, taken).map((others) => [station, ...others]);
  });
}
