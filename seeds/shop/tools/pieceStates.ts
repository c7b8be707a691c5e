/** Pieces that are not in their rack place; the rest are. `brake` counts the shop's machines from 0. */
export const pieceStates: Readonly<Record<string, { readonly state: "at brake"; readonly brake: number } | { readonly state: "at regrind" | "withdrawn" }>> = {
  "P88-R1-H120/835-1": { state: "at brake", brake: 0 },
  "P88-R1-H120/835-2": { state: "at brake", brake: 0 },
  "V16-88-H60/835-1": { state: "at brake", brake: 0 },
  "V16-88-H60/835-2": { state: "at brake", brake: 0 },
  "P88-R0.8-H90/415-1": { state: "at brake", brake: 1 },
  "V8-85-H60/415-1": { state: "at brake", brake: 1 },
  "P85-R0.6-H120/415-1": { state: "at regrind" },
  "P60-R0.8-H120/415-1": { state: "at regrind" },
  "V12-30-H60/200-1": { state: "at regrind" },
  "P88-R3-H120/835-3": { state: "withdrawn" },
  "V63-88-H80/835-2": { state: "withdrawn" },
  "PS88-R0.8-H150/50-1": { state: "withdrawn" },
};
