import type { ColumnWords, CsvColumn } from "./csvColumn";
import { fail, ok } from "@/bending/core/result";

/** One of a few words, read whatever its case. */
export function choiceColumn<const Choices extends readonly [string, ...string[]]>(header: string, choices: Choices, words: ColumnWords = {}): CsvColumn<Choices[number]> {
  const expects = words.expects ?? `one of ${choices.join(", ")}`;
  return {
    header, expects, also: words.also ?? [], units: {}, required: true, numeric: false, example: words.example ?? choices[0],
    read(cell) {
      const found: Choices[number] | undefined = choices.find((choice) => choice.toLowerCase() === cell.toLowerCase());
      return found === undefined ? fail(`must be ${expects}`) : ok(found);
    },
    write: (choice) => choice,
  };
}
