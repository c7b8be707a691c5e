import type { ButtonHTMLAttributes, ReactNode, Ref } from "react";
import { buttonClasses, type ButtonLook, type ButtonSize } from "./buttonClasses";

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  readonly look?: ButtonLook;
  readonly size?: ButtonSize;
  /** Shows that the work is going on; the button stays focusable but does nothing. */
  readonly busy?: boolean;
  readonly icon?: ReactNode;
  readonly ref?: Ref<HTMLButtonElement>;
}

export function Button({ look = "primary", size = "normal", busy = false, icon, className, children, type = "button", onClick, ...rest }: ButtonProps) {
  return (
    <button {...rest} type={type} aria-busy={busy || undefined} aria-disabled={busy || undefined} className={buttonClasses(look, size, className)}
      onClick={(event) => { if (busy) { event.preventDefault(); return; } onClick?.(event); }}>
      {busy ? <span aria-hidden className="size-3.5 animate-spin rounded-full border-2 border-current border-t-transparent" /> : icon}
      {children}
    </button>
  );
}
