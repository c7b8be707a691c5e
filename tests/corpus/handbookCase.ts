/** What a corpus case asks; lengths in any one unit, angles in degrees. */
export type CaseInput = Readonly<Record<string, number | string | boolean | readonly number[]>>;

/** How each formula is asked with a case's input. */
export type CorpusFormulas = Readonly<Record<string, (input: CaseInput) => number>>;

/** V seen in a text, M recalled from memory, C computed beforehand and independently of the code. */
export type Mark = "V" | "M" | "C";

export interface CorpusCase {
  readonly input: CaseInput;
  readonly expected: number;
  readonly tolerance: number;
  readonly source: string;
  readonly mark: Mark;
}

/** A published value that the product does not follow: kept with its name and with the reason. */
export interface Disagreement {
  readonly name: string;
  readonly input: CaseInput;
  readonly published: number;
  /** What the product says, and how near; the published value lies farther off than that. */
  readonly followed: number;
  readonly tolerance: number;
  readonly why: string;
  readonly source: string;
  readonly mark: Mark;
}

export interface Corpus {
  readonly formula: string;
  readonly note?: string;
  readonly cases: readonly CorpusCase[];
  readonly disagreements?: readonly Disagreement[];
}
