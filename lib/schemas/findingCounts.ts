import { z } from "zod";

const MOST_IDS = 100;
const ids = "must be up to 100 ids of parts with commas between";

export const findingCountsQuerySchema = z.object({
  ids: z.string(ids).max(MOST_IDS * 40, ids).transform((text) => text.split(",").filter((id) => id !== "")).pipe(z.array(z.uuid(ids)).max(MOST_IDS, ids)),
});

/** How many findings of each severity the newest revision of a part has. */
export interface FindingCounts {
  readonly stop: number;
  readonly caution: number;
  readonly note: number;
}

/** By id of the part; null for one that cannot be built any more. Parts that do not exist are left out. */
export type FindingCountsView = Readonly<Record<string, FindingCounts | null>>;
