"use client";
import type { KeyboardEvent, ReactNode } from "react";
import { NumberInput } from "@/components/ui/NumberInput";
import { useEditor } from "./editorContext";
import { fieldId } from "./fieldId";

interface PathFieldProps {
  /** Where the value goes in the document; problems at this path are shown here. */
  readonly path: string;
  readonly label: string;
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly kind?: "length" | "angle" | "number";
  readonly hint?: ReactNode;
  readonly placeholder?: string;
  readonly labelHidden?: boolean;
  readonly className?: string;
  readonly onKeyDown?: (event: KeyboardEvent<HTMLInputElement>) => void;
}

/** A length, angle or plain number of the part being edited. In a row (label hidden) its error is drawn by `RowProblems`. */
export function PathField({ path, label, value, onChange, kind = "length", hint, placeholder, labelHidden, className, onKeyDown }: PathFieldProps) {
  const { draft, problemAt } = useEditor();
  const unit = kind === "length" ? { unit: draft.units } : kind === "angle" ? { unit: "°" } : {};
  return (
    <NumberInput id={fieldId(path)} label={label} value={value} onChange={(event) => onChange(event.target.value)} error={problemAt(path)} {...unit}
      {...(labelHidden === true ? { errorHidden: true } : {})} {...(hint === undefined ? {} : { hint })} {...(placeholder === undefined ? {} : { placeholder })} {...(labelHidden === undefined ? {} : { labelHidden })}
      {...(className === undefined ? {} : { className })} {...(onKeyDown === undefined ? {} : { onKeyDown })} />
  );
}
