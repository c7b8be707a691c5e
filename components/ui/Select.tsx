"use client";
import { Check, ChevronDown } from "lucide-react";
import { Select as Parts } from "radix-ui";
import { controlClasses } from "./controlClasses";
import { describedBy, Field, type FieldFrame } from "./Field";

export interface SelectOption { readonly value: string; readonly label: string; readonly note?: string | undefined }

interface SelectProps extends FieldFrame {
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly options: readonly SelectOption[];
  readonly placeholder?: string;
  readonly disabled?: boolean;
}

export function Select({ id, label, hint, error, labelHidden, errorHidden, className, value, onChange, options, placeholder, disabled = false }: SelectProps) {
  const frame = { id, label, hint, error, className, ...(labelHidden === undefined ? {} : { labelHidden }), ...(errorHidden === undefined ? {} : { errorHidden }) };
  return (
    <Field {...frame}>
      <Parts.Root value={value} onValueChange={onChange} disabled={disabled}>
        <Parts.Trigger {...describedBy(frame)} id={id} aria-label={labelHidden === true ? label : undefined}
          className={controlClasses(error !== undefined, "flex items-center justify-between gap-2 text-left data-placeholder:text-ink-faint")}>
          <span className="truncate"><Parts.Value placeholder={placeholder} /></span>
          <Parts.Icon><ChevronDown aria-hidden className="size-4 text-ink-faint" /></Parts.Icon>
        </Parts.Trigger>
        <Parts.Portal>
          <Parts.Content position="popper" sideOffset={2} collisionPadding={8}
            className="z-50 max-h-(--radix-select-content-available-height) min-w-(--radix-select-trigger-width) max-w-[calc(100vw-2rem)] overflow-auto rounded border border-ink-soft bg-sheet shadow-[0_3px_0_var(--rule)]">
            <Parts.Viewport>
              {options.map((option) => (
                <Parts.Item key={option.value} value={option.value}
                  className="relative flex min-h-9 cursor-default items-center gap-3 py-1 pr-3 pl-8 outline-none select-none data-highlighted:bg-accent data-highlighted:text-accent-on">
                  <Parts.ItemIndicator className="absolute left-2"><Check aria-hidden className="size-4" /></Parts.ItemIndicator>
                  <Parts.ItemText>{option.label}</Parts.ItemText>
                  {option.note === undefined ? null : <span className="ml-auto text-sm opacity-80">{option.note}</span>}
                </Parts.Item>
              ))}
            </Parts.Viewport>
          </Parts.Content>
        </Parts.Portal>
      </Parts.Root>
    </Field>
  );
}
