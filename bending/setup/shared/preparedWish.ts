import type { Room } from "./room";
import type { SharedWish } from "./sharedWish";

/** A pair of tools by their places among the stocks. */
export interface PairPlace {
  readonly punch: number;
  readonly die: number;
}

/** A wish with the room that it leaves a station of each pair; null where the pair cannot make it, or no pieces do. */
export interface PreparedWish {
  readonly wish: SharedWish;
  readonly rooms: readonly (Room | null)[];
}
