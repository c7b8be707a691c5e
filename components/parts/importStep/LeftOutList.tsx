"use client";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";

interface LeftOutListProps {
  readonly part: RecognisedPart;
  readonly marked: readonly number[];
  readonly onMark: (faces: readonly number[]) => void;
}

/** What could not be understood, by face number, and what was taken a little differently. */
export function LeftOutList({ part, marked, onMark }: LeftOutListProps) {
  if (part.leftOut.length === 0 && part.notes.length === 0) return <Notice tone="good" title="Every face of the solid was understood" />;
  return (
    <div className="space-y-4">
      {part.leftOut.length === 0 ? null : (
        <Panel title="Not understood" aside="left out of the part; hatched in the picture">
          <ul className="divide-y divide-rule border-y border-rule">
            {part.leftOut.map(({ faces, message }) => {
              const on = faces.every((face) => marked.includes(face));
              return (
                <li key={faces.join(" ")} className="flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1 py-1.5">
                  <span className="min-w-0 flex-1 break-words">{message}.</span>
                  <Button look="plain" size="small" aria-pressed={on} onClick={() => onMark(on ? [] : faces)}>{on ? "Stop pointing out" : "Point out"}</Button>
                </li>
              );
            })}
          </ul>
        </Panel>
      )}
      {part.notes.length === 0 ? null : (
        <Notice tone="caution" title="Taken a little differently">
          <ul className="list-disc space-y-1 pl-5">{part.notes.map((note) => <li key={note}>{note}</li>)}</ul>
        </Notice>
      )}
    </div>
  );
}
