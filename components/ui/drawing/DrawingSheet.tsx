import type { ReactNode } from "react";
import { classes } from "../classes";

interface DrawingSheetProps {
  readonly title: string;
  /** Said at the right of the title line: scale, size. */
  readonly note?: ReactNode;
  readonly width: number;
  readonly height: number;
  /** What the drawing shows, in words. */
  readonly description: string;
  readonly children: ReactNode;
  /** Drawn pale: the last good state while what is typed has mistakes. */
  readonly stale?: boolean;
  /** Holds controls (edges to click), so it is not one picture. */
  readonly live?: boolean;
}

/** A drawing on its own sheet: a thin frame, a title line below as in a title block. */
export function DrawingSheet({ title, note, width, height, description, children, stale = false, live = false }: DrawingSheetProps) {
  return (
    <figure className="self-start border border-steel-500 bg-sheet">
      <svg viewBox={`0 0 ${width} ${height.toFixed(1)}`} className={classes("block h-auto w-full transition-opacity", stale && "opacity-40")}
        role={live ? "group" : "img"} aria-label={description}>
        {children}
      </svg>
      <figcaption className="flex flex-wrap items-baseline justify-between gap-x-4 border-t border-steel-500 px-3 py-1">
        <span className="caption">{title}</span>
        <span className="text-sm text-ink-soft">{stale ? "as it was before the last entry" : note}</span>
      </figcaption>
    </figure>
  );
}
