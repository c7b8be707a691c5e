"use client";
import { useState } from "react";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { materialChanges } from "@/lib/schemas/materialChanges";
import type { MaterialDetail, MaterialVersionView } from "@/lib/schemas/materialViews";
import { ChangeList } from "./ChangeList";

const day = (iso: string): string => iso.slice(0, 16).replace("T", " ");

/** Every version with who made it, when and why; and what differs between any two. */
export function VersionHistory({ detail: { versions, plansByVersion } }: { readonly detail: MaterialDetail }) {
  return (
    <div className="space-y-8">
      <Panel title="Versions" aside="Sheets that are released keep the values that they were made with">
        <ol className="space-y-3">
          {versions.map((made) => (
            <li key={made.id} className="border-b border-rule pb-3 last:border-b-0">
              <p><span className="font-semibold">Version <span className="num">{made.version}</span></span> <span className="text-ink-soft"><time dateTime={made.at} className="num">{day(made.at)}</time>{made.by === "" ? "" : `, ${made.by}`}{plans(plansByVersion[made.id] ?? 0)}</span></p>
              {made.note === "" ? null : <p className="break-words">{made.note}</p>}
              <div className="text-sm"><ChangeList changes={made.changes} /></div>
            </li>
          ))}
        </ol>
      </Panel>
      {versions.length > 1 ? <Compare versions={versions} /> : null}
    </div>
  );
}

const plans = (count: number): string => (count === 0 ? "" : count === 1 ? ", 1 plan made with it" : `, ${count} plans made with it`);

function Compare({ versions }: { readonly versions: readonly MaterialVersionView[] }) {
  const [first, setFirst] = useState(versions.at(-1)?.version ?? 1);
  const [second, setSecond] = useState(versions[0]?.version ?? 1);
  const options = versions.map(({ version, at }) => ({ value: String(version), label: `Version ${version}`, note: day(at).slice(0, 10) }));
  const [before, after] = [first, second].map((wanted) => versions.find(({ version }) => version === wanted));
  const changes = before && after ? materialChanges(before.facts, after.facts) : [];
  return (
    <Panel title="Compare two versions">
      <div className="mb-3 grid max-w-md grid-cols-2 gap-3">
        <Select id="compare-first" label="From" value={String(first)} options={options} onChange={(value) => setFirst(Number(value))} />
        <Select id="compare-second" label="To" value={String(second)} options={options} onChange={(value) => setSecond(Number(value))} />
      </div>
      {changes.length === 0 ? <p className="text-ink-soft">Nothing differs.</p> : <ChangeList changes={changes} />}
    </Panel>
  );
}
