"use client";
import { TriangleAlert } from "lucide-react";
import Link from "next/link";
import { useState } from "react";
import { flatChangeText } from "@/lib/format/flatChangeText";
import { useSheetList } from "@/lib/queries/sheets";
import type { SheetListItem } from "@/lib/schemas/views";
import { FloorFrame } from "./FloorFrame";

/** The released sheets, as large as gloves want them. */
export function FloorList({ name, home }: { readonly name: string; readonly home: React.ReactNode }) {
  const [asked, setAsked] = useState("");
  const { data, error, isPending } = useSheetList({ state: "released", q: asked, sort: "number", dir: "asc", pageSize: 100 });
  return (
    <FloorFrame title="Setup sheets" aside={<div className="flex items-center gap-3 text-lg text-ink-soft">{name}{home}</div>}>
      <main id="content" className="grow p-4">
        <label htmlFor="floor-search" className="sr-only">Sheet, part or brake</label>
        <input id="floor-search" type="search" value={asked} onChange={(event) => setAsked(event.target.value)} placeholder="Sheet, part or brake" autoComplete="off"
          className="mb-4 min-h-16 w-full border-2 border-rule-strong bg-sheet px-5 text-2xl placeholder:text-ink-faint" />
        {error ? <p role="alert" className="border-2 border-brick p-5 text-2xl text-brick-ink">{error.message}</p> : null}
        {isPending ? <p className="p-5 text-2xl text-ink-soft">Loading…</p> : null}
        {data && data.items.length === 0 ? <p className="p-5 text-2xl text-ink-soft">{asked ? "No released sheet matches." : "No sheet is released yet. An engineer releases it in the office."}</p> : null}
        <ul className="grid gap-3 lg:grid-cols-2">{data?.items.map((sheet) => <Entry key={sheet.id} sheet={sheet} />)}</ul>
      </main>
    </FloorFrame>
  );
}

function Entry({ sheet }: { readonly sheet: SheetListItem }) {
  return (
    <li>
      <Link href={`/floor/${sheet.id}`} className="flex min-h-24 items-center gap-5 border-2 border-rule-strong bg-sheet px-5 py-3">
        <span className="num text-3xl font-semibold whitespace-nowrap">{sheet.number}</span>
        <span className="min-w-0 grow">
          <span className="block truncate text-2xl font-medium">{sheet.partName}</span>
          <span className="block text-lg text-ink-soft"><span className="num">{sheet.partNumber}</span> rev {sheet.revision} · {sheet.machine}</span>
          {sheet.flatChange === null ? null : <span className="mt-1 flex items-center gap-2 text-lg font-medium text-amber-ink"><TriangleAlert aria-hidden className="size-6 shrink-0" />The flat would now be <span className="num">{flatChangeText(sheet.flatChange).now}</span></span>}
        </span>
        <span className="text-right text-lg whitespace-nowrap text-ink-soft"><span className="num text-2xl text-ink">{sheet.bends}</span><br />bends</span>
      </Link>
    </li>
  );
}
