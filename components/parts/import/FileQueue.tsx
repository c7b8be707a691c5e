"use client";
import { useRef } from "react";
import { Plus } from "lucide-react";
import { Button } from "@/components/ui/Button";
import { classes } from "@/components/ui/classes";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";

export interface QueuedFile {
  readonly key: string;
  readonly file: File;
  readonly state: "waiting" | "saved" | "left";
  readonly part: { readonly id: string; readonly number: string } | null;
}

interface FileQueueProps {
  readonly queue: readonly QueuedFile[];
  readonly current: number;
  readonly onChoose: (index: number) => void;
  readonly onFiles: (files: readonly File[]) => void;
}

const marks = { waiting: ["wait", "waiting"], saved: ["good", "saved"], left: ["off", "left out"] } as const;

/** The files chosen, what became of each, and the way to any of them. */
export function FileQueue({ queue, current, onChoose, onFiles }: FileQueueProps) {
  const more = useRef<HTMLInputElement>(null);
  return (
    <div className="mb-5 flex flex-wrap items-start gap-3 border-y border-rule py-2">
      <ol aria-label="Files" className="flex max-h-24 min-w-0 grow flex-wrap gap-x-5 gap-y-1 overflow-y-auto">
        {queue.map(({ key, file, state, part }, i) => {
          const [tone, word] = marks[state];
          return (
            <li key={key} className="flex items-center gap-1.5">
              {part === null
                ? <button type="button" aria-current={i === current ? "step" : undefined} onClick={() => onChoose(i)} className={classes("underline decoration-rule-strong underline-offset-2 hover:decoration-ink", i === current && "font-semibold")}>{file.name}</button>
                : <TextLink href={`/parts/${part.id}`}>{part.number}</TextLink>}
              <StateMark tone={i === current && state === "waiting" ? "note" : tone}>{i === current && state === "waiting" ? "open" : word}</StateMark>
            </li>
          );
        })}
      </ol>
      <input ref={more} type="file" multiple accept=".dxf" hidden aria-label="More drawings" onChange={(event) => { onFiles([...(event.target.files ?? [])].filter(({ name }) => /\.dxf$/i.test(name))); event.target.value = ""; }} />
      <Button look="quiet" size="small" icon={<Plus aria-hidden />} onClick={() => more.current?.click()}>More files</Button>
    </div>
  );
}
