/** What is wrong with a document, said so that a person can mend it. */
export interface FieldProblem {
  /** Where in the document, e.g. `flanges[2].length` or `profile.legs[0]`. */
  readonly path: string;
  /** What is wrong and what would be right, in the document's own units. */
  readonly message: string;
}
