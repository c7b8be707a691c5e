/** How a sheet lies: the side up, and the direction of the flat that points away from the operator, degrees. */
export interface Lying { readonly up: number; readonly heading: number }

/** Degrees. Headings nearer than this are one: far under what a person sees. */
const ONE_HEADING = 0.1;

/** Degrees between two directions, the short way round. */
const between = (a: number, b: number) => Math.abs(((((a - b) % 360) + 540) % 360) - 180);

/** What is done between two strokes. A sheet that is turned over may go about either level axis, so that opposite headings are one then. */
export function handlingByHand(from: Lying, to: Lying): { readonly flip: boolean; readonly turn: number } {
  const flip = from.up !== to.up;
  const straight = between(from.heading, to.heading);
  const turn = flip ? Math.min(straight, between(from.heading + 180, to.heading)) : straight;
  return { flip, turn: turn < ONE_HEADING ? 0 : turn };
}

/** A flip costs one flip, every quarter turn begun one turn. */
export function handlingTime({ flip, turn }: ReturnType<typeof handlingByHand>, times: { readonly flip: number; readonly turn: number }): number {
  return (flip ? times.flip : 0) + Math.ceil((turn - ONE_HEADING) / 90 - 1e-9) * times.turn;
}
