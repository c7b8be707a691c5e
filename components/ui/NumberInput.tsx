import type { InputHTMLAttributes, Ref } from "react";
import { classes } from "./classes";
import { controlClasses } from "./controlClasses";
import { describedBy, Field, type FieldFrame } from "./Field";

type NumberInputProps = FieldFrame & Omit<InputHTMLAttributes<HTMLInputElement>, "id" | "type"> & {
  /** Said after the number: mm, in, °, kN. What was typed may carry another unit. */
  readonly unit?: string;
  readonly ref?: Ref<HTMLInputElement>;
};

/** A number as people type it (text, so that `1/8` and `16 ga` can stand there); whoever owns it parses it. */
export function NumberInput({ id, label, hint, error, labelHidden, errorHidden, className, unit, ...rest }: NumberInputProps) {
  const frame = { id, label, hint, error, className, ...(labelHidden === undefined ? {} : { labelHidden }), ...(errorHidden === undefined ? {} : { errorHidden }) };
  return (
    <Field {...frame}>
      <div className="relative">
        <input inputMode="text" autoComplete="off" spellCheck={false} {...rest} {...describedBy(frame)} id={id} type="text"
          className={controlClasses(error !== undefined, classes("num text-right", unit === undefined ? "pr-3" : unit.length > 2 ? "pr-14" : unit.length > 1 ? "pr-9" : "pr-6"))} />
        {unit === undefined ? null : <span aria-hidden className="pointer-events-none absolute inset-y-0 right-2.5 flex items-center text-sm text-ink-faint">{unit}</span>}
      </div>
    </Field>
  );
}
