import { classes } from "./classes";

/** The look shared by text boxes and select triggers. */
export function controlClasses(wrong: boolean, more?: string): string {
  return classes(
    "w-full min-h-10 border rounded bg-sheet px-3 text-ink placeholder:text-ink-faint focus-visible:outline-2 focus-visible:-outline-offset-1 disabled:bg-wash disabled:text-ink-faint",
    wrong ? "border-brick outline-brick" : "border-rule-strong hover:border-ink-soft",
    more,
  );
}
