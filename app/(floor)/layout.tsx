import type { ReactNode } from "react";

/** Dark and large: read from two metres, in gloves. */
export default function FloorLayout({ children }: { readonly children: ReactNode }) {
  return <div data-theme="floor" className="min-h-dvh text-lg">{children}</div>;
}
