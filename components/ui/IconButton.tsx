import type { ButtonHTMLAttributes, ReactNode, Ref } from "react";
import { classes } from "./classes";
import { Hint } from "./Hint";

interface IconButtonProps extends Omit<ButtonHTMLAttributes<HTMLButtonElement>, "children"> {
  /** Said by screen readers and shown as the tooltip. */
  readonly label: string;
  readonly children: ReactNode;
  readonly danger?: boolean;
  readonly ref?: Ref<HTMLButtonElement>;
}

export function IconButton({ label, children, danger = false, className, type = "button", ...rest }: IconButtonProps) {
  return (
    <Hint text={label}>
      <button {...rest} type={type} aria-label={label}
        className={classes("inline-flex size-9 items-center justify-center rounded border border-transparent text-ink-soft [&_svg]:size-4.5 disabled:opacity-40",
          danger ? "hover:border-brick hover:text-brick-ink" : "hover:border-rule-strong hover:text-ink", className)}>
        {children}
      </button>
    </Hint>
  );
}
