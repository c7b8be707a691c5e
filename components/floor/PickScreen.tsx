"use client";
import { Square, SquareCheckBig } from "lucide-react";
import { classes } from "@/components/ui/classes";
import type { SheetView } from "@/lib/sheet/sheetView";

interface PickScreenProps { readonly view: SheetView; readonly placed: ReadonlySet<string>; readonly onToggle: (piece: string) => void }

/** Tool by tool from the rack; a tap checks it off. */
export function PickScreen({ view, placed, onToggle }: PickScreenProps) {
  const left = view.pickList.filter((line) => !placed.has(line.piece)).length;
  return (
    <div className="grow p-4">
      <p className="mb-3 text-2xl" aria-live="polite">{left === 0 ? "All tools fetched." : <><span className="num font-semibold">{left}</span> of <span className="num">{view.pickList.length}</span> to fetch</>}</p>
      <ul className="grid gap-3 lg:grid-cols-2">
        {view.pickList.map((line) => {
          const done = placed.has(line.piece);
          const Box = done ? SquareCheckBig : Square;
          return (
            <li key={line.piece}>
              <button type="button" role="checkbox" aria-checked={done} aria-label={`${line.piece}, rack ${line.rack}`} onClick={() => onToggle(line.piece)}
                className={classes("flex min-h-24 w-full items-center gap-4 border-2 px-4 py-2 text-left", done ? "border-accent bg-accent-wash" : "border-rule-strong bg-sheet")}>
                <Box aria-hidden className="size-12 shrink-0" />
                <span className="min-w-0 grow">
                  <span className="num block text-3xl font-semibold">{line.piece}</span>
                  <span className="block text-xl text-ink-soft">{line.kind}, {line.length}{line.horn ? `, ${line.horn}` : ""}, station {line.station}</span>
                </span>
                <span className="text-right"><span className="block text-base text-ink-soft">rack</span><span className="num block text-3xl font-semibold whitespace-nowrap">{line.rack}</span></span>
              </button>
            </li>
          );
        })}
      </ul>
    </div>
  );
}
