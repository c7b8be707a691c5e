/** A message as a sentence of its own: a capital in front, unless it begins with one of these names, and a stop at its end. */
export function asSentence(text: string, names: readonly string[] = []): string {
  const named = names.some((name) => text.startsWith(name));
  return `${named ? text : text.charAt(0).toUpperCase() + text.slice(1)}${/[.!?]$/.test(text) ? "" : "."}`;
}
