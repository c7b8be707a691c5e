import { describe, it } from "vitest";
import { checkSeeds } from "./checkSeeds";

describe("no false feasible, half 1 of 10,000 samples", () => {
  it("agrees with the solids about what may stand where in 5,000 random strokes", { timeout: 900_000 }, async () => {
    await checkSeeds(1, 5000);
  });
});
