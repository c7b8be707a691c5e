import type { LineGroup, LineRole } from "./lineGroup";

/** Stems of "bend" and "fold" in the languages of drawings that reach a European or American shop (checked as parts of a layer's name). */
const BEND = ["bend", "fold", "bieg", "kant", "falz", "falt", "pli", "pieg", "plieg", "pleg", "doblez", "dobla", "dobra", "quina", "buig", "zet", "bock", "bøj", "boj", "knæk", "bukk", "vik", "giec", "gięc", "zagi", "ohyb", "taiv", "hajl", "buk", "bük", "brake"];
const UP = ["up", "oben", "hoch", "auf", "haut", "sopra", "arriba", "cima", "boven", "opp", "gora", "góra", "pos", "nahoru", "yuk"];
const DOWN = ["down", "dn", "unten", "runter", "ab", "bas", "sotto", "abajo", "baixo", "beneden", "ned", "dol", "dół", "neg", "dolu", "asag"];
const NOT_CUT = ["dim", "text", "note", "title", "border", "frame", "rahmen", "defpoints", "center", "centre", "mittel", "axis", "achs", "etch", "engrav", "gravur", "scrib", "mark", "sketch", "constr", "hatch", "bemass", "cote", "quot", "cota", "tekst", "viewport"];

const words = (text: string): readonly string[] => text.replace(/(\p{Ll})(\p{Lu})/gu, "$1 $2").toLowerCase().split(/\P{L}+/u).filter((word) => word !== "");

/** Whether a layer's name speaks of bending. */
const speaksOfBends = (layer: string): boolean => words(layer).some((word) => BEND.some((stem) => word.startsWith(stem) || (stem.length >= 4 && word.includes(stem))));
const says = (layer: string, list: readonly string[]): boolean => words(layer).some((word) => list.some((one) => (one.length <= 2 ? word === one : word.startsWith(one) || word.endsWith(one))));

/**
 * What each group is for, by its layer's name, else by its line type: dashed straight lines are bend lines unless a layer is named after
 * bending. A person sees the guess and changes it.
 */
export function guessRoles(groups: readonly LineGroup[]): ReadonlyMap<string, LineRole> {
  const byName = groups.some((group) => !group.hidden && speaksOfBends(group.layer));
  const bend = (layer: string): LineRole => ((says(layer, DOWN) && !says(layer, UP)) || /-$/.test(layer) ? "bend down" : "bend up");
  return new Map(groups.map((group): readonly [string, LineRole] => {
    if (group.hidden) return [group.key, "leave out"];
    if (speaksOfBends(group.layer)) return [group.key, bend(group.layer)];
    if (says(group.layer, NOT_CUT)) return [group.key, "leave out"];
    if (group.dashed) return [group.key, group.straight && !byName ? bend(group.layer) : "leave out"];
    return [group.key, "cut"];
  }));
}
