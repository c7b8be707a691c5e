import { fail, ok, type Result } from "@/bending/core/result";
import { quantityUnits } from "./quantityUnits";
import { spellSigns } from "./spellSigns";

const LONGEST = 80;
const sole = /^[+-]?\s*\d+-\d+\s*\/\s*\d+(?:\s*[a-z"'°]+)?$/i;
const tight = /(?<![\d.,/])\d+-\d+\s*\/\s*\d+/;
const mixed = /(?<![\d.,/]\s*)(\d+)(?:\s+|-)(\d+)\s*\/\s*(\d+)(?![\d.,])/g;
const thousands = /(?<![\d.,])\d{1,3}(?:,\d{3})+(?![\d])/;
const token = /\s*(?:(\d+[.,]?\d*(?:e[+-]?\d+)?|[.,]\d+(?:e[+-]?\d+)?)|(ton-force|[a-zµμ]+)|(''|["'°]|[-+*/^()]))/iy;

const number = String.raw`(?:\([\d+/]+\)|\d[\d.]*(?: \/ \d+)?)`;
const together: readonly RegExp[] = [
  new RegExp(String.raw`(${number}) (ft) (${number}) (inch)`, "g"),
  new RegExp(String.raw`(${number}) (deg) (${number}) (arcmin) (${number}) (arcsec)`, "g"),
  new RegExp(String.raw`(${number}) (deg) (${number}) (arcmin)`, "g"),
];

/**
 * What was typed in the few words that the grammar knows: numbers with points, names of units, + - * / ^ and brackets.
 * `3 1/2"` becomes `(3+1/2) inch`, `6' 2"` becomes `(6 ft + 2 inch)`; in angles ' and " are minutes and seconds. Anything else is refused.
 */
export function spellExpression(text: string, forAngle: boolean): Result<string, string> {
  const typed = spellSigns(text).replace(/[″”]/g, '"').replace(/[′’]/g, "'").replace(/[×·]/g, "*").replace(/²/g, "^2").replace(/³/g, "^3");
  if (typed.length > LONGEST) return fail(`is longer than ${LONGEST} characters`);
  const many = thousands.exec(typed);
  if (many !== null) return fail(`has "${many[0]}", which may be thousands or decimals: write ${many[0].replaceAll(",", "")} or use a point`);
  const either = sole.test(typed) ? null : tight.exec(typed);
  if (either !== null) return fail(`has "${either[0]}", which may be a mixed number or a difference: write ${either[0].replace("-", " ")} or ${either[0].replace("-", " - ")}`);
  const words = tokens(typed.replace(mixed, "($1+$2/$3)"), forAngle);
  return words.ok ? ok(together.reduce((all, pattern) => all.replace(pattern, sum), words.value)) : words;
}

/** `6 ft 2 inch` as one bracket; the last two arguments of a replacer are place and whole text. */
const sum = (...given: readonly unknown[]): string => {
  const parts = given.slice(1, -2).map(String);
  return `(${parts.map((part, i) => (i % 2 === 1 && i < parts.length - 1 ? `${part} +` : part)).join(" ")})`;
};

function tokens(text: string, forAngle: boolean): Result<string, string> {
  const words: string[] = [];
  token.lastIndex = 0;
  for (let at = 0; at < text.length;) {
    const found = token.exec(text);
    if (found === null) return fail(`has "${text.slice(at).trim().charAt(0)}", which has no meaning here`);
    const [, digits, name, sign] = found;
    const word = digits?.replace(",", ".") ?? (sign === undefined ? unitWord(name ?? "") : signWord(sign, forAngle));
    if (word === null) return fail(unknown(name ?? ""));
    words.push(word);
    at = token.lastIndex;
  }
  return ok(words.join(" ").replace(/\( (\d+) \+ (\d+) \/ (\d+) \)/g, "($1+$2/$3)"));
}

function signWord(sign: string, forAngle: boolean): string {
  if (sign === "°") return "deg";
  if (sign === '"' || sign === "''") return forAngle ? "arcsec" : "inch";
  return sign === "'" ? (forAngle ? "arcmin" : "ft") : sign;
}

/** `in` is a word of the grammar, so the inch goes by its full name; `µ` and `-` are no letters of a name in it. */
const spelled: Readonly<Record<string, string>> = { in: "inch", inches: "inch", foot: "ft", feet: "ft", degree: "deg", degrees: "deg", "ton-force": "tonf", "µm": "um" };

function unitWord(typed: string): string | null {
  const name = typed.toLowerCase().replace("μ", "µ");
  if (name === "pi") return String(Math.PI);
  if (!quantityUnits.has(name)) return null;
  return spelled[name] ?? name;
}

const unknown = (name: string): string =>
  /^tons?$/i.test(name)
    ? `has "${name}", which is not the same everywhere: write tonf (US, 2000 lbf), tf (1000 kgf) or kN`
    : `has "${name}", which is not a unit known here`;
