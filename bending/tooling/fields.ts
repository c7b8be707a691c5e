import { z } from "zod";

const wanted = (what: string) => ({ error: (issue: { readonly input?: unknown }) => (issue.input === undefined ? `is missing; give ${what}` : `must be ${what}`) });

/** Schema pieces that the tooling and the machine document share; every message says what would be right. */
export const fields = {
  number: (what: string) => z.number(wanted(what)),
  positive: (what: string) => z.number(wanted(`${what}, over 0`)).gt(0, `must be over 0: ${what}`).lte(1e6, `must be 1 000 000 at the most: ${what}`),
  notNegative: (what: string) => z.number(wanted(`${what}, 0 or more`)).gte(0, `must be 0 or more: ${what}`).lte(1e6, `must be 1 000 000 at the most: ${what}`),
  degrees: (what: string, most: number) =>
    z.number(wanted(`${what} in degrees`)).gt(0, `must be over 0 degrees: ${what}`).lt(most, `must be under ${most} degrees: ${what}`),
  text: (what: string) => z.string(wanted(what)).trim().min(1, `must not be empty: ${what}`).max(120, `must be 120 characters at the most: ${what}`),
  whole: (what: string) => z.number(wanted(`${what}, a whole number`)).int(`must be a whole number: ${what}`).gte(1, `must be 1 or more: ${what}`).lte(1000, `must be 1000 at the most: ${what}`),
  flag: (what: string) => z.boolean(wanted(what)),
  units: z.enum(["mm", "in"], wanted('"mm" or "in"')),
  points: (what: string) =>
    z.array(
      z.tuple([z.number(wanted("the point's x")), z.number(wanted("the point's y"))], wanted("a point [x, y]")),
      wanted(`a list of points [x, y]: ${what}`),
    ).min(3, `must have 3 points or more: ${what}`).max(2000, `must have 2000 points at the most: ${what}`),
  range: (what: string) =>
    z.tuple([z.number(wanted("the lower end")), z.number(wanted("the upper end"))], wanted(`two numbers [from, to]: ${what}`))
      .refine(([from, to]) => from <= to, `must go from the lower to the higher: ${what}`),
};
