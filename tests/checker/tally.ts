/** Who is asked about: tools by their role, ram, bed, the part against itself, ways in and out, gauge fingers. */
export const QUESTIONS = ["punch", "die", "other", "ram", "bed", "self", "way", "finger"] as const;
export type Question = (typeof QUESTIONS)[number];

/**
 * `clear`: both say free; `near`: the product says free and the solids come nearer than twice the margin; `falseFeasible`: it says free and the
 * solids meet. `met`: it says no and the solids meet; `margin`: it says no and they come too near; `falseInfeasible`: it says no and
 * they stay clear by more than the margin and the stated bounds; `choice`: a tool stands clear of the stroke, and would of another way in or out
 * than the one that is taken.
 */
export const OUTCOMES = ["clear", "near", "falseFeasible", "met", "margin", "falseInfeasible", "choice"] as const;
export type Outcome = (typeof OUTCOMES)[number];

export interface Finding {
  readonly question: Question;
  readonly outcome: "falseFeasible" | "falseInfeasible" | "choice";
  readonly say: string;
  /** Moment of the stroke (angle turned through, radians), where it matters. */
  readonly angle: number | null;
}

export type Verdicts = readonly (readonly [Question, Outcome])[];

export type Tally = Record<Question, Record<Outcome, number>>;

export const emptyTally = (): Tally => Object.fromEntries(QUESTIONS.map((question) => [question, Object.fromEntries(OUTCOMES.map((outcome) => [outcome, 0]))])) as Tally;

export const countOf = (tally: Tally, outcome: Outcome): number => QUESTIONS.reduce((sum, question) => sum + tally[question][outcome], 0);

export function addTo(tally: Tally, verdicts: Verdicts): void {
  for (const [question, outcome] of verdicts) tally[question][outcome]++;
}
