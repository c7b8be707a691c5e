import type { ReactNode } from "react";
import "./print.css";

export default function PrintLayout({ children }: { readonly children: ReactNode }) {
  return children;
}
