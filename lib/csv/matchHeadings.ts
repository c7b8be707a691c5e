import type { CsvColumns } from "./csvColumn";
import { headingOf } from "./headingOf";

export interface Heading {
  /** The column that it is of; undefined: none has it. */
  readonly key: string | undefined;
  /** As it stands in the file. */
  readonly text: string;
  /** How much of the program's unit one of the heading's unit is. */
  readonly scale: number;
}

const plain = (text: string): string => text.toLowerCase().replace(/[\s_-]+/g, " ").trim();
const plainUnit = (text: string): string => text.toLowerCase().replace(/³/g, "3").replace(/²/g, "2").replace(/\s|\^/g, "");

/** Finds each heading's column: by its words whatever their case, with a unit in brackets. Problems are of the file as a whole. */
export function matchHeadings(columns: CsvColumns, texts: readonly string[]): { readonly headings: readonly Heading[]; readonly problems: readonly string[] } {
  const problems: string[] = [];
  const byWords = new Map(Object.entries(columns).flatMap(([key, { header, also }]) => [header, ...also].map((words) => [plain(words), key] as const)));
  const headings = texts.map((text): Heading => {
    const whole = byWords.get(plain(text));
    if (whole !== undefined) return { key: whole, text, scale: 1 };
    const [, words, unit] = /^(.*?)\s*[([]([^)\]]*)[)\]]$/.exec(text) ?? [];
    const key = words === undefined ? undefined : byWords.get(plain(words));
    if (key === undefined || unit === undefined) return { key: undefined, text, scale: 1 };
    const units = columns[key]?.units ?? {};
    const scale = Object.entries(units).find(([name]) => plainUnit(name) === plainUnit(unit))?.[1];
    if (scale === undefined && Object.keys(units).length > 0) problems.push(`The column "${words}" is given in "${unit}", which is not read here. Use ${Object.keys(units).join(" or ")}.`);
    return { key, text, scale: scale ?? 1 };
  });
  for (const [key, column] of Object.entries(columns)) {
    const count = headings.filter((heading) => heading.key === key).length;
    if (count > 1) problems.push(`The column "${headingOf(column)}" is there ${count} times. Keep one.`);
    if (count === 0 && column.required) problems.push(`The column "${headingOf(column)}" is missing.`);
  }
  return { headings, problems };
}
