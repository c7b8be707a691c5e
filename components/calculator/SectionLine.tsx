import type { ReactNode } from "react";

/** The ruled line over a group of answers. */
export const SectionLine = ({ children }: { readonly children: ReactNode }) => <h3 className="border-b border-rule-strong pb-0.5 font-semibold text-ink-soft">{children}</h3>;
