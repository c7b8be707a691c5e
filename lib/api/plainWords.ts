import type { z } from "zod";

const kinds: Readonly<Record<string, string>> = {
  string: "text", number: "a number", int: "a whole number", boolean: "true or false", array: "a list", object: "an object", record: "an object", tuple: "a list",
};

/** Words for what a schema says nothing of its own about: a field that is missing or of another kind. */
export const plainWords: z.core.$ZodErrorMap = (issue) => {
  if (issue.code !== "invalid_type") return undefined;
  const expected = kinds[issue.expected] ?? issue.expected;
  return issue.input === undefined ? `is missing; give ${expected}` : `must be ${expected}`;
};
