import type { AnswerGroup } from "./answer";
import type { ChoiceKey } from "./choices";
import type { FieldKey } from "./fields";
import type { Question } from "./question";

/** One question of the trade: what it asks on top of the sheet and the bend, and how it is answered. */
export interface Section {
  /** Also the hash in the address. */
  readonly id: string;
  readonly title: string;
  /** The question in plain words. */
  readonly question: string;
  /** Own inputs. */
  readonly fields: readonly FieldKey[];
  readonly choices: readonly ChoiceKey[];
  /** Those of the common inputs that the answer depends on. */
  readonly needs: readonly FieldKey[];
  readonly answer: (question: Question) => readonly AnswerGroup[];
}
