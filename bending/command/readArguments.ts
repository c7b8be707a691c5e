import { fail, ok, type Result } from "../core/result";

export interface Arguments {
  readonly verb: string;
  readonly file: string;
  /** All files that were named: one, but for a verb that takes several. */
  readonly files: readonly string[];
  readonly options: ReadonlyMap<string, string>;
}

/** Options that are said or not, without a value. */
const SWITCHES: readonly string[] = ["--why", "--robustness"];

/** `VERB FILE --name value ...`; the options that the verb takes are given, and the verbs that take several files. */
export function readArguments(args: readonly string[], known: Readonly<Record<string, readonly string[]>>, several: readonly string[] = []): Result<Arguments, string> {
  const [verb, ...rest] = args;
  const verbs = Object.keys(known).join(", ");
  if (verb === undefined) return fail(`verb: say what to do: ${verbs}`);
  const allowed = Object.hasOwn(known, verb) ? known[verb] : undefined;
  if (allowed === undefined) return fail(`verb: "${verb}" is not known; there are ${verbs}`);
  const options = new Map<string, string>();
  const files: string[] = [];
  for (let i = 0; i < rest.length; i += 1) {
    const word = rest[i] ?? "";
    if (!word.startsWith("--")) { files.push(word); continue; }
    const at = word.indexOf("=");
    const [name, inline] = at < 0 ? [word, undefined] : [word.slice(0, at), word.slice(at + 1)];
    if (!allowed.includes(name)) return fail(`${word}: not an option of ${verb}; it takes ${allowed.length > 0 ? allowed.join(", ") : "none"}`);
    if (inline === undefined && SWITCHES.includes(name)) { options.set(name, "yes"); continue; }
    const value = inline ?? rest[(i += 1)];
    if (value === undefined || value === "") return fail(`${name}: a value is missing after it`);
    if (options.has(name)) return fail(`${name}: given twice`);
    options.set(name, value);
  }
  const file = files[0];
  if (file === undefined) return fail(verb === "import" ? "FILE: name the drawing" : several.includes(verb) ? "PLAN.json: name the plan documents" : "PART.json: name the part document");
  if (files.length > 1 && !several.includes(verb)) return fail(`${files[1]}: one file at a time`);
  return ok({ verb, file, files, options });
}
