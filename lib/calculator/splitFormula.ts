/** A formula taken apart for setting: plain text, names that have a number, fractions. */
export type FormulaPart =
  | { readonly kind: "text"; readonly text: string }
  | { readonly kind: "name"; readonly name: string }
  | { readonly kind: "fraction"; readonly above: readonly FormulaPart[]; readonly below: readonly FormulaPart[] };

const word = /[\p{L}][\p{L}_0-9]*/gu;

/** Fractions are `[above | below]` and may stand within one another; names are whole words out of `names`. */
export function splitFormula(text: string, names: readonly string[]): readonly FormulaPart[] {
  const parts: FormulaPart[] = [];
  let rest = text;
  for (let open = rest.indexOf("["); open >= 0; open = rest.indexOf("[")) {
    const [bar, close] = ends(rest, open);
    parts.push(...words(rest.slice(0, open), names), { kind: "fraction", above: splitFormula(rest.slice(open + 1, bar).trim(), names), below: splitFormula(rest.slice(bar + 1, close).trim(), names) });
    rest = rest.slice(close + 1);
  }
  return [...parts, ...words(rest, names)];
}

/** Where the bar and the end of the fraction that opens at `open` stand. */
function ends(text: string, open: number): readonly [bar: number, close: number] {
  let [depth, bar] = [0, text.length];
  for (let i = open; i < text.length; i += 1) {
    const sign = text[i];
    if (sign === "[") depth += 1;
    else if (sign === "|" && depth === 1) bar = i;
    else if (sign === "]" && --depth === 0) return [bar, i];
  }
  return [bar, text.length];
}

function words(text: string, names: readonly string[]): readonly FormulaPart[] {
  const parts: FormulaPart[] = [];
  let at = 0;
  for (const found of text.matchAll(word)) {
    const [name] = found;
    if (!names.includes(name)) continue;
    if (found.index > at) parts.push({ kind: "text", text: text.slice(at, found.index) });
    parts.push({ kind: "name", name });
    at = found.index + name.length;
  }
  return at < text.length ? [...parts, { kind: "text", text: text.slice(at) }] : parts;
}
