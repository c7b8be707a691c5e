/** What a plan pays for: how often each time setting is counted. Flips, turns (quarters), metres walked, strokes and gauge moves of one part; stations and pieces once. */
export interface PlanCounts {
  readonly flips: number;
  readonly turns: number;
  readonly metres: number;
  readonly strokes: number;
  readonly gaugeMoves: number;
  readonly stations: number;
  readonly pieces: number;
}
