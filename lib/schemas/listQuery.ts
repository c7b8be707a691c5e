import { z } from "zod";
import { plainText } from "./plainText";

export const listPageSizeMost = 100;

/** The query of a list: what is typed into search, the column it is sorted by, the page. */
export function listQuerySchema<const Sort extends readonly [string, ...string[]]>(sorts: Sort, standard: NoInfer<Sort[number]>, direction: "asc" | "desc" = "asc") {
  return z.object({
    q: plainText(100).optional(),
    sort: z.enum(sorts, { error: `must be one of ${sorts.join(", ")}` }).default(standard as never),
    dir: z.enum(["asc", "desc"], { error: "must be asc or desc" }).default(direction),
    page: z.coerce.number({ error: "must be a whole number from 1" }).int("must be a whole number from 1").min(1, "must be 1 or more").max(1_000_000).default(1),
    pageSize: z.coerce.number({ error: "must be a whole number from 1 to 100" }).int().min(1, "must be 1 or more").max(listPageSizeMost, `must be at most ${listPageSizeMost}`).default(25),
  });
}
