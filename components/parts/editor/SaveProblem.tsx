import type { ReactNode } from "react";
import { Notice } from "@/components/ui/Notice";

/** Why nothing was saved, and that nothing was lost. */
export function SaveProblem({ error, children }: { readonly error: Error; readonly children?: ReactNode }) {
  return (
    <Notice tone="wrong" title="Nothing was saved; what you entered is still here" live>
      <p>{error.message}</p>
      {children}
    </Notice>
  );
}
