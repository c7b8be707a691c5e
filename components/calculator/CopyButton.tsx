"use client";
import { Check, Copy, CircleAlert } from "lucide-react";
import { useEffect, useState } from "react";
import { copyText } from "./copyText";

const looks = { ready: { icon: Copy, word: "Copy" }, done: { icon: Check, word: "Copied" }, refused: { icon: CircleAlert, word: "Refused" } } as const;

/** Copies a text and says so, in word and to screen readers; after a while it can copy again. */
export function CopyButton({ name, text }: { readonly name: string; readonly text: string }) {
  const [state, setState] = useState<keyof typeof looks>("ready");
  useEffect(() => {
    if (state === "ready") return undefined;
    const timer = setTimeout(() => setState("ready"), 2500);
    return () => clearTimeout(timer);
  }, [state]);
  const { icon: Icon, word } = looks[state];
  return (
    <>
      <button type="button" aria-label={`Copy ${name}`} onClick={() => void copyText(text).then((done) => setState(done ? "done" : "refused"))}
        className="inline-flex min-h-8 w-22 items-center justify-center gap-1 rounded border border-rule-strong bg-sheet px-2 text-sm hover:border-ink hover:bg-wash [&_svg]:size-3.5">
        <Icon aria-hidden />{word}
      </button>
      <span role="status" className="sr-only">{state === "done" ? `Copied ${text}` : state === "refused" ? "The browser refused to copy. Select the number and copy it by hand." : ""}</span>
    </>
  );
}
