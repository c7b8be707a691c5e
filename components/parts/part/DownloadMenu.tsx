"use client";
import { ChevronDown, FileDown } from "lucide-react";
import { DropdownMenu } from "radix-ui";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { saveAsFile } from "../editor/saveAsFile";
import type { PartDetail } from "@/lib/schemas/views";
import { partFileName } from "@/lib/format/partFileName";

const drawings = [
  { query: "format=dxf", label: "Flat, DXF", says: "contours, bend lines by way" },
  { query: "format=dxf&ticks=yes&number=yes", label: "Flat, DXF with marks", says: "bend ticks and number to etch" },
  { query: "format=svg", label: "Flat, SVG", says: "true size" },
  { query: "format=glb", label: "Folded part, GLB", says: "3D, in metres" },
] as const;

const item = "flex min-h-9 cursor-default items-baseline gap-4 px-3 py-1.5 outline-none select-none data-highlighted:bg-accent data-highlighted:text-accent-on";

/** The shown revision as files for other programs. */
export function DownloadMenu({ part }: { readonly part: PartDetail }) {
  const { revision } = part.revision;
  return (
    <DropdownMenu.Root>
      <DropdownMenu.Trigger className={buttonClasses("plain")}><FileDown aria-hidden />Download<ChevronDown aria-hidden /></DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content align="end" sideOffset={2} collisionPadding={8} className="z-50 max-w-[calc(100vw-2rem)] rounded border border-ink-soft bg-sheet shadow-[0_3px_0_var(--rule)]">
          {drawings.map(({ query, label, says }) => (
            <DropdownMenu.Item key={query} asChild className={item}>
              <a href={`/api/parts/${encodeURIComponent(part.id)}/drawing?${query}&revision=${revision}`} download>{label}<span className="ml-auto text-sm opacity-80">{says}</span></a>
            </DropdownMenu.Item>
          ))}
          <DropdownMenu.Item className={item} onSelect={() => saveAsFile(partFileName(part.number, revision, "json"), JSON.stringify(part.document, null, 2))}>
            Part document, JSON<span className="ml-auto text-sm opacity-80">all that was entered</span>
          </DropdownMenu.Item>
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}
