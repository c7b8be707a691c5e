import { buildPart } from "../part/buildPart";
import type { PartModel } from "../part/partModel";
import { followsOrder } from "../plan/followsOrder";
import type { PlanReason } from "../plan/planDocument";
import type { CheckRequest, PlanRequest } from "../plan/planRequest";
import { readOrder } from "../plan/readOrder";
import { createGround, type FlatGround, type Ground } from "./createGround";

/** One flat of the part, and a person's own order beside it. */
export interface WhySituation extends FlatGround {
  /** Does a move come next in the person's own order? Every move does when there is none. */
  readonly follows: (move: number, formed: number) => boolean;
}

export interface WhySituations {
  /** The flats that a plan would look at, the likeliest first; worked out one by one. */
  readonly each: Iterable<WhySituation>;
  /** The likeliest flat; undefined when there are no tools to look at. */
  readonly first: () => WhySituation | undefined;
  /** Why there are no tools to look at, where there are none; asked when `each` has been gone through. */
  readonly reasons: () => readonly PlanReason[];
  /** The likeliest flat; null when the part cannot be built. */
  readonly part: PartModel | null;
  /** The V that is looked for first, mm. */
  readonly wantedV: number;
}

/** The flats that a plan would look at, every order free in them; a person's order is kept beside. `ground`: the same request's, from before. */
export function situationsOf(request: PlanRequest | CheckRequest, ground: Ground = createGround(request)): WhySituations {
  const order = masksOf(request);
  const each = { [Symbol.iterator]: () => beside(ground, order) };
  return { each, first: () => { for (const one of each) return one; return undefined; }, reasons: ground.reasons, part: ground.part, wantedV: ground.wantedV };
}

function* beside(ground: Ground, order: readonly number[] | null): Generator<WhySituation> {
  for (let index = 0; ; index += 1) {
    const flat = ground.flat(index);
    if (flat === undefined) return;
    const { moves } = flat.situation;
    const asked = order === null ? null : followsOrder(order, flat.bitsOf);
    yield {
      ...flat,
      follows: (move, formed) => {
        const found = moves[move];
        return found !== undefined && (asked === null || asked(found, formed));
      },
    };
  }
}

function masksOf(request: PlanRequest | CheckRequest): readonly number[] | null {
  if (!("order" in request)) return null;
  const built = buildPart(request.document, { materials: request.materials });
  const read = built.ok ? readOrder(built.value, request.order) : null;
  return read?.ok ? read.value : null;
}
