import { classes } from "./classes";

export type ButtonLook = "primary" | "plain" | "quiet" | "danger";
export type ButtonSize = "small" | "normal" | "large";

const looks: Record<ButtonLook, string> = {
  primary: "border-accent bg-accent text-accent-on hover:bg-accent-ink hover:border-accent-ink",
  plain: "border-rule-strong bg-sheet text-ink hover:border-ink hover:bg-wash",
  quiet: "border-transparent bg-transparent text-accent-ink hover:bg-accent-wash",
  danger: "border-brick bg-sheet text-brick-ink hover:bg-brick hover:text-brick-on",
};

const sizes: Record<ButtonSize, string> = {
  small: "min-h-8 px-2.5 text-sm gap-1.5 [&_svg]:size-4",
  normal: "min-h-10 px-4 gap-2 [&_svg]:size-4.5",
  large: "min-h-16 px-6 text-lg gap-3 [&_svg]:size-6",
};

/** The look of a button, for links that act like one. */
export function buttonClasses(look: ButtonLook = "primary", size: ButtonSize = "normal", more?: string): string {
  return classes(
    "inline-flex items-center justify-center border rounded font-medium whitespace-nowrap select-none transition-colors",
    "disabled:opacity-50 disabled:pointer-events-none aria-disabled:opacity-60 no-underline",
    looks[look], sizes[size], more,
  );
}
