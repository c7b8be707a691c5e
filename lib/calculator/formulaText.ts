import type { LengthUnit } from "@/bending/core/units";
import { formatQuantity } from "@/lib/format/formatQuantity";
import type { Figure, Formula } from "./answer";
import { splitFormula, type FormulaPart } from "./splitFormula";

/** A formula on one line: with its names, or (given units) with its numbers. For copying, and read out. */
export function formulaText({ text, of }: Formula, units: LengthUnit | null): string {
  return say(splitFormula(text, Object.keys(of)), (name) => (units === null ? name : formatFigure(of[name], units)));
}

/** A figure as it stands in a formula. */
export function formatFigure(figure: Figure | undefined, units: LengthUnit): string {
  return figure === undefined ? "" : formatQuantity(figure.value, figure.kind, units);
}

/** A number with its unit under a power: (2 mm)². */
export const bracketed = (figure: string, next: FormulaPart | undefined): string => (next?.kind === "text" && /^[²³]/.test(next.text) && figure.includes(" ") ? `(${figure})` : figure);

function say(parts: readonly FormulaPart[], named: (name: string) => string): string {
  return parts.map((part, i) => {
    if (part.kind === "text") return part.text;
    if (part.kind === "name") return bracketed(named(part.name), parts[i + 1]);
    const [above, below] = [say(part.above, named), say(part.below, named)].map((side) => (/ [·+−/] /.test(side) || side.includes(" ") ? `(${side})` : side));
    return `${above} / ${below}`;
  }).join("");
}
