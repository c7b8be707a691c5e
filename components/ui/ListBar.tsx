import type { ReactNode } from "react";

/** The line over a list: search and filters. */
export const ListBar = ({ children }: { readonly children: ReactNode }) => <div className="mb-4 flex flex-wrap items-end gap-3">{children}</div>;
