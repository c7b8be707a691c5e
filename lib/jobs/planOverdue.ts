/** The planning thread ran on past its limit and was ended. */
export class PlanOverdue extends Error {
  constructor(seconds: number) {
    super(`Planning came to no answer within ${Math.round(seconds)} seconds and was ended. Nothing was stored; try a simpler part, or fewer bends at a time.`);
    this.name = "PlanOverdue";
  }
}
