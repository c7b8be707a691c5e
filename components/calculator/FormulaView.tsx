import { Fragment, type ReactNode } from "react";
import type { LengthUnit } from "@/bending/core/units";
import type { Formula } from "@/lib/calculator/answer";
import { formatFigure, formulaText } from "@/lib/calculator/formulaText";
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
      <p aria-hidden className="flex flex-wrap items-center gap-x-1 leading-tight">
        {set(parts, (name) => <Named name={name} />)}
      </p>
      <p aria-hidden className="num flex flex-wrap items-center gap-x-1 leading-tight">
        <span>=</span>{set(right, (name) => <span className="whitespace-nowrap text-ink">{formatFigure(formula.of[name], units)}</span>)}<span className="whitespace-nowrap">= <span className="font-medium text-ink">{result}</span></span>
      </p>
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

function set(parts: readonly FormulaPart[], named: (name: string) => ReactNode): ReactNode {
  return parts.map((part, i) => (
    <Fragment key={i}>
      {part.kind === "name" ? named(part.name) : part.kind === "text" ? <Lowered text={part.text} /> : (
        <span className="inline-flex flex-col items-center text-[0.92em]">
          <span className="flex items-center gap-x-1 px-1">{set(part.above, named)}</span>
          <span className="flex items-center gap-x-1 self-stretch justify-center border-t border-ink-soft px-1">{set(part.below, named)}</span>
        </span>
      )}
    </Fragment>
  ));
}

const Named = ({ name }: { readonly name: string }) => <Lowered text={name} italic />;

/** `R_i` with its i lowered. */
function Lowered({ text, italic = false }: { readonly text: string; readonly italic?: boolean }) {
  const pieces = text.trim().split(/(_[A-Za-z0-9]+)/);
  if (text.trim() === "") return null;
  return <span className={italic ? "italic text-ink" : undefined}>{pieces.map((piece, i) => (piece.startsWith("_") ? <sub key={i}>{piece.slice(1)}</sub> : piece))}</span>;
}
