import type { Handling } from "./handlingBetween";

/** Each quarter turn begun costs one turn, a flip one flip. */
export function handlingSeconds(handling: Handling, times: { readonly flip: number; readonly turn: number }): number {
  const quarters = Math.ceil((handling.turn - 0.01) / 90);
  return (handling.flip ? times.flip : 0) + Math.max(0, quarters) * times.turn;
}
