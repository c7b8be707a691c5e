import { expect, it } from "vitest";
import { formatSeconds } from "./formatSeconds";

it.each([[0, "0:00"], [9.4, "0:09"], [59.6, "1:00"], [412, "6:52"], [3600, "1:00:00"], [4212, "1:10:12"]])("says %s s as %s", (seconds, text) =>
  expect(formatSeconds(seconds)).toBe(text));
