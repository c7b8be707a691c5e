import { SAME_COST } from "./carryCost";
import type { PieceStock } from "./createPieceStock";
import type { ToolShares } from "./createToolShares";
import type { PieceChoice } from "./pieceChoices";
import { leastLengths } from "./leastLengths";
import type { Room } from "./room";
import type { SearchEffort } from "./searchEffort";
import { splitRoom } from "./splitRoom";

/** A station that is wanted: its tools by their place among the stocks, and the lengths that it may have. */
export interface RoomStation {
  readonly punch: number;
  readonly die: number;
  readonly room: Room;
}

/** The pieces of one station and the lengths that its runs are given. */
export interface SharedPieces {
  readonly punch: PieceChoice;
  readonly die: PieceChoice;
  readonly punchLength: number;
  readonly dieLength: number;
}

export interface PieceQuestion {
  readonly stocks: readonly PieceStock[];
  readonly shares: ToolShares;
  readonly maxGap: number;
  /** mm. What the stations may be long together. */
  readonly room: number;
  readonly effort: SearchEffort;
}

export interface PieceAnswer {
  readonly cost: number;
  readonly pieces: readonly SharedPieces[];
}

/**
 * Pieces for all stations at once, none twice: the fewest, then the least to carry; null when none cost under `under`. Each tool's
 * pieces are shared by themselves, which bounds the answer and mostly is one; where a punch and a die run then do not go together, or
 * the bed is too short, the lengths of that station are parted in two so that each part rules the pair out, and both are looked at.
 */
export function sharePieces(question: PieceQuestion, stations: readonly RoomStation[], under: number): PieceAnswer | null {
  const { maxGap, room, effort } = question;
  let best: PieceAnswer | null = null;
  let limit = under;
  const visit = (current: readonly RoomStation[]): void => {
    effort.step();
    if (effort.spent() || total(current, (one) => Math.max(one.room.punch[0], one.room.die[0])) > room + SAME_COST) return;
    const shared = shareByTool(question, current);
    if (shared === null || shared.cost >= limit) return;
    const made = current.map(({ room: lengths }, index): SharedPieces | null => {
      const { punch, die } = shared.given[index] ?? {};
      const runs = punch && die ? leastLengths(lengths, spanOf(punch, maxGap), spanOf(die, maxGap)) : null;
      return punch && die && runs ? { punch, die, punchLength: runs[0], dieLength: runs[1] } : null;
    });
    const pieces = made.flatMap((one) => one ?? []);
    const apart = made.indexOf(null);
    if (apart < 0 && total(pieces, (one) => Math.max(one.punchLength, one.dieLength)) <= room + SAME_COST) {
      best = { cost: shared.cost, pieces };
      limit = shared.cost - SAME_COST;
      return;
    }
    const spare = (index: number) => lengthOf(pieces[index]) - Math.max(current[index]?.room.punch[0] ?? 0, current[index]?.room.die[0] ?? 0);
    const at = apart >= 0 ? apart : pieces.reduce((most, _, index) => (spare(index) > spare(most) ? index : most), 0);
    const [station, given] = [current[at], shared.given[at]];
    if (!station || !given?.punch || !given.die) return;
    const parts = splitRoom(station.room, spanOf(given.punch, maxGap), spanOf(given.die, maxGap), apart >= 0 ? null : lengthOf(pieces[at]));
    for (const part of parts) visit(current.map((one, index) => (index === at ? { ...one, room: part } : one)));
  };
  visit(stations);
  return best;
}

/** The cheapest pieces of each tool by itself for every station that uses it; null when some tool has not enough. */
function shareByTool({ stocks, shares }: PieceQuestion, stations: readonly RoomStation[]): { readonly cost: number; readonly given: readonly { readonly punch?: PieceChoice; readonly die?: PieceChoice }[] } | null {
  const given: { punch?: PieceChoice; die?: PieceChoice }[] = stations.map(() => ({}));
  let cost = 0;
  for (const tool of stocks.keys()) {
    for (const side of ["punch", "die"] as const) {
      const users = stations.flatMap((station, index) => (station[side] === tool ? [{ index, span: station.room[side] }] : []));
      if (users.length === 0) continue;
      const share = shares(tool, users.map(({ span }) => span));
      if (share === null) return null;
      cost += share.cost;
      users.forEach(({ index }, at) => {
        const [one, choice] = [given[index], share.choices[at]];
        if (one && choice) one[side] = choice;
      });
    }
  }
  return { cost, given };
}

/** From the pieces side by side to drawn apart as far as is allowed, mm. */
const spanOf = ({ counts, length }: PieceChoice, maxGap: number): readonly [number, number] => [length, length + (counts.reduce((sum, count) => sum + count, 0) - 1) * maxGap];
const lengthOf = (one: SharedPieces | undefined) => Math.max(one?.punchLength ?? 0, one?.dieLength ?? 0);
const total = <T>(items: readonly T[], of: (item: T) => number) => items.reduce((sum, item) => sum + of(item), 0);
