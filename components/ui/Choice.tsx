"use client";
import { ToggleGroup } from "radix-ui";
import type { ReactNode } from "react";
import { classes } from "./classes";

interface ChoiceProps<Value extends string> {
  readonly label: string;
  readonly value: Value;
  readonly onChange: (value: Value) => void;
  readonly options: readonly { readonly value: Value; readonly label: ReactNode; readonly name?: string }[];
  readonly labelHidden?: boolean;
  readonly small?: boolean;
}

/** One of a few, all in sight: mm or inch, up or down. Arrow keys move. */
export function Choice<Value extends string>({ label, value, onChange, options, labelHidden = false, small = false }: ChoiceProps<Value>) {
  return (
    <div className="min-w-0">
      {labelHidden ? null : <p aria-hidden className="mb-1 text-sm font-medium text-ink-soft">{label}</p>}
      <ToggleGroup.Root type="single" value={value} aria-label={label} onValueChange={(next) => { const found = options.find((option) => option.value === next); if (found) onChange(found.value); }}
        className={classes("inline-flex max-w-full rounded border border-rule-strong bg-sheet", !small && "flex-wrap")}>
        {options.map((option, index) => (
          <ToggleGroup.Item key={option.value} value={option.value} aria-label={option.name}
            className={classes("inline-flex items-center justify-center gap-1.5 hover:bg-wash data-[state=on]:bg-ink data-[state=on]:text-paper [&_svg]:size-4",
              small ? "min-h-9 min-w-9 px-2 text-sm" : "min-h-9.5 px-3", index > 0 && "border-l border-rule-strong")}>
            {option.label}
          </ToggleGroup.Item>
        ))}
      </ToggleGroup.Root>
    </div>
  );
}
