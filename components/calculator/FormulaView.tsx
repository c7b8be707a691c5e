import { Fragment, type ReactNode } from "react";
import type { LengthUnit } from "@/bending/core/units";
import type { Formula } from "@/lib/calculator/answer";
import { bracketed, formatFigure, formulaText } from "@/lib/calculator/formulaText";
import { splitFormula, type FormulaPart } from "@/lib/calculator/splitFormula";

interface FormulaViewProps {
  readonly formula: Formula;
  readonly units: LengthUnit;
  /** What comes out, with its unit. */
  readonly result: string;
}

/** A formula with its names, then with its numbers, fractions set above one another. Read out on one line. */
export function FormulaView({ formula, units, result }: FormulaViewProps) {
  const parts = splitFormula(formula.text, Object.keys(formula.of));
  const right = rightSide(parts);
  const spoken = `${formulaText(formula, null)}${formulaText(formula, units).slice(formula.text.indexOf(" = "))} = ${result}`;
  return (
    <div className="text-ink-soft">
      <p className="sr-only">{spoken}</p>
      <p aria-hidden>{set(parts, (name) => <Lowered text={name} italic />)}</p>
      <p aria-hidden>= {set(right, (name, next) => <span className="num whitespace-nowrap text-ink">{bracketed(formatFigure(formula.of[name], units), next)}</span>)}<span className="whitespace-nowrap"> = <span className="num font-medium text-ink">{result}</span></span></p>
    </div>
  );
}

/** What stands after the equals sign. */
function rightSide(parts: readonly FormulaPart[]): readonly FormulaPart[] {
  const at = parts.findIndex((part) => part.kind === "text" && part.text.includes(" = "));
  const sign = parts[at];
  if (sign?.kind !== "text") return parts;
  return [{ kind: "text", text: sign.text.slice(sign.text.indexOf(" = ") + 3) }, ...parts.slice(at + 1)];
}

function set(parts: readonly FormulaPart[], named: (name: string, next: FormulaPart | undefined) => ReactNode): ReactNode {
  return parts.map((part, i) => (
    <Fragment key={i}>
      {part.kind === "name" ? named(part.name, parts[i + 1]) : part.kind === "text" ? <Lowered text={part.text} /> : (
        <span className="mx-0.5 inline-flex flex-col items-stretch text-center align-middle text-[0.92em] leading-tight">
          <span className="px-1 pb-px">{set(part.above, named)}</span>
          <span className="border-t border-ink-soft px-1 pt-px">{set(part.below, named)}</span>
        </span>
      )}
    </Fragment>
  ));
}

/** `R_i` with its i lowered. */
function Lowered({ text, italic = false }: { readonly text: string; readonly italic?: boolean }) {
  const pieces = text.split(/(_[A-Za-z0-9]+)/);
  return <span className={italic ? "italic text-ink" : undefined}>{pieces.map((piece, i) => (piece.startsWith("_") ? <sub key={i}>{piece.slice(1)}</sub> : piece))}</span>;
}
