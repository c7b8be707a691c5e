import type { ReactNode } from "react";
import { flatChangeText } from "@/lib/format/flatChangeText";
import type { FlatChange } from "@/lib/schemas/views";
import { Notice } from "./Notice";

/** A flat that would come out differently now: by how much, what changed, and what to do. */
export function FlatChangeNotice({ change, of, children }: { readonly change: FlatChange; readonly of: string; readonly children: ReactNode }) {
  const { then, now } = flatChangeText(change);
  return (
    <Notice tone="caution" title={<>The flat would now be <span className="num">{now}</span>; {of} has <span className="num">{then}</span></>}>
      <ul>{change.why.map((text) => <li key={text}>{text}</li>)}</ul>
      <p>{children}</p>
    </Notice>
  );
}
